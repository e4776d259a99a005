import { describe, expect, it } from 'vitest';
import { budgetFromTimeline, ladderRows } from '../../src/charts/ladderArithmetic';
import { lossKinds, lossSharesDb } from '../../src/charts/lossShares';
import { at, passData, timeOf } from '../../src/charts/passData';
import { wireInstant } from '../../src/api/planner';
import { budget, passDetail, servedPasses, timeline } from '../mock/passes';
import { scenario, startMs } from '../mock/scenario';

const tenthOfANanodecibel = 1e-10;
const { stations, spacecraft } = scenario('mock');
/** A pass near the zenith, where the mount lags, so that every share of the losses moves. */
const served = servedPasses(stations, spacecraft, startMs, startMs + 6 * 3_600_000)
  .find((candidate) => Math.max(...timeline(candidate).pointingErrorDeg) > 0.2);
if (served === undefined) throw new Error('The invented scenario has no pass.');
const data = passData(passDetail(served, [], startMs), timeline(served));
const best = budget(served, timeOf(data, data.bestIndex));
const now = budget(served, timeOf(data, data.count - 20));

describe('the ladder', () => {
  it('starts at the best margin and ends at the cursor\u2019s', () => {
    const last = ladderRows(best, now).at(-1);
    expect(Math.abs((last?.levelDb ?? 0) - now.marginDb)).toBeLessThan(tenthOfANanodecibel);
  });

  it('marks one loss at most, the largest', () => {
    const rows = ladderRows(best, now);
    const marked = rows.filter((row) => row.isLargestLoss);
    expect(marked.map((row) => row.line.id)).toEqual(['freeSpaceLoss']);
    expect(marked[0]?.changeDb).toBe(Math.min(...rows.map((row) => row.changeDb)));
  });

  it('marks the first of two equal losses only', () => {
    const line = (id: string, valueDb: number) => ({ id, name: id, valueDb, unit: 'dB', kind: 'term' as const, source: '' });
    const rows = ladderRows({ ...best, marginDb: 0, lines: [line('a', 0), line('b', 0)] }, { ...best, lines: [line('a', -2), line('b', -2)] });
    expect(rows.map((row) => row.isLargestLoss)).toEqual([true, false]);
    expect(rows.map((row) => row.levelDb)).toEqual([-2, -4]);
  });

  it('marks nothing at the best second itself', () => {
    expect(ladderRows(best, best).some((row) => row.isLargestLoss)).toBe(false);
  });

  it('takes sums for what they are and does not count them twice', () => {
    expect(ladderRows(best, now).filter((row) => row.line.kind === 'sum').map((row) => row.changeDb)).toEqual([0, 0, 0, 0]);
  });
});

describe('the budget derived from the timeline', () => {
  const index = data.count - 20;
  const derived = budgetFromTimeline(best, data, index, wireInstant(timeOf(data, index)));

  it('has the lines that the service gives for that second', () => {
    for (const [place, line] of now.lines.entries()) expect(Math.abs((derived.lines[place]?.valueDb ?? NaN) - line.valueDb), line.id).toBeLessThan(tenthOfANanodecibel);
  });

  it('adds up to the timeline\u2019s margin', () => {
    const sum = derived.lines.filter((line) => line.kind === 'term').reduce((total, line) => total + line.valueDb, 0);
    expect(Math.abs(sum - at(data.robustMarginDb, index))).toBeLessThan(tenthOfANanodecibel);
    expect(Math.abs(derived.marginDb - sum)).toBeLessThan(tenthOfANanodecibel);
  });
});

describe('the stacked losses', () => {
  it('leave noise and polarisation to the rest, and nothing else', () => {
    const { timeline: columns, bestIndex } = data;
    const index = data.timeline.pointingErrorDeg.indexOf(Math.max(...data.timeline.pointingErrorDeg));
    const noiseDb = 10 * Math.log10(at(columns.systemNoiseTemperatureK, index) / at(columns.systemNoiseTemperatureK, bestIndex));
    const polarisationDb = at(columns.polarisationLossDb, index) - at(columns.polarisationLossDb, bestIndex);
    expect(Math.abs(lossSharesDb(data, index).rest - noiseDb - polarisationDb)).toBeLessThan(tenthOfANanodecibel);
  });

  it('add up to what the margin has lost since the best second, at every second', () => {
    for (let index = 0; index < data.count; index++) {
      const shares = lossSharesDb(data, index);
      const sum = lossKinds.reduce((total, kind) => total + shares[kind], 0);
      expect(Math.abs(sum - (at(data.robustMarginDb, data.bestIndex) - at(data.robustMarginDb, index)))).toBeLessThan(tenthOfANanodecibel);
    }
  });
});
