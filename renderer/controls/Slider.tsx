export interface SliderRange {
  readonly min: number;
  readonly max: number;
  /** Equal ratios instead of equal steps; `min` must then be above zero. */
  readonly logarithmic?: boolean;
  /** The value is rounded to this many decimals. */
  readonly decimals: number;
}

const STEPS = 400;

interface SliderProps {
  readonly label: string;
  readonly range: SliderRange;
  readonly value: number;
  readonly onMove: (value: number) => void;
}

const clamped = (value: number, { min, max }: SliderRange): number => Math.min(Math.max(value, min), max);

export function positionOf(value: number, range: SliderRange): number {
  const inside = clamped(value, range);
  const share =
    range.logarithmic === true
      ? Math.log(inside / range.min) / Math.log(range.max / range.min)
      : (inside - range.min) / (range.max - range.min);
  return Math.round(share * STEPS);
}

export function valueAt(position: number, range: SliderRange): number {
  const share = position / STEPS;
  const value =
    range.logarithmic === true
      ? range.min * (range.max / range.min) ** share
      : range.min + (range.max - range.min) * share;
  return Number(clamped(value, range).toFixed(range.decimals));
}

/** A lever beside a number field; the field remains the place for exact values. */
export function Slider({ label, range, value, onMove }: SliderProps) {
  return (
    <input
      class="field-slider"
      type="range"
      min={0}
      max={STEPS}
      step={1}
      value={positionOf(value, range)}
      aria-label={label}
      aria-valuetext={String(value)}
      onInput={(event) => onMove(valueAt(Number(event.currentTarget.value), range))}
    />
  );
}
