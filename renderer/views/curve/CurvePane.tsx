import { useSignal } from '@preact/signals';
import { useEffect, useMemo, useRef } from 'preact/hooks';
import { weakestPairOf } from '../../../core/report/comparison';
import { type CurveChart, createCurveChart } from '../../charts/curveChart';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber } from '../../format/numbers';
import { useDeskTop } from '../deskTop';
import { useDark } from '../useDark';
import { Cursor } from './Cursor';
import { curvePicture, type Palette, shownCurves } from './curvePicture';
import { Legend } from './Legend';
import { ReadOut } from './ReadOut';

const reaches = [
  ['', 'automatic'],
  ['10', '±10 kT'],
  ['50', '±50 kT'],
  ['250', '±250 kT'],
  ['1000', '±1000 kT'],
] as const;

function paletteOf(element: Element): Palette {
  const style = getComputedStyle(element);
  const read = (name: string): string => style.getPropertyValue(name).trim();
  return {
    text: read('--text-soft'),
    grid: read('--line'),
    strong: read('--text'),
    font: `11px ${style.fontFamily}`,
  };
}

/** Energy against gap: every candidate's total, the parts of the selected one, and a cursor to read them off. */
export function CurvePane() {
  const { workbench } = useDeskTop();
  const decimalSign = useSettings().decimalSign.value;
  const dark = useDark();
  const canvas = useRef<HTMLCanvasElement>(null);
  const chart = useRef<CurveChart | null>(null);
  const logarithmic = useSignal(false);
  const reach = useSignal('');
  const hidden = useSignal<ReadonlySet<string>>(new Set());
  const cursor_nm = useSignal<number | null>(null);

  const evaluation = workbench.evaluation.value;
  const { id } = workbench.selected.value;
  const outcome = workbench.outcomeOf(id);
  const selected = outcome?.kind === 'evaluated' ? outcome.result : null;
  const curves = useMemo(() => (evaluation === null ? [] : shownCurves(evaluation, id, dark)), [evaluation, id, dark]);

  useEffect(() => {
    if (canvas.current === null) return;
    const created = createCurveChart(canvas.current);
    chart.current = created;
    return () => created.close();
  }, []);
  useEffect(() => {
    if (canvas.current === null) return;
    const view = {
      logarithmic: logarithmic.value,
      energyReach_kT: reach.value === '' ? null : Number(reach.value),
      hidden: hidden.value,
      cursor_nm: cursor_nm.value,
      dark,
    };
    chart.current?.draw(curvePicture(curves, selected, view, paletteOf(canvas.current)));
  }, [curves, selected, dark, logarithmic.value, reach.value, hidden.value, cursor_nm.value]);

  const finding = (): string => {
    if (selected === null) return 'Energy curves of the candidates.';
    const { barrier, outerMinimum } = weakestPairOf(selected).features;
    const top =
      barrier === null
        ? 'no barrier'
        : `barrier of ${shortNumber(barrier.energy_kT, decimalSign)} kT at ${shortNumber(barrier.separation_m * 1e9, decimalSign)} nm`;
    const well =
      outerMinimum === null
        ? 'no outer minimum'
        : `outer minimum of ${shortNumber(outerMinimum.energy_kT, decimalSign)} kT at ${shortNumber(outerMinimum.separation_m * 1e9, decimalSign)} nm`;
    return `Energy against gap. ${selected.name}: ${top}, ${well}.`;
  };

  return (
    <section class="pane curve" aria-label="Energy curves">
      <div class="curve-head">
        <h2 class="pane-title">Energy between two particles</h2>
        <label class="inline">
          Gap axis
          <select
            class="field-choice"
            value={logarithmic.value ? 'log' : 'linear'}
            onChange={(event) => {
              logarithmic.value = event.currentTarget.value === 'log';
            }}
          >
            <option value="linear">linear</option>
            <option value="log">logarithmic</option>
          </select>
        </label>
        <label class="inline">
          Energy axis
          <select
            class="field-choice"
            value={reach.value}
            onChange={(event) => {
              reach.value = event.currentTarget.value;
            }}
          >
            {reaches.map(([value, words]) => (
              <option key={value} value={value}>
                {words}
              </option>
            ))}
          </select>
        </label>
      </div>
      <div class="chart-frame">
        <canvas
          ref={canvas}
          role="img"
          aria-label={finding()}
          onPointerMove={(event) => {
            cursor_nm.value = chart.current?.xAtPixel(event.offsetX) ?? cursor_nm.value;
          }}
        />
      </div>
      <Cursor
        at_nm={cursor_nm.value}
        logarithmic={logarithmic.value}
        onMove={(gap_nm) => {
          cursor_nm.value = gap_nm;
        }}
      />
      <ReadOut curves={curves.filter(({ key }) => !hidden.value.has(key))} gap_nm={cursor_nm.value} />
      <Legend
        curves={curves}
        hidden={hidden.value}
        onToggle={(key) => {
          const next = new Set(hidden.value);
          if (!next.delete(key)) next.add(key);
          hidden.value = next;
        }}
      />
    </section>
  );
}
