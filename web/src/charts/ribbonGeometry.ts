import type { MarginProfile, TimeWindow } from '../api/passes';

/** Tints of the margin above required: one step each 3 dB, each doubling the power. */
export type Tint = 1 | 2 | 3 | 4;

const tintStepDb = 3;
const tintEdgesDb = [0, 3, 6, 9] as const;

/** The ribbon's scale ends here; beyond it the hill is flat. */
export const lowestExcessDb = -6;
export const highestExcessDb = 15;

/** A point of the margin curve: time against margin less required. */
export interface CurvePoint {
  readonly timeMs: number;
  readonly excessDb: number;
}

/** A run of one treatment: a tint where usable, hatch (tint undefined) elsewhere. */
export interface Run {
  readonly tint: Tint | undefined;
  readonly points: readonly CurvePoint[];
}

export function tintOf(excessDb: number): Tint {
  const step = Math.floor(excessDb / tintStepDb) + 1;
  return Math.min(4, Math.max(1, step)) as Tint;
}

/** The curve of a profile from AOS to LOS; the last sample is carried on to LOS along the last slope. */
export function curveOf(profile: MarginProfile, losMs: number): CurvePoint[] {
  const startMs = Date.parse(profile.startUtc);
  const points = profile.marginDb.map((marginDb, index) => ({
    timeMs: startMs + index * profile.stepS * 1000,
    excessDb: marginDb - profile.requiredMarginDb,
  }));
  const last = points.at(-1);
  const before = points.at(-2);
  if (last !== undefined && before !== undefined && losMs > last.timeMs) {
    const slope = (last.excessDb - before.excessDb) / (last.timeMs - before.timeMs);
    points.push({ timeMs: losMs, excessDb: last.excessDb + slope * (losMs - last.timeMs) });
  }
  return points;
}

/**
 * Cuts the curve where its treatment changes: at the edges of usable windows, where it crosses a tint's edge,
 * and (when clamped) where it leaves the scale. Neighbouring runs share their edge point.
 */
export function runsOf(
  curve: readonly CurvePoint[],
  windows: readonly TimeWindow[],
  clamp: { readonly lowDb: number; readonly highDb: number } = { lowDb: lowestExcessDb, highDb: highestExcessDb },
): Run[] {
  const edgesMs = windows.flatMap((window) => [Date.parse(window.startUtc), Date.parse(window.endUtc)]);
  const levelsDb = [...tintEdgesDb, clamp.lowDb, clamp.highDb];
  const runs: { tint: Tint | undefined; points: CurvePoint[] }[] = [];
  for (let index = 1; index < curve.length; index++) {
    const from = curve[index - 1];
    const to = curve[index];
    if (from === undefined || to === undefined) continue;
    let previous = from;
    for (const fraction of cutFractions(from, to, edgesMs, levelsDb)) {
      const point = between(from, to, fraction);
      const middleMs = (previous.timeMs + point.timeMs) / 2;
      const usable = isWithin(middleMs, windows);
      const tint = usable ? tintOf(Math.max(0, (previous.excessDb + point.excessDb) / 2)) : undefined;
      extend(runs, tint, clamped(previous, clamp), clamped(point, clamp));
      previous = point;
    }
  }
  return runs;
}

function cutFractions(from: CurvePoint, to: CurvePoint, edgesMs: readonly number[], levelsDb: readonly number[]): number[] {
  const fractions = [1];
  const add = (fraction: number) => {
    if (fraction > 0 && fraction < 1) fractions.push(fraction);
  };
  for (const edgeMs of edgesMs) add((edgeMs - from.timeMs) / (to.timeMs - from.timeMs));
  const riseDb = to.excessDb - from.excessDb;
  if (riseDb !== 0) for (const levelDb of levelsDb) add((levelDb - from.excessDb) / riseDb);
  return [...new Set(fractions)].sort((first, second) => first - second);
}

function between(from: CurvePoint, to: CurvePoint, fraction: number): CurvePoint {
  if (fraction === 1) return to;
  return {
    timeMs: from.timeMs + fraction * (to.timeMs - from.timeMs),
    excessDb: from.excessDb + fraction * (to.excessDb - from.excessDb),
  };
}

function clamped(point: CurvePoint, clamp: { readonly lowDb: number; readonly highDb: number }): CurvePoint {
  return { timeMs: point.timeMs, excessDb: Math.min(clamp.highDb, Math.max(clamp.lowDb, point.excessDb)) };
}

function isWithin(timeMs: number, windows: readonly TimeWindow[]): boolean {
  return windows.some((window) => timeMs >= Date.parse(window.startUtc) && timeMs < Date.parse(window.endUtc));
}

function extend(runs: { tint: Tint | undefined; points: CurvePoint[] }[], tint: Tint | undefined, from: CurvePoint, to: CurvePoint): void {
  const last = runs.at(-1);
  if (last !== undefined && last.tint === tint) last.points.push(to);
  else runs.push({ tint, points: [from, to] });
}

/** Where times and margins stand on the screen. */
export interface Scale {
  readonly x: (timeMs: number) => number;
  readonly y: (excessDb: number) => number;
}

/** The outline of a run down to the required line, closed. */
export function areaPath(run: Run, scale: Scale): string {
  const first = run.points[0];
  const last = run.points.at(-1);
  if (first === undefined || last === undefined) return '';
  const base = coordinate(scale.y(0));
  return `M${coordinate(scale.x(first.timeMs))} ${base}${linePath(run, scale).replace('M', 'L')}L${coordinate(scale.x(last.timeMs))} ${base}Z`;
}

/** The curve of a run, open. */
export function linePath(run: Run, scale: Scale): string {
  return run.points
    .map((point, index) => `${index === 0 ? 'M' : 'L'}${coordinate(scale.x(point.timeMs))} ${coordinate(scale.y(point.excessDb))}`)
    .join('');
}

/** Joins neighbouring runs of one kind (usable or not), whatever their tints, so that a crest is one line. */
export function joined(runs: readonly Run[], usable: boolean): Run[] {
  const lines: { tint: Tint | undefined; points: CurvePoint[] }[] = [];
  let open = false;
  for (const run of runs) {
    if ((run.tint !== undefined) !== usable) {
      open = false;
      continue;
    }
    const last = lines.at(-1);
    if (open && last !== undefined) last.points.push(...run.points.slice(1));
    else lines.push({ tint: run.tint, points: [...run.points] });
    open = true;
  }
  return lines;
}

/**
 * How high the hill stands: the most robust waveform's greatest margin over the required one. The pass's own highest margin
 * is that of the best waveform at each second, which falls back at every step of the rate.
 */
export function peakExcessDb(pass: { readonly marginProfile?: MarginProfile | undefined; readonly highestMarginDb: number; readonly requiredMarginDb: number }): number {
  const { marginProfile } = pass;
  return marginProfile === undefined || marginProfile.marginDb.length === 0
    ? pass.highestMarginDb - pass.requiredMarginDb
    : Math.max(...marginProfile.marginDb) - marginProfile.requiredMarginDb;
}

/** The deepest tint of a pass; undefined when nothing of it is usable. */
export function highestTint(usableS: number, excessDb: number): Tint | undefined {
  return usableS > 0 ? tintOf(Math.max(0, excessDb)) : undefined;
}

/** Half a pixel's tenth is finer than any screen; shorter paths are quicker to draw. */
function coordinate(value: number): string {
  return String(Math.round(value * 20) / 20);
}
