import { s } from '../dom';
import { fixed, short } from '../format/number';
import { round, valueScale, type ChartFrame, type StackedChart } from './chartFrame';
import { gutter } from './gutter';
import { lossKinds, lossSharesDb, type LossKind } from './lossShares';
import { at, timeOf, type PassData } from './passData';
import { valueTicks } from './timeScale';

const names: Record<LossKind, string> = {
  range: 'Range', spacecraftAntenna: 'S/c antenna', atmosphere: 'Atmosphere', rest: 'G/T, polarisation', pointing: 'Pointing',
};
/** From here on the mount's error is worth the one warm colour. */
const pointingCauseDb = 1;
const leastLabelGapPx = 15;

/** What has been lost since the best second, hanging from it, stacked so that the parts add up to the ladder's change. */
export function lossStack(data: PassData, frame: ChartFrame): StackedChart {
  const shares = Array.from({ length: data.count }, (_, index) => lossSharesDb(data, index));
  const pointingIsCause = Math.max(...shares.map((share) => share.pointing)) >= pointingCauseDb;
  const sums = shares.map((share) => {
    let sumDb = 0;
    return lossKinds.map((kind) => (sumDb += share[kind]));
  });
  const deepestDb = Math.max(3, ...sums.flat());
  const y = valueScale(-deepestDb, 0, frame.top, frame.height);
  const x = (index: number) => round(frame.scale.x(timeOf(data, index)));
  const edge = (layer: number, index: number) => (layer < 0 ? y(0) : y(-at(sums[index] ?? [], layer)));
  const element = s('g', {});
  for (const [layer, kind] of lossKinds.entries()) {
    let outline = '';
    for (let index = 0; index < data.count; index++) outline += `${index === 0 ? 'M' : 'L'}${x(index)} ${round(edge(layer, index))}`;
    for (let index = data.count - 1; index >= 0; index--) outline += `L${x(index)} ${round(edge(layer - 1, index))}`;
    element.append(s('path', { class: kind === 'pointing' && pointingIsCause ? 'loss-cause' : `loss-${layer + 1}`, d: `${outline}Z` }));
  }
  for (const tick of valueTicks(-deepestDb, 0, 3)) {
    element.append(s('text', { class: 'end', x: frame.scale.left - 8, y: y(tick) + 4 }, short(tick)));
  }
  if (frame.gutterPx === undefined) return { element, setCursor: () => undefined };
  element.append(...layerNames(sums.at(-1) ?? [], frame, y, pointingIsCause));
  const side = gutter('Losses', frame.gutterPx, frame.top);
  element.append(side.element);
  return {
    element,
    setCursor: (index) => { side.show({ number: fixed(at(sums[index] ?? [], lossKinds.length - 1), 1), unit: 'dB under best' }); },
  };
}

function layerNames(lastSums: readonly number[], frame: ChartFrame, y: (value: number) => number, pointingIsCause: boolean): SVGElement[] {
  let above = frame.top - leastLabelGapPx;
  return lossKinds.flatMap((kind, layer) => {
    if (kind === 'pointing' && !pointingIsCause) return [];
    const middle = y(-((lastSums[layer - 1] ?? 0) + (lastSums[layer] ?? 0)) / 2) + 4;
    above = Math.max(middle, above + leastLabelGapPx);
    return [s('text', { class: kind === 'pointing' ? 'cause-text' : layer === 0 ? 'ink-text' : '', x: frame.scale.right + 10, y: above }, names[kind])];
  });
}
