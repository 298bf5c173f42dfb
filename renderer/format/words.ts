import type { BarrierDoubt, VerdictLevel, VerdictSubject } from '../../core/evaluation';
import type { DoubleLayerModel, HamakerRoute } from '../../core/scenario/scenario';

export const levelWords: Readonly<Record<VerdictLevel, string>> = {
  holds: 'Should hold',
  borderline: 'Borderline',
  fails: 'Expect failure',
};

/** Told apart by shape as well as by colour. */
export const levelShapes: Readonly<Record<VerdictLevel, string>> = { holds: '●', borderline: '◐', fails: '▲' };

export const subjectWords: Readonly<Record<VerdictSubject, string>> = {
  coagulation: 'Coagulation',
  flocculation: 'Flocculation',
  settling: 'Settling',
};

export const subjectQuestions: Readonly<Record<VerdictSubject, string>> = {
  coagulation: 'Do particles touch and stay together for good?',
  flocculation: 'Do they cling loosely, at arm’s length?',
  settling: 'Does a clear layer form in the can?',
};

export const routeWords: Readonly<Record<HamakerRoute, string>> = {
  lifshitz: 'Lifshitz theory',
  'two-point': 'Two-point approximation',
  molecular: 'Molecular sum (London)',
  combining: 'Combining rule',
  entered: 'Entered value',
};

export const doubleLayerWords: Readonly<Record<DoubleLayerModel, string>> = {
  'constant-potential': 'Constant potential',
  'constant-charge': 'Constant charge',
  superposition: 'Superposition',
};

export const doubtWords: Readonly<Record<BarrierDoubt['contributions'][number]['input'], string>> = {
  hamakerConstant: 'Hamaker constant',
  zeta: 'Zeta potential',
  ionicStrength: 'Ionic strength',
  size: 'Particle size',
  layerThickness: 'Layer thickness',
  floryChi: 'χ of the layer',
};
