/** Circular orbits over a turning, round Earth: enough to give the pages passes of the right shape. */

const earthRadiusKm = 6371;
const muKm3PerS2 = 398_600.44;
const earthRateRadPerS = 7.2921159e-5;
const degree = Math.PI / 180;

export interface CircularOrbit {
  readonly altitudeKm: number;
  readonly inclinationDeg: number;
  readonly nodeDeg: number;
  readonly phaseDeg: number;
}

export interface Place {
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
}

export interface Look {
  readonly azimuthDeg: number;
  readonly elevationDeg: number;
  readonly rangeKm: number;
}

export function look(orbit: CircularOrbit, place: Place, timeMs: number): Look {
  const seconds = timeMs / 1000 - 1_800_000_000;
  const radiusKm = earthRadiusKm + orbit.altitudeKm;
  const u = orbit.phaseDeg * degree + seconds * Math.sqrt(muKm3PerS2 / radiusKm ** 3);
  const node = orbit.nodeDeg * degree - seconds * earthRateRadPerS;
  const [cosI, sinI] = [Math.cos(orbit.inclinationDeg * degree), Math.sin(orbit.inclinationDeg * degree)];
  const x = radiusKm * (Math.cos(node) * Math.cos(u) - Math.sin(node) * Math.sin(u) * cosI);
  const y = radiusKm * (Math.sin(node) * Math.cos(u) + Math.cos(node) * Math.sin(u) * cosI);
  const z = radiusKm * Math.sin(u) * sinI;
  const [lat, lon] = [place.latitudeDeg * degree, place.longitudeDeg * degree];
  const up = [Math.cos(lat) * Math.cos(lon), Math.cos(lat) * Math.sin(lon), Math.sin(lat)] as const;
  const d = [x - earthRadiusKm * up[0], y - earthRadiusKm * up[1], z - earthRadiusKm * up[2]] as const;
  const east = -Math.sin(lon) * d[0] + Math.cos(lon) * d[1];
  const north = -Math.sin(lat) * Math.cos(lon) * d[0] - Math.sin(lat) * Math.sin(lon) * d[1] + Math.cos(lat) * d[2];
  const zenith = up[0] * d[0] + up[1] * d[1] + up[2] * d[2];
  const rangeKm = Math.hypot(...d);
  return {
    azimuthDeg: (Math.atan2(east, north) / degree + 360) % 360,
    elevationDeg: Math.asin(zenith / rangeKm) / degree,
    rangeKm,
  };
}

export interface Rise {
  readonly aosMs: number;
  readonly losMs: number;
}

/** All intervals above `maskDeg`, to the second. */
export function rises(orbit: CircularOrbit, place: Place, fromMs: number, toMs: number, maskDeg: number): Rise[] {
  const found: Rise[] = [];
  const isUp = (timeMs: number) => look(orbit, place, timeMs).elevationDeg > maskDeg;
  let aosMs: number | undefined;
  for (let timeMs = fromMs - 15 * 60_000; timeMs < toMs; timeMs += 30_000) {
    const now = isUp(timeMs);
    if (now && aosMs === undefined) aosMs = edge(isUp, timeMs - 30_000, timeMs);
    if (!now && aosMs !== undefined) {
      const losMs = edge(isUp, timeMs - 30_000, timeMs);
      if (losMs > fromMs) found.push({ aosMs, losMs });
      aosMs = undefined;
    }
  }
  return found;
}

function edge(isUp: (timeMs: number) => boolean, lowMs: number, highMs: number): number {
  const before = isUp(lowMs);
  while (highMs - lowMs > 500) {
    const middle = (lowMs + highMs) / 2;
    if (isUp(middle) === before) lowMs = middle;
    else highMs = middle;
  }
  return Math.round(highMs / 1000) * 1000;
}
