interface CursorProps {
  readonly at_nm: number | null;
  readonly logarithmic: boolean;
  readonly onMove: (gap_nm: number) => void;
}

const STEPS = 600;
const START_nm = 0.165;
const LINEAR_END_nm = 30;
const LOG_END_nm = 200;

/** Moves the read-out along the curves by keyboard; the pointer over the chart does the same. */
export function Cursor({ at_nm, logarithmic, onMove }: CursorProps) {
  const end_nm = logarithmic ? LOG_END_nm : LINEAR_END_nm;
  const gapAt = (position: number): number => {
    const share = position / STEPS;
    return logarithmic ? START_nm * (end_nm / START_nm) ** share : START_nm + (end_nm - START_nm) * share;
  };
  const positionAt = (gap_nm: number): number =>
    Math.round(
      STEPS *
        (logarithmic
          ? Math.log(gap_nm / START_nm) / Math.log(end_nm / START_nm)
          : (gap_nm - START_nm) / (end_nm - START_nm)),
    );
  const gap_nm = at_nm ?? START_nm;
  return (
    <input
      class="chart-cursor"
      type="range"
      min={0}
      max={STEPS}
      step={1}
      value={positionAt(Math.max(gap_nm, START_nm))}
      aria-label="Read-out: gap between the surfaces"
      aria-valuetext={`${gap_nm.toPrecision(3)} nm`}
      onInput={(event) => onMove(gapAt(Number(event.currentTarget.value)))}
    />
  );
}
