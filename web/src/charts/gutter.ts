import { s } from '../dom';
import type { Quantity } from '../format/number';

/** The left gutter of a chart: its name, the value at the cursor in large digits, and its unit under it. */
export interface Gutter {
  readonly element: SVGGElement;
  readonly show: (quantity: Quantity, note?: string) => void;
}

export function gutter(name: string, leftPx: number, top: number): Gutter {
  const value = s('text', { class: 'gutter-value', x: leftPx, y: top + 27 });
  const unit = s('text', { x: leftPx, y: top + 45 });
  const note = s('text', { x: leftPx, y: top + 60 });
  return {
    element: s('g', {}, s('text', { class: 'ink-text', x: leftPx, y: top + 6 }, name), value, unit, note),
    show: (quantity, more = '') => {
      value.textContent = quantity.number;
      unit.textContent = quantity.unit;
      note.textContent = more;
    },
  };
}
