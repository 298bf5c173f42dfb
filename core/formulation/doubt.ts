import type { BarrierDoubt } from '../evaluation';
import type { Formulation, Particle } from '../scenario/scenario';
import { type SolvedFormulation, type SolvedPair, solve } from './solve';

/**
 * Usual standard uncertainties of what a formulator enters, where the entry carries none of its own (judgement, after
 * the spread of repeated measurements; JCGM 100:2008 type B): salt ±20 %, size ±10 %, layer ±20 %, χ ±0.05.
 */
const SALT_SHARE = 0.2;
const SIZE_SHARE = 0.1;
const LAYER_SHARE = 0.2;
const CHI_STEP = 0.05;

type InputName = BarrierDoubt['contributions'][number]['input'];

interface Shift {
  readonly input: InputName;
  readonly change: string;
  readonly towards: (formulation: Formulation, direction: 1 | -1) => Formulation;
  readonly hamakerShare?: number;
}

const eachParticle = (formulation: Formulation, change: (particle: Particle) => Particle): Formulation => ({
  ...formulation,
  particles: formulation.particles.map(change),
});

const LN_10 = Math.LN10;
const MAX_DOUBT_OF_LOG = 300; // enough to call anything undecided, and still a finite number

const barrierOf = (pair: SolvedPair): number => pair.features.barrier?.energy_kT ?? 0;

function shiftsFor(formulation: Formulation, pair: SolvedPair): Shift[] {
  const kinds = [formulation.particles[pair.first], formulation.particles[pair.second]];
  const share = pair.model.hamaker.relativeUncertainty;
  const shifts: Shift[] = [
    {
      input: 'hamakerConstant',
      change: `±${(100 * share).toFixed(0)} %`,
      towards: (one) => one,
      hamakerShare: share,
    },
    {
      input: 'size',
      change: `±${100 * SIZE_SHARE} %`,
      towards: (one, direction) =>
        eachParticle(one, (particle) => ({
          ...particle,
          diameter_nm: particle.diameter_nm * (1 + direction * SIZE_SHARE),
        })),
    },
  ];
  if (pair.model.doubleLayer !== null) {
    const widest_mV = Math.max(...kinds.map((particle) => particle.charge?.zetaUncertainty_mV ?? 0));
    shifts.push({
      input: 'zeta',
      change: `±${widest_mV} mV`,
      towards: (one, direction) =>
        eachParticle(one, (particle) => {
          if (particle.charge === null) return particle;
          const { zeta_mV, zetaUncertainty_mV } = particle.charge;
          const away_mV = Math.sign(zeta_mV || -1) * direction * zetaUncertainty_mV;
          return { ...particle, charge: { ...particle.charge, zeta_mV: zeta_mV + away_mV } };
        }),
    });
    if (formulation.salts.some(({ concentration_mM }) => concentration_mM > 0) || formulation.hardness_dH > 0) {
      shifts.push({
        input: 'ionicStrength',
        change: `±${100 * SALT_SHARE} %`,
        towards: (one, direction) => ({
          ...one,
          hardness_dH: one.hardness_dH * (1 + direction * SALT_SHARE),
          salts: one.salts.map((dose) => ({
            ...dose,
            concentration_mM: dose.concentration_mM * (1 + direction * SALT_SHARE),
          })),
        }),
      });
    }
  }
  if (kinds.some((particle) => particle.layer !== null)) {
    shifts.push(
      {
        input: 'layerThickness',
        change: `±${100 * LAYER_SHARE} %`,
        towards: (one, direction) =>
          eachParticle(one, (particle) =>
            particle.layer === null
              ? particle
              : {
                  ...particle,
                  layer: {
                    ...particle.layer,
                    thickness_nm: particle.layer.thickness_nm * (1 + direction * LAYER_SHARE),
                    adsorbedAmount_mg_m2: particle.layer.adsorbedAmount_mg_m2 * (1 + direction * LAYER_SHARE),
                  },
                },
          ),
      },
      {
        input: 'floryChi',
        change: `±${CHI_STEP}`,
        towards: (one, direction) =>
          eachParticle(one, (particle) =>
            particle.layer === null
              ? particle
              : { ...particle, layer: { ...particle.layer, floryChi: particle.layer.floryChi - direction * CHI_STEP } },
          ),
      },
    );
  }
  return shifts;
}

/** Downward and upward standard doubt of the decisive numbers of one pair. */
export interface PairDoubt {
  readonly barrier: BarrierDoubt;
  readonly log10WDown: number;
  readonly log10WUp: number;
  /** Standard doubt of the depth of the outer minimum. */
  readonly outerMinimum_kT: number;
}

/**
 * Each input is moved up and down by its own standard uncertainty, the rest staying put; the effects are added in
 * quadrature, upward and downward apart, since a barrier grows faster than linearly with the zeta potential.
 *
 * Source  JCGM 100:2008, section 5.1.3, with finite differences instead of derivatives (note 2 there).
 * Valid   independent inputs; the shape of the joint distribution is not followed.
 */
export function pairDoubt(formulation: Formulation, solved: SolvedFormulation, pairIndex: number): PairDoubt {
  const pair = solved.pairs[pairIndex];
  const barrier_kT = barrierOf(pair);
  const outerDepth = (one: SolvedPair): number => one.features.outerMinimum?.energy_kT ?? 0;
  let down = 0;
  let up = 0;
  let logDown = 0;
  let logUp = 0;
  let depth = 0;
  const contributions: { input: InputName; change: string; effect_kT: number }[] = [];
  for (const shift of shiftsFor(formulation, pair)) {
    const ends = ([-1, 1] as const).map((direction) => {
      const moved = solve(shift.towards(formulation, direction), 1 + direction * (shift.hamakerShare ?? 0));
      return moved.ok ? moved.value.pairs[pairIndex] : pair;
    });
    const effects = ends.map((end) => barrierOf(end) - barrier_kT);
    const logs = ends.map((end) => (end.lnStabilityRatio - pair.lnStabilityRatio) / LN_10);
    down += Math.min(0, ...effects) ** 2;
    up += Math.max(0, ...effects) ** 2;
    logDown += Math.min(0, ...logs) ** 2;
    logUp += Math.max(0, ...logs) ** 2;
    depth += ((outerDepth(ends[1]) - outerDepth(ends[0])) / 2) ** 2;
    contributions.push({
      input: shift.input,
      change: shift.change,
      effect_kT: (Math.max(...effects) - Math.min(...effects)) / 2,
    });
  }
  const log10WDown = Math.min(Math.sqrt(logDown), MAX_DOUBT_OF_LOG);
  const log10WUp = Math.min(Math.sqrt(logUp), MAX_DOUBT_OF_LOG);
  return {
    barrier: {
      standardUncertainty_kT: (Math.sqrt(down) + Math.sqrt(up)) / 2,
      standardUncertaintyLog10W: (log10WDown + log10WUp) / 2,
      low_kT: Math.max(0, barrier_kT - Math.sqrt(down)),
      high_kT: barrier_kT + Math.sqrt(up),
      contributions: contributions.sort((a, b) => b.effect_kT - a.effect_kT),
    },
    log10WDown,
    log10WUp,
    outerMinimum_kT: Math.sqrt(depth),
  };
}
