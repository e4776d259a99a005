import { s } from '../dom';
import { short, type Quantity } from '../format/number';
import { columnPath, valueScale, type ChartFrame, type StackedChart } from './chartFrame';
import { gutter } from './gutter';
import { at, timeOf, type PassData } from './passData';
import { roundStep } from './timeScale';

export interface LineSpec {
  readonly name: string;
  readonly column: readonly number[];
  /** Axis values are the column's times this: 1e-3 shows hertz as kilohertz. */
  readonly axisFactor: number;
  readonly lowest?: number;
  readonly highest?: number;
  readonly ticks?: readonly number[];
  readonly show: (index: number) => { readonly quantity: Quantity; readonly note?: string };
}

/** One quantity against time, with round grid values and a dot at the cursor. */
export function lineChart(data: PassData, frame: ChartFrame, spec: LineSpec): StackedChart {
  const values = spec.column.map((value) => value * spec.axisFactor);
  const ticks = spec.ticks ?? spread(values, spec.lowest, spec.highest);
  const lowest = Math.min(...ticks, ...values);
  const highest = Math.max(...ticks, ...values);
  const y = valueScale(lowest, highest, frame.top, frame.height);
  const x = (index: number) => frame.scale.x(timeOf(data, index));
  const dot = s('circle', { class: 'cursor-dot', r: 3.5 });
  const element = s('g', {},
    ticks.map((tick) => [
      s('path', { class: 'grid', d: `M${frame.scale.left} ${Math.round(y(tick)) + 0.5}H${frame.scale.right}` }),
      s('text', { class: 'end', x: frame.scale.left - 8, y: y(tick) + 4 }, short(tick)),
    ]),
    s('path', { class: 'line', d: columnPath(data.count, x, (index) => y(at(values, index))) }),
    dot);
  const side = frame.gutterPx === undefined ? undefined : gutter(spec.name, frame.gutterPx, frame.top);
  if (side !== undefined) element.append(side.element);
  return {
    element,
    setCursor: (index) => {
      dot.setAttribute('cx', String(x(index)));
      dot.setAttribute('cy', String(y(at(values, index))));
      const { quantity, note } = spec.show(index);
      side?.show(quantity, note);
    },
  };
}

/** Two or three round intervals that enclose the column. */
function spread(values: readonly number[], lowest?: number, highest?: number): number[] {
  const low = lowest ?? Math.min(...values);
  const high = Math.max(highest ?? -Infinity, ...values);
  const step = roundStep(high - low || Math.abs(high) || 1, 2);
  const last = Math.ceil(high / step - 1e-9);
  const ticks: number[] = [];
  for (let index = Math.floor(low / step + 1e-9); index <= last; index++) ticks.push(Number((index * step).toPrecision(12)));
  return ticks;
}
