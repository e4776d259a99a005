import { describe, expect, it } from 'vitest';
import { timeScale, timeTicks, valueTicks } from '../../src/charts/timeScale';

const hourMs = 3_600_000;
const midnightMs = Date.UTC(2027, 2, 18);

describe('a time axis', () => {
  it('gives back the time of a pixel', () => {
    const scale = timeScale(midnightMs, midnightMs + 4 * hourMs, 176, 1376);
    expect(scale.timeAt(scale.x(midnightMs + hourMs))).toBe(midnightMs + hourMs);
  });

  it('has round ticks in the zone shown', () => {
    const scale = timeScale(midnightMs, midnightMs + 6 * hourMs, 0, 600);
    expect(timeTicks(scale, 90).map((tick) => (tick - midnightMs) / hourMs)).toEqual([0, 1, 2, 3, 4, 5]);
    expect(timeTicks(scale, 90, 0.5 * hourMs).map((tick) => (tick - midnightMs) / hourMs)).toEqual([0.5, 1.5, 2.5, 3.5, 4.5, 5.5]);
  });
});

describe('value ticks', () => {
  it('are round and stay inside', () => {
    expect(valueTicks(-4, 23, 3)).toEqual([0, 10, 20]);
    expect(valueTicks(5, 5, 3)).toEqual([5]);
  });
});
