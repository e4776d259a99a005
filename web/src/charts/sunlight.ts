/** How light the sky of a place is; the edges are the Sun's centre at -0.833 and -6 degrees. */
export type Light = 'day' | 'dusk' | 'night';

const degree = Math.PI / 180;
const j2000Ms = Date.UTC(2000, 0, 1, 12);

/**
 * Elevation of the Sun's centre, degrees, by the low-precision formulae of the Astronomical Almanac (page C5);
 * within 0.05 degrees from 1950 to 2050, ample for a shade behind a chart.
 */
export function sunElevationDeg(timeMs: number, latitudeDeg: number, longitudeDeg: number): number {
  const days = (timeMs - j2000Ms) / 86_400_000;
  const meanLongitudeDeg = 280.46 + 0.9856474 * days;
  const anomaly = (357.528 + 0.9856003 * days) * degree;
  const eclipticLongitude = (meanLongitudeDeg + 1.915 * Math.sin(anomaly) + 0.02 * Math.sin(2 * anomaly)) * degree;
  const obliquity = (23.439 - 0.0000004 * days) * degree;
  const rightAscension = Math.atan2(Math.cos(obliquity) * Math.sin(eclipticLongitude), Math.cos(eclipticLongitude));
  const sineDeclination = Math.sin(obliquity) * Math.sin(eclipticLongitude);
  const siderealDeg = 280.46062 + 360.98564737 * days;
  const hourAngle = (siderealDeg + longitudeDeg) * degree - rightAscension;
  const latitude = latitudeDeg * degree;
  const sineElevation = Math.sin(latitude) * sineDeclination
    + Math.cos(latitude) * Math.sqrt(1 - sineDeclination ** 2) * Math.cos(hourAngle);
  return Math.asin(Math.min(1, Math.max(-1, sineElevation))) / degree;
}

export interface LightBand {
  readonly light: Light;
  readonly fromMs: number;
  readonly toMs: number;
}

/** The dusks and nights of a period, edges to the step. */
export function lightBands(fromMs: number, toMs: number, latitudeDeg: number, longitudeDeg: number, stepMs: number): LightBand[] {
  const bands: { light: Light; fromMs: number; toMs: number }[] = [];
  for (let timeMs = fromMs; timeMs < toMs; timeMs += stepMs) {
    const elevationDeg = sunElevationDeg(timeMs + stepMs / 2, latitudeDeg, longitudeDeg);
    const light: Light = elevationDeg >= -0.833 ? 'day' : elevationDeg >= -6 ? 'dusk' : 'night';
    const endMs = Math.min(toMs, timeMs + stepMs);
    const last = bands.at(-1);
    if (last !== undefined && last.light === light) last.toMs = endMs;
    else bands.push({ light, fromMs: timeMs, toMs: endMs });
  }
  return bands.filter((band) => band.light !== 'day');
}
