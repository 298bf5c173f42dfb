import {
  Chart,
  type ChartDataset,
  LinearScale,
  LineController,
  LineElement,
  LogarithmicScale,
  type Plugin,
  PointElement,
} from 'chart.js';

Chart.register(LineController, LineElement, PointElement, LinearScale, LogarithmicScale);

export interface Series {
  readonly label: string;
  readonly colour: string;
  readonly dash: readonly number[];
  readonly width: number;
  readonly points: readonly { readonly x: number; readonly y: number }[];
  /** Written at the right end of the line; null for none. */
  readonly endLabel: string | null;
}

export interface Picture {
  readonly series: readonly Series[];
  readonly x: { readonly title: string; readonly min: number; readonly max: number; readonly logarithmic: boolean };
  readonly y: { readonly title: string; readonly min: number; readonly max: number };
  /** A second axis that shows y times a factor. */
  readonly secondY: { readonly title: string; readonly factor: number };
  readonly levels: readonly { readonly y: number; readonly label: string }[];
  readonly marks: readonly {
    readonly x: number;
    readonly y: number;
    readonly colour: string;
    readonly label: string;
  }[];
  readonly cursorX: number | null;
  readonly colours: { readonly text: string; readonly grid: string; readonly strong: string };
  readonly font: string;
}

export interface CurveChart {
  draw(picture: Picture): void;
  /** Position on the x axis under a pixel of the canvas, or null outside the plot. */
  xAtPixel(pixel: number): number | null;
  close(): void;
}

/** Multiples of 1, 2 or 5 times a power of ten, about six of them over the height. */
function niceTicks(min: number, max: number): readonly number[] {
  const rough = (max - min) / 6;
  const decade = 10 ** Math.floor(Math.log10(rough));
  const step = decade * ([1, 2, 5].find((nice) => nice * decade >= rough) ?? 10);
  const first = Math.ceil(min / step);
  return Array.from({ length: Math.floor(max / step) - first + 1 }, (_, index) => (first + index) * step);
}

const plainNumber = (value: number | string): string => String(Number(Number(value).toPrecision(6))).replace('-', '−');

const decadeLabels = (value: number | string): string => {
  const number = Number(value);
  const leading = number / 10 ** Math.floor(Math.log10(number) + 1e-9);
  return [1, 2, 5].some((nice) => Math.abs(leading - nice) < 1e-6) ? String(Number(number.toPrecision(2))) : '';
};

function overlay(current: () => Picture | null): Plugin<'line'> {
  return {
    id: 'overlay',
    afterDatasetsDraw(chart) {
      const picture = current();
      if (picture === null) return;
      const { ctx, chartArea, scales } = chart;
      const { x, y } = scales;
      const { text, strong } = picture.colours;
      const inside = (value: number): boolean => value >= picture.y.min && value <= picture.y.max;
      ctx.save();
      ctx.font = picture.font;
      const horizontal = (value: number, colour: string, dash: number[]) => {
        const place = Math.round(y.getPixelForValue(value)) + 0.5;
        ctx.strokeStyle = colour;
        ctx.setLineDash(dash);
        ctx.lineWidth = 1;
        ctx.beginPath();
        ctx.moveTo(chartArea.left, place);
        ctx.lineTo(chartArea.right, place);
        ctx.stroke();
        return place;
      };
      if (inside(0)) horizontal(0, strong, []);
      for (const level of picture.levels.filter((one) => inside(one.y))) {
        const place = horizontal(level.y, text, [2, 4]);
        ctx.fillStyle = text;
        ctx.textAlign = 'right';
        ctx.textBaseline = 'bottom';
        ctx.fillText(level.label, chartArea.right - 6, place - 2);
      }
      ctx.setLineDash([]);
      for (const mark of picture.marks.filter(
        (one) => inside(one.y) && one.x >= picture.x.min && one.x <= picture.x.max,
      )) {
        const markX = x.getPixelForValue(mark.x);
        const markY = y.getPixelForValue(mark.y);
        ctx.fillStyle = mark.colour;
        ctx.beginPath();
        ctx.arc(markX, markY, 4, 0, 2 * Math.PI);
        ctx.fill();
        ctx.fillStyle = text;
        ctx.textAlign = 'left';
        ctx.textBaseline = mark.y > 0 ? 'bottom' : 'top';
        ctx.fillText(mark.label, markX + 8, markY + (mark.y > 0 ? -4 : 4));
      }
      if (picture.cursorX !== null) {
        const place = Math.round(x.getPixelForValue(picture.cursorX)) + 0.5;
        ctx.strokeStyle = strong;
        ctx.beginPath();
        ctx.moveTo(place, chartArea.top);
        ctx.lineTo(place, chartArea.bottom);
        ctx.stroke();
      }
      ctx.restore();
    },
  };
}

/** Draws curves on a canvas. Knows no science: what is drawn, and in which colours, comes with the picture. */
export function createCurveChart(canvas: HTMLCanvasElement): CurveChart {
  let picture: Picture | null = null;
  const chart = new Chart(canvas, {
    type: 'line',
    data: { datasets: [] },
    plugins: [overlay(() => picture)],
    options: {
      animation: false,
      responsive: true,
      maintainAspectRatio: false,
      parsing: false,
      normalized: true,
      events: [],
      elements: { point: { radius: 0 } },
    },
  });
  return {
    draw(next) {
      picture = next;
      const { x, y, secondY, colours } = next;
      const grid = { color: colours.grid, drawTicks: false };
      const ticks = { color: colours.text, padding: 6, maxRotation: 0 };
      const upright = (min: number, max: number) => ({
        type: 'linear' as const,
        min,
        max,
        border: { color: colours.strong },
        ticks: { ...ticks, callback: plainNumber },
        afterBuildTicks: (axis: { ticks: { value: number }[] }) => {
          axis.ticks = niceTicks(min, max).map((value) => ({ value }));
        },
      });
      const title = (text: string) => ({ display: true, text, color: colours.text });
      chart.data.datasets = next.series.map(
        (series): ChartDataset<'line'> => ({
          label: series.label,
          data: series.points.map(({ x: place, y: value }) => ({ x: place, y: value })),
          borderColor: series.colour,
          borderDash: [...series.dash],
          borderWidth: series.width,
        }),
      );
      chart.options.scales = {
        x: {
          type: x.logarithmic ? 'logarithmic' : 'linear',
          min: x.min,
          max: x.max,
          grid,
          border: { color: colours.strong },
          title: title(x.title),
          ticks: x.logarithmic ? { ...ticks, autoSkip: false, callback: decadeLabels } : ticks,
        },
        y: { ...upright(y.min, y.max), grid, title: title(y.title) },
        second: {
          ...upright(y.min * secondY.factor, y.max * secondY.factor),
          position: 'right',
          grid: { display: false },
          title: title(secondY.title),
        },
      };
      chart.update('none');
    },
    xAtPixel(pixel) {
      const { left, right } = chart.chartArea;
      return pixel < left || pixel > right ? null : (chart.scales.x.getValueForPixel(pixel) ?? null);
    },
    close: () => chart.destroy(),
  };
}
