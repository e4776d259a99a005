import type { PassData } from './passData';
import type { TimeScale } from './timeScale';

/** Where one chart of the stack stands; all share the time scale. */
export interface ChartFrame {
  readonly scale: TimeScale;
  readonly top: number;
  readonly height: number;
  /** Left edge of the gutter with name, value and unit; undefined on a phone, where figures stand below. */
  readonly gutterPx: number | undefined;
}

/** A chart in the stack: drawn once, told where the cursor is. */
export interface StackedChart {
  readonly element: SVGGElement;
  readonly setCursor: (index: number) => void;
}

export type DrawChart = (data: PassData, frame: ChartFrame) => StackedChart;

/** A linear scale from values to pixels that grow downwards. */
export function valueScale(lowest: number, highest: number, top: number, height: number): (value: number) => number {
  const span = highest - lowest || 1;
  return (value) => top + height - ((value - lowest) / span) * height;
}

/** A path through all rows of a column. */
export function columnPath(count: number, x: (index: number) => number, y: (index: number) => number): string {
  let path = '';
  for (let index = 0; index < count; index++) {
    path += `${index === 0 ? 'M' : 'L'}${round(x(index))} ${round(y(index))}`;
  }
  return path;
}

export function round(value: number): number {
  return Math.round(value * 20) / 20;
}
