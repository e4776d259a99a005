import { describe, expect, it } from 'vitest';
import { packLane } from '../../src/charts/laneLayout';

const box = (left: number, right: number, above = 20, below = 10) => ({ left, right, above, below });

describe('packing a lane', () => {
  it('keeps passes that are clear of each other in one row', () => {
    expect(packLane([box(0, 50), box(60, 90)], 4, 0).rows).toEqual([0, 0]);
  });

  it('stacks passes that overlap, labels included', () => {
    expect(packLane([box(0, 50), box(52, 90), box(70, 99)], 4, 0).rows).toEqual([0, 1, 0]);
  });

  it('makes rows as tall as their hills', () => {
    const layout = packLane([box(0, 50, 40, 10), box(10, 60, 5, 2)], 4, 0);
    expect(layout.baselines).toEqual([44, 63]);
    expect(layout.height).toBe(69);
  });

  it('never makes a lane lower than its name', () => {
    expect(packLane([], 4, 54).height).toBe(54);
  });
});
