import { describe, expect, it } from 'vitest';
import { lightBands, sunElevationDeg } from '../../src/charts/sunlight';

const hourMs = 3_600_000;
const tenthOfADegree = 0.1;

describe('the Sun', () => {
  it('stands over the equator at the March equinox', () => {
    // Equinox of 2027: 20 March 20:25 UTC; the equation of time is then -7.4 minutes, so the subpoint lies at 124.4 degrees west.
    const equinoxMs = Date.UTC(2027, 2, 20, 20, 25);
    expect(Math.abs(sunElevationDeg(equinoxMs, 0, -124.4) - 90)).toBeLessThan(3 * tenthOfADegree);
  });

  it('stands 23.4 degrees up at the pole at the June solstice', () => {
    expect(Math.abs(sunElevationDeg(Date.UTC(2027, 5, 21, 14, 11), 90, 0) - 23.44)).toBeLessThan(tenthOfADegree);
  });

  it('leaves a polar day without bands and a polar night in one', () => {
    const june = Date.UTC(2027, 5, 21);
    expect(lightBands(june, june + 24 * hourMs, 78, 21, hourMs / 6)).toEqual([]);
    const december = Date.UTC(2027, 11, 21);
    expect(lightBands(december, december + 24 * hourMs, 85, 21, hourMs / 6).map((band) => band.light)).toEqual(['night']);
  });
});
