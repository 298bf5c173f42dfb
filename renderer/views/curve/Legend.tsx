import type { ShownCurve } from './curvePicture';

interface LegendProps {
  readonly curves: readonly ShownCurve[];
  readonly hidden: ReadonlySet<string>;
  readonly onToggle: (key: string) => void;
}

/** Which line is which, and which are shown. */
export function Legend({ curves, hidden, onToggle }: LegendProps) {
  return (
    <ul class="legend" aria-label="Curves shown">
      {curves.map(({ key, label, colour, dash, width, component }) => (
        <li key={key} data-component={component ? 'true' : undefined}>
          <label>
            <input type="checkbox" checked={!hidden.has(key)} onChange={() => onToggle(key)} />
            <svg width="28" height="8" aria-hidden="true">
              <line
                x1="0"
                y1="4"
                x2="28"
                y2="4"
                stroke={colour}
                stroke-width={width}
                stroke-dasharray={dash.join(' ')}
              />
            </svg>
            {label}
          </label>
        </li>
      ))}
    </ul>
  );
}
