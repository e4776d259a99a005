import { describe, expect, it } from 'vitest';
import { maskElevationDeg, skyPoint } from '../../src/charts/skyView';

describe('the sky', () => {
  it('has the zenith in the centre, north up and east to the right', () => {
    const zenith = skyPoint(0, 90);
    const north = skyPoint(0, 0);
    const east = skyPoint(90, 0);
    expect(north.x).toBeCloseTo(zenith.x, 9);
    expect(north.y).toBeLessThan(zenith.y);
    expect(east.x).toBeGreaterThan(zenith.x);
  });

  it('is linear in zenith angle', () => {
    const zenith = skyPoint(0, 90);
    expect(zenith.y - skyPoint(0, 45).y).toBeCloseTo((zenith.y - skyPoint(0, 0).y) / 2, 9);
  });
});

describe('the mask', () => {
  it('is linear between its points and goes round', () => {
    const mask = [{ azimuthDeg: 90, elevationDeg: 10 }, { azimuthDeg: 350, elevationDeg: 4 }];
    expect(maskElevationDeg(mask, 220)).toBeCloseTo(7, 9);
    expect(maskElevationDeg(mask, 40)).toBeCloseTo(7, 9);
    expect(maskElevationDeg(mask, 350)).toBe(4);
    expect(maskElevationDeg(mask, 355)).toBeCloseTo(4.3, 9);
  });

  it('is a constant with one point', () => {
    expect(maskElevationDeg([{ azimuthDeg: 200, elevationDeg: 8 }], 10)).toBe(8);
  });
});
