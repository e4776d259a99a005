/** A linear time axis from pixel `left` to pixel `right`. */
export interface TimeScale {
  readonly fromMs: number;
  readonly toMs: number;
  readonly left: number;
  readonly right: number;
  readonly x: (timeMs: number) => number;
  readonly timeAt: (x: number) => number;
}

export function timeScale(fromMs: number, toMs: number, left: number, right: number): TimeScale {
  const pxPerMs = (right - left) / (toMs - fromMs);
  return {
    fromMs, toMs, left, right,
    x: (timeMs) => left + (timeMs - fromMs) * pxPerMs,
    timeAt: (x) => fromMs + (x - left) / pxPerMs,
  };
}

const minuteMs = 60_000;
const stepsMs = [0.5, 1, 2, 5, 10, 15, 30, 60, 120, 180, 360, 720, 1440].map((minutes) => minutes * minuteMs);

/** Round instants on the axis, at least `leastPx` apart; offset is the zone's, so that local hours come out round. */
export function timeTicks(scale: TimeScale, leastPx: number, offsetMs = 0): number[] {
  const msPerPx = (scale.toMs - scale.fromMs) / (scale.right - scale.left);
  const stepMs = stepsMs.find((step) => step >= leastPx * msPerPx) ?? 1440 * minuteMs;
  const ticks: number[] = [];
  const first = Math.ceil((scale.fromMs + offsetMs) / stepMs) * stepMs - offsetMs;
  for (let tick = first; tick < scale.toMs; tick += stepMs) ticks.push(tick);
  return ticks;
}

const niceFactors = [1, 2, 2.5, 5, 10];

/** A round step that parts a span into `count` intervals or fewer. */
export function roundStep(span: number, count: number): number {
  const rough = span / count;
  if (!(rough > 0)) return 1;
  const power = 10 ** Math.floor(Math.log10(rough));
  return power * (niceFactors.find((factor) => factor * power >= rough * 0.999) ?? 10);
}

/** Round values from low to high, `count` intervals or fewer. */
export function valueTicks(low: number, high: number, count: number): number[] {
  if (!(high > low)) return [low];
  const step = roundStep(high - low, count);
  const ticks: number[] = [];
  for (let index = Math.ceil(low / step - 1e-9); index * step <= high + step * 1e-9; index++) ticks.push(Number((index * step).toPrecision(12)));
  return ticks;
}
