import type { Radio, Spacecraft, Station } from '../api/profiles';
import { bitRate } from './amount';
import { plain } from './number';

/** 78.1000° N 21.3000° E, 310 m */
export function position(station: Station): string {
  const { latitudeDeg, longitudeDeg, heightM } = station.position;
  const east = longitudeDeg > 180 ? longitudeDeg - 360 : longitudeDeg;
  return `${Math.abs(latitudeDeg).toFixed(4)}° ${latitudeDeg < 0 ? 'S' : 'N'} ${Math.abs(east).toFixed(4)}° ${east < 0 ? 'W' : 'E'}, ${(heightM ?? 0).toFixed(0).replace('-', '\u2212')}\u00a0m`;
}

/** The antennas of a station by name. */
export function antennas(station: Station): string {
  return station.antennas.length === 0 ? 'no antenna yet' : station.antennas.map((antenna) => antenna.name).join(', ');
}

/** 8200 MHz, up to 37.5 Mbit/s */
export function radio(entry: Radio): string {
  const rates = (entry.waveforms ?? []).map((waveform) => waveform.bitRateBps);
  const frequency = `${String(Number((entry.frequencyHz / 1e6).toFixed(3)))}\u00a0MHz`;
  return rates.length === 0 ? frequency : `${frequency}, up to ${plain(bitRate(Math.max(...rates)))}`;
}

export function radios(spacecraft: Spacecraft): string {
  const down = (spacecraft.transmitters ?? []).map((entry) => `down ${radio(entry)}`);
  const up = (spacecraft.receivers ?? []).map((entry) => `up ${radio(entry)}`);
  return [...down, ...up].join('; ') || 'no radio yet';
}

/** Orbital figures of an element set: 15.19 rev/day, 97.5°, e 0.0004 */
export function orbit(entry: { readonly meanMotionRevPerDay: number; readonly inclinationDeg: number; readonly eccentricity: number }): string {
  return `${entry.meanMotionRevPerDay.toFixed(4)}\u00a0rev/day, inclined ${entry.inclinationDeg.toFixed(2)}°, eccentricity ${entry.eccentricity.toFixed(5)}`;
}
