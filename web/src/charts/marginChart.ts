import { s } from '../dom';
import { bitRate } from '../format/amount';
import { db, fixed, plain, short } from '../format/number';
import { valueScale, type ChartFrame, type StackedChart } from './chartFrame';
import { gutter } from './gutter';
import { at, timeOf, type PassData } from './passData';
import { areaPath, joined, linePath, runsOf, type Scale } from './ribbonGeometry';
import { fitted } from './textWidth';
import { valueTicks } from './timeScale';

/** Below required the chart keeps this much of the curve; more would only shrink what carries bytes. */
const shownBelowRequiredDb = 7;
const leastBelowRequiredDb = 3;
const leastAboveRequiredDb = 6;
const leastLabelGapPx = 13;

/** The hill in full: margin in dB against time, with the lines at which each faster waveform begins to close. */
export function marginChart(data: PassData, frame: ChartFrame): StackedChart {
  const { requiredMarginDb, robustMarginDb, pass } = data;
  const lowestDb = Math.max(requiredMarginDb - shownBelowRequiredDb, Math.min(...robustMarginDb, requiredMarginDb - leastBelowRequiredDb) - 0.5);
  const highestDb = Math.max(...robustMarginDb, requiredMarginDb + leastAboveRequiredDb) + 1.5;
  const y = valueScale(lowestDb, highestDb, frame.top, frame.height);
  const { scale } = frame;
  const curve = robustMarginDb.map((marginDb, index) => ({ timeMs: timeOf(data, index), excessDb: marginDb - requiredMarginDb }));
  const runs = runsOf(curve, pass.usableWindows, { lowDb: lowestDb - requiredMarginDb, highDb: Infinity });
  const hill: Scale = { x: scale.x, y: (excessDb) => y(excessDb + requiredMarginDb) };

  const element = s('g', { class: pass.elementSet.isStale ? 'ribbon stale' : 'ribbon' });
  for (const run of joined(runs, false)) {
    element.append(s('path', { class: 'hatched coarse', d: areaPath(run, hill) }), s('path', { class: 'hatch-outline', d: linePath(run, hill) }));
  }
  for (const run of runs) if (run.tint !== undefined) element.append(s('path', { class: `tint m${run.tint}`, d: areaPath(run, hill) }));
  for (const run of joined(runs, true)) element.append(s('path', { class: 'crest', d: linePath(run, hill) }));
  element.append(s('path', { class: 'required-line', d: `M${scale.left} ${y(requiredMarginDb)}H${scale.right}` }));
  element.append(...axis(lowestDb, highestDb, requiredMarginDb, y, scale.left), ...rateLines(data, y, frame, highestDb));

  const cursor = s('circle', { class: 'cursor-dot', r: 4 });
  element.append(cursor);
  const side = frame.gutterPx === undefined ? undefined : gutter('Margin', frame.gutterPx, frame.top);
  if (side !== undefined && frame.gutterPx !== undefined) {
    const robust = pass.waveforms[pass.mostRobustWaveform];
    element.append(side.element,
      s('text', { x: frame.gutterPx, y: frame.top + 70 }, `required ${fixed(requiredMarginDb, 1)} dB`),
      s('text', { x: frame.gutterPx, y: frame.top + 85 }, fitted(`of ${robust?.name ?? 'the slowest'}`, scale.left - frame.gutterPx - 34, 12, 400)));
  }
  return {
    element,
    setCursor: (index) => {
      const marginDb = at(robustMarginDb, index);
      cursor.setAttribute('cx', String(scale.x(timeOf(data, index))));
      cursor.setAttribute('cy', String(y(Math.max(lowestDb, marginDb))));
      side?.show({ ...db(marginDb), unit: 'dB at the cursor' });
    },
  };
}

function axis(lowestDb: number, highestDb: number, requiredDb: number, y: (value: number) => number, left: number): SVGElement[] {
  const ticks = valueTicks(lowestDb, highestDb, highestDb - lowestDb > 40 ? 5 : 3).filter((tick) => Math.abs(y(tick) - y(requiredDb)) >= leastLabelGapPx);
  return [
    ...ticks.map((tick) => s('text', { class: 'end', x: left - 8, y: y(tick) + 4 }, short(tick))),
    s('text', { class: 'end ink-text', x: left - 8, y: y(requiredDb) + 4 }, short(requiredDb)),
  ];
}

/** A dotted line where each faster waveform begins to close; its name keeps clear of its neighbours. */
function rateLines(data: PassData, y: (value: number) => number, frame: ChartFrame, highestDb: number): SVGElement[] {
  const { scale } = frame;
  const elements: SVGElement[] = [];
  let lastLabelY = Infinity;
  for (const [index, waveform] of data.timeline.waveforms.entries()) {
    const offsetDb = at(data.robustMarginDb, data.bestIndex) - at(waveform.marginDb, data.bestIndex);
    const levelDb = waveform.requiredMarginDb + offsetDb;
    if (offsetDb < 0 || levelDb > highestDb) continue;
    const lineY = y(levelDb);
    if (index !== data.pass.mostRobustWaveform) elements.push(s('path', { class: 'rate-line', d: `M${scale.left} ${lineY}H${scale.right}` }));
    const labelY = Math.min(lineY + 4, lastLabelY - leastLabelGapPx);
    lastLabelY = labelY;
    if (frame.gutterPx === undefined) {
      if (index !== data.pass.mostRobustWaveform) elements.push(s('text', { class: 'rate-name', x: scale.left + 4, y: labelY - 8 }, plain(bitRate(waveform.bitRateBps))));
      continue;
    }
    elements.push(s('text', { x: scale.right + 10, y: labelY },
      s('tspan', { class: 'ink-text' }, plain(bitRate(waveform.bitRateBps))), s('tspan', { dx: 6 }, fitted(waveform.name, 84, 12, 400))));
  }
  return elements;
}
