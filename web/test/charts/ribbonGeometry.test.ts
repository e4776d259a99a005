import { describe, expect, it } from 'vitest';
import { areaPath, curveOf, highestTint, joined, peakExcessDb, runsOf, tintOf, type CurvePoint } from '../../src/charts/ribbonGeometry';

const startMs = Date.UTC(2027, 2, 18, 4, 0, 0);
const instant = (second: number) => new Date(startMs + second * 1000).toISOString();
const point = (second: number, excessDb: number): CurvePoint => ({ timeMs: startMs + second * 1000, excessDb });
const seconds = (runs: readonly { points: readonly CurvePoint[] }[]) =>
  runs.map((run) => [run.points[0], run.points.at(-1)].map((edge) => ((edge?.timeMs ?? 0) - startMs) / 1000));

describe('tints', () => {
  it('deepen every 3 dB and stay at the deepest from 9 dB on', () => {
    expect([0, 2.99, 3, 5.9, 6, 8.9, 9, 30].map(tintOf)).toEqual([1, 1, 2, 2, 3, 3, 4, 4]);
  });

  it('are none for a pass without a usable second, however high its margin', () => {
    expect(highestTint(0, 9)).toBeUndefined();
    expect(highestTint(60, 9)).toBe(4);
  });
});

describe('the curve of a profile', () => {
  it('reaches from AOS to LOS along its last slope', () => {
    const profile = { startUtc: instant(0), stepS: 10, requiredMarginDb: 3, marginDb: [3, 5, 7], usable: [0, 1, 1] };
    const curve = curveOf(profile, startMs + 25_000);
    expect(curve.map((each) => each.excessDb)).toEqual([0, 2, 4, 5]);
    expect(curve.at(-1)?.timeMs).toBe(startMs + 25_000);
  });
});

describe('runs', () => {
  const hill = [point(0, -3), point(10, 7), point(20, -3)];

  it('cut the curve where it crosses the line and each tint, between samples', () => {
    const runs = runsOf(hill, [{ startUtc: instant(3), endUtc: instant(17) }]);
    expect(runs.map((run) => run.tint)).toEqual([undefined, 1, 2, 3, 2, 1, undefined]);
    expect(seconds(runs)).toEqual([[0, 3], [3, 6], [6, 9], [9, 11], [11, 14], [14, 17], [17, 20]]);
  });

  it('reach all four tints on the way up to 10 dB', () => {
    const runs = runsOf([point(0, 0), point(10, 10)], [{ startUtc: instant(0), endUtc: instant(10) }]);
    expect(runs.map((run) => run.tint)).toEqual([1, 2, 3, 4]);
    expect(seconds(runs)).toEqual([[0, 3], [3, 6], [6, 9], [9, 10]]);
  });

  it('hatch the seconds of acquisition although the link closes', () => {
    const runs = runsOf(hill, [{ startUtc: instant(5), endUtc: instant(17) }]);
    expect(runs[0]?.tint).toBeUndefined();
    expect(seconds(runs)[0]).toEqual([0, 5]);
    expect(runs[1]?.tint).toBe(1);
  });

  it('hatch everything when nothing is usable', () => {
    const runs = runsOf(hill, []);
    expect(runs).toHaveLength(1);
    expect(joined(runs, true)).toHaveLength(0);
  });

  it('are flat beyond -6 and +15 dB', () => {
    const runs = runsOf([point(0, -20), point(10, 40)], [{ startUtc: instant(4), endUtc: instant(10) }]);
    const heights = runs.flatMap((run) => run.points.map((each) => each.excessDb));
    expect(Math.min(...heights)).toBe(-6);
    expect(Math.max(...heights)).toBe(15);
  });

  it('share their edges, so that no gap shows between tints', () => {
    const runs = runsOf(hill, [{ startUtc: instant(3), endUtc: instant(17) }]);
    for (let index = 1; index < runs.length; index++) expect(runs[index]?.points[0]).toEqual(runs[index - 1]?.points.at(-1));
  });

  it('join their tints into one crest for each usable window', () => {
    const windows = [{ startUtc: instant(4), endUtc: instant(8) }, { startUtc: instant(12), endUtc: instant(16) }];
    expect(seconds(joined(runsOf(hill, windows), true))).toEqual([[4, 8], [12, 16]]);
  });
});

describe('an area', () => {
  it('stands on the required line and is closed', () => {
    const scale = { x: (timeMs: number) => (timeMs - startMs) / 1000, y: (excessDb: number) => -excessDb };
    expect(areaPath({ tint: 1, points: [point(0, 0), point(10, 2)] }, scale)).toBe('M0 0L0 0L10 -2L10 0Z');
  });
});

describe('the height of a hill', () => {
  const profile = { startUtc: '2026-03-18T04:00:00Z', stepS: 10, requiredMarginDb: 3, marginDb: [-1, 17, 12], usable: [0, 1, 1] };

  it('is that of the most robust waveform, not of the one in use', () => {
    expect(peakExcessDb({ marginProfile: profile, highestMarginDb: 6, requiredMarginDb: 3 })).toBe(14);
  });

  it('follows from the highest margin where there is no profile', () => {
    expect(peakExcessDb({ highestMarginDb: 6, requiredMarginDb: 3 })).toBe(3);
  });
});
