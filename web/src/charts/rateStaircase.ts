import { s } from '../dom';
import { bitRate, bytes } from '../format/amount';
import { plain } from '../format/number';
import type { ChartFrame, StackedChart } from './chartFrame';
import { gutter } from './gutter';
import { at, timeOf, type PassData } from './passData';
import { textWidth } from './textWidth';

interface Step {
  readonly fromIndex: number;
  toIndex: number;
  readonly bitRateBps: number;
}

/** The rate that the best waveform carries each second; its area is the yield. */
export function rateStaircase(data: PassData, frame: ChartFrame): StackedChart {
  const { scale, top, height } = frame;
  const rates = data.timeline.bitRateBps;
  const highestBps = Math.max(1, ...rates);
  const element = s('g', {});
  for (const step of stepsOf(rates)) {
    const left = scale.x(timeOf(data, step.fromIndex));
    const right = scale.x(timeOf(data, step.toIndex));
    const rise = height * Math.max(0.12, step.bitRateBps / highestBps);
    element.append(s('rect', { class: 'rate-step', x: left, y: top + height - rise, width: Math.max(0.5, right - left - 0.5), height: rise }));
    const label = bitRate(step.bitRateBps).number;
    if (rise >= 12 && right - left > textWidth(label, 11, 400) + 6) {
      element.append(s('text', { class: 'rate-step-text', x: (left + right) / 2, y: top + height - 3 }, label));
    }
  }
  element.append(s('path', { class: 'axis', d: `M${scale.left} ${top + height}H${scale.right}` }));
  if (frame.gutterPx === undefined) return { element, setCursor: () => undefined };
  const side = gutter('Rate', frame.gutterPx, top);
  element.append(side.element, s('text', { class: 'ink-text', x: scale.right + 10, y: top + height }, data.pass.usableS > 0 ? plain(bytes(data.pass.yieldBytes)) : 'nothing carried'));
  return { element, setCursor: (index) => { side.show(bitRate(at(rates, index))); } };
}

function stepsOf(rates: readonly number[]): Step[] {
  const steps: Step[] = [];
  for (const [index, bitRateBps] of rates.entries()) {
    const last = steps.at(-1);
    if (last !== undefined && last.bitRateBps === bitRateBps && last.toIndex === index) last.toIndex = index + 1;
    else if (bitRateBps > 0) steps.push({ fromIndex: index, toIndex: index + 1, bitRateBps });
  }
  return steps;
}
