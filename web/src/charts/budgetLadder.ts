import type { Budget } from '../api/timeline';
import { h, s, type Child } from '../dom';
import { fixed, signed } from '../format/number';
import { clockTime, type Zone } from '../format/time';
import { ladderRows, leastWrittenDb, type LadderRow } from './ladderArithmetic';
import { valueScale } from './chartFrame';

const rowPx = 25;
const edgePx = 8;
/** Room at the left for the figure of the deepest step. */
const labelPx = 40;

/** Every line of the budget in order with its value and source; beside it the staircase of what changed since the best second. */
export function budgetLadder(best: Budget, now: Budget, zone: Zone, stairPx: number): HTMLElement {
  const rows = ladderRows(best, now);
  const levels = [best.marginDb, now.requiredMarginDb, ...rows.map((row) => row.levelDb)];
  const lowest = Math.min(...levels);
  const highest = Math.max(...levels);
  const across = valueScale(highest, lowest, labelPx, stairPx - labelPx - edgePx);
  const head = (text: string, side = '') => h('th', { scope: 'col', class: side }, text);
  const bestRow = h('tr', { class: 'sum' }, h('th', { scope: 'row' }, `Best second, ${clockTime(Date.parse(best.atUtc), zone)}`), h('td', { class: 'right' }, fixed(best.marginDb, 2)),
    stairCell(startMark(across(best.marginDb)), across(now.requiredMarginDb), stairPx));
  let levelDb = best.marginDb;
  const body = rows.map((row, index) => {
    const isLast = index === rows.length - 1;
    const cell = stairCell(step(row, levelDb, across, isLast), across(now.requiredMarginDb), stairPx, isLast ? `required ${fixed(now.requiredMarginDb, 1)}` : undefined);
    levelDb = row.levelDb;
    return h('tr', { class: row.line.kind === 'sum' ? (isLast ? 'sum last' : 'sum') : '' },
      h('th', { scope: 'row' }, lineName(row, isLast)),
      h('td', { class: 'right' }, value(row, isLast)), cell);
  });
  return h('table', { class: 'ladder' },
    h('thead', {}, h('tr', {}, head('Line'), head('value, dB', 'right'), head('since best second', 'right'))),
    h('tbody', {}, bestRow, body));
}

function lineName(row: LadderRow, isLast: boolean): Child {
  const name = isLast ? 'Margin at the cursor' : row.line.name;
  if (row.line.source === '') return name;
  return h('details', {}, h('summary', {}, name), h('p', { class: 'source' }, `${row.line.source}. Unit: ${row.line.unit}.`));
}

function value(row: LadderRow, isLast: boolean): string {
  return isLast ? fixed(row.line.valueDb, 2) : signed(row.line.valueDb, 2);
}

function stairCell(marks: readonly SVGElement[], requiredX: number, stairPx: number, requiredText?: string): HTMLElement {
  const height = requiredText === undefined ? rowPx : rowPx + 18;
  const text = requiredText === undefined ? [] : [s('text', { class: 'ink-text', 'text-anchor': requiredX < 60 ? 'start' : requiredX > stairPx - 60 ? 'end' : 'middle', x: requiredX, y: height - 2 }, requiredText)];
  return h('td', { class: 'stair' }, s('svg', { width: stairPx, height, viewBox: `0 0 ${stairPx} ${height}`, 'aria-hidden': 'true' },
    s('path', { class: 'required-dots', d: `M${requiredX} 0V${rowPx}` }), marks, text));
}

function startMark(x: number): SVGElement[] {
  return [s('path', { class: 'stair-line', d: `M${x} ${rowPx / 2}V${rowPx}` })];
}

function step(row: LadderRow, fromDb: number, across: (value: number) => number, isLast: boolean): SVGElement[] {
  const from = across(fromDb);
  const to = across(row.levelDb);
  if (isLast) return [s('path', { class: 'stair-line', d: `M${to} 0V${rowPx / 2}` }), s('circle', { class: 'cursor-dot', cx: to, cy: rowPx / 2, r: 4.5 })];
  const marks: SVGElement[] = [];
  if (Math.abs(to - from) >= 0.5) {
    const kind = row.changeDb > 0 ? 'stair-gain' : row.isLargestLoss ? 'stair-cause' : 'stair-loss';
    marks.push(s('rect', { class: kind, x: Math.min(from, to), y: 6, width: Math.abs(to - from), height: rowPx - 12 }));
    marks.push(s('path', { class: 'stair-line', d: `M${from} 0V${rowPx - 6}M${to} 6V${rowPx}` }));
  } else {
    marks.push(s('path', { class: 'stair-line', d: `M${from} 0V${rowPx}` }));
  }
  if (Math.abs(row.changeDb) >= leastWrittenDb) {
    marks.push(s('text', { class: row.isLargestLoss ? 'cause-text end' : 'end', x: Math.min(from, to) - 5, y: rowPx / 2 + 4 }, signed(row.changeDb, 1)));
  }
  return marks;
}
