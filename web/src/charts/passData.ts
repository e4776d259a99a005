import type { PassDetail } from '../api/passes';
import type { Timeline } from '../api/timeline';

/** What the charts of one pass draw: the pass, its columns, and the second that losses are counted from. */
export interface PassData {
  readonly pass: PassDetail;
  readonly timeline: Timeline;
  readonly startMs: number;
  readonly stepMs: number;
  readonly count: number;
  readonly bestIndex: number;
  /** Margin of the most robust waveform, each second. */
  readonly robustMarginDb: readonly number[];
  readonly requiredMarginDb: number;
}

/** More seconds than this are more than a screen has pixels for; a pass of many hours is shown in longer steps. */
const mostRows = 3600;

export function passData(pass: PassDetail, wholeTimeline: Timeline): PassData {
  const timeline = thinned(wholeTimeline, Math.ceil(wholeTimeline.elevationDeg.length / mostRows));
  const startMs = Date.parse(timeline.startUtc);
  const stepMs = timeline.stepS * 1000;
  const count = timeline.elevationDeg.length;
  const bestIndex = Math.min(count - 1, Math.max(0, Math.round((Date.parse(pass.bestUtc) - startMs) / stepMs)));
  const robust = timeline.waveforms[pass.mostRobustWaveform];
  return {
    pass, timeline, startMs, stepMs, count, bestIndex,
    robustMarginDb: robust?.marginDb ?? timeline.marginDb,
    requiredMarginDb: robust?.requiredMarginDb ?? pass.requiredMarginDb,
  };
}

/** Every `stride`th row of all columns. */
export function thinned(timeline: Timeline, stride: number): Timeline {
  if (stride <= 1) return timeline;
  const thin = (column: readonly number[]) => column.filter((_, index) => index % stride === 0);
  const columns = Object.entries(timeline).map(([name, value]) => [name, isColumn(value) ? thin(value) : value] as const);
  return {
    ...(Object.fromEntries(columns) as unknown as Timeline),
    stepS: timeline.stepS * stride,
    waveforms: timeline.waveforms.map((waveform) => ({ ...waveform, marginDb: thin(waveform.marginDb) })),
  };
}

function isColumn(value: unknown): value is readonly number[] {
  return Array.isArray(value) && typeof value[0] === 'number';
}

export function timeOf(data: PassData, index: number): number {
  return data.startMs + index * data.stepMs;
}

/** A column's value; the charts never ask beyond its ends. */
export function at(column: readonly number[], index: number): number {
  const value = column[index];
  if (value === undefined) throw new RangeError(`The column has no row ${index}; it has ${column.length}.`);
  return value;
}
