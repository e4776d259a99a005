import type { LinkReference, Pass, PassDetail, TimeWindow, Verdict } from '../../src/api/passes';
import type { Budget, BudgetLine, Timeline } from '../../src/api/timeline';
import { look, rises } from './orbit.ts';
import { frequencyHz, type MockSpacecraft, type MockStation } from './scenario.ts';

const waveforms = {
  x: [['QPSK 1/2', 12.5e6, 1.05], ['QPSK 3/4', 18.75e6, 2.31], ['8PSK 2/3', 25e6, 3.65], ['16APSK 3/4', 37.5e6, 5.49]],
  s: [['QPSK 1/2', 1e6, 1.05], ['QPSK 3/4', 1.5e6, 2.31], ['8PSK 5/6', 3e6, 6.4]],
  uhf: [['GMSK', 9600, 8.4]],
} as const;
const implementationLossDb = 1.5;
const requiredMarginDb = 3;
const acquisitionMs = 10_000;
const lightKmPerS = 299_792.458;

type Antenna = MockStation['antennas'][number];

interface Second {
  readonly timeMs: number;
  readonly azimuthDeg: number;
  readonly elevationDeg: number;
  readonly rangeKm: number;
  readonly rangeRateKmPerS: number;
  readonly freeSpaceLossDb: number;
  readonly spacecraftGainDb: number;
  readonly atmosphericLossDb: number;
  readonly polarisationLossDb: number;
  readonly noiseRiseDb: number;
  readonly pointingLossDb: number;
  readonly pointingErrorDeg: number;
  readonly cOverN0DbHz: number;
}

export interface Served {
  readonly spacecraft: MockSpacecraft;
  readonly station: MockStation;
  readonly antenna: Antenna;
  readonly aosMs: number;
  readonly losMs: number;
}

export function servedPasses(stations: readonly MockStation[], spacecraft: readonly MockSpacecraft[], fromMs: number, toMs: number): Served[] {
  const served = stations.flatMap((station) => spacecraft.flatMap((craft) => {
    const antennas = station.antennas.filter((antenna) => antenna.band === craft.band);
    if (craft.orbit === undefined || antennas.length === 0) return [];
    return rises(craft.orbit, station, fromMs, toMs, 5).flatMap((rise) => antennas.map((antenna) => ({ spacecraft: craft, station, antenna, ...rise })));
  }));
  return served.sort((first, second) => first.aosMs - second.aosMs);
}

function secondAt(served: Served, timeMs: number): Second {
  const { spacecraft, station, antenna } = served;
  const orbit = spacecraft.orbit;
  if (orbit === undefined) throw new Error('no orbit');
  const here = look(orbit, station, timeMs);
  const rangeRateKmPerS = look(orbit, station, timeMs + 500).rangeKm - look(orbit, station, timeMs - 500).rangeKm;
  const sine = Math.sin(Math.max(1, here.elevationDeg) * Math.PI / 180);
  const freeSpaceLossDb = 20 * Math.log10(here.rangeKm) + 20 * Math.log10(frequencyHz[spacecraft.band] / 1e9) + 92.448;
  const spacecraftGainDb = -4 * (1 - sine) ** 1.5;
  const atmosphericLossDb = 0.35 / sine;
  const polarisationLossDb = 0.2 + 0.8 * (1 - sine);
  const noiseRiseDb = 1.2 * (1 / sine - 1) / 6;
  const keyhole = Math.max(0, here.elevationDeg - 84) / 6;
  const pointingErrorDeg = 0.05 + 0.4 * keyhole;
  const pointingLossDb = 12 * (pointingErrorDeg / 0.64) ** 2;
  const cOverN0DbHz = spacecraft.eirpDbw + spacecraftGainDb - freeSpaceLossDb - atmosphericLossDb - polarisationLossDb
    - pointingLossDb + antenna.gOverTDbPerK - noiseRiseDb + 228.599;
  return { timeMs, ...here, rangeRateKmPerS, freeSpaceLossDb, spacecraftGainDb, atmosphericLossDb, polarisationLossDb, noiseRiseDb, pointingLossDb, pointingErrorDeg, cOverN0DbHz };
}

function marginDb(cOverN0DbHz: number, [, bitRateBps, requiredEbN0Db]: readonly [string, number, number]): number {
  return cOverN0DbHz - 10 * Math.log10(bitRateBps) - requiredEbN0Db - implementationLossDb;
}

function secondsOf(served: Served, stepS: number): Second[] {
  const seconds: Second[] = [];
  for (let timeMs = served.aosMs; timeMs < served.losMs; timeMs += stepS * 1000) seconds.push(secondAt(served, timeMs));
  return seconds;
}

function usableFlags(served: Served, seconds: readonly Second[]): boolean[] {
  const robust = waveforms[served.spacecraft.band][0];
  let firstMs: number | undefined;
  return seconds.map((second) => {
    const closes = marginDb(second.cOverN0DbHz, robust) >= requiredMarginDb;
    if (closes) firstMs ??= second.timeMs;
    return closes && firstMs !== undefined && second.timeMs - firstMs >= acquisitionMs;
  });
}

function bestWaveform(served: Served, second: Second): number {
  const table = waveforms[served.spacecraft.band];
  let best = 0;
  for (const [index, waveform] of table.entries()) if (marginDb(second.cOverN0DbHz, waveform) >= requiredMarginDb) best = index;
  return best;
}

function link(served: Served): LinkReference {
  return { direction: 'downlink', radio: `${served.spacecraft.band}-tx`, chain: `${served.antenna.band}-rx` };
}

const iso = (timeMs: number) => new Date(timeMs).toISOString().replace('.000Z', 'Z');

export function passItem(served: Served, profileStepS: number | undefined, nowMs: number): Pass {
  const { spacecraft, station, antenna } = served;
  const seconds = secondsOf(served, 1);
  const usable = usableFlags(served, seconds);
  const table = waveforms[spacecraft.band];
  const margins = seconds.map((second) => marginDb(second.cOverN0DbHz, table[0]));
  const windows: TimeWindow[] = [];
  let start: number | undefined;
  for (let index = 0; index <= seconds.length; index++) {
    const on = usable[index] === true;
    const timeMs = served.aosMs + index * 1000;
    if (on) start ??= timeMs;
    else if (start !== undefined) {
      windows.push({ startUtc: iso(start), endUtc: iso(timeMs) });
      start = undefined;
    }
  }
  const usableS = usable.filter(Boolean).length;
  const bits = seconds.reduce((sum, second, index) => sum + (usable[index] === true ? table[bestWaveform(served, second)]?.[1] ?? 0 : 0), 0);
  const topIndex = seconds.reduce((top, second, index) => (second.elevationDeg > (seconds[top]?.elevationDeg ?? 0) ? index : top), 0);
  const top = seconds[topIndex];
  const highest = Math.max(...margins);
  const verdict: Verdict = usableS === 0 ? 'doesNotClose' : seconds.every((second, index) => second.elevationDeg < 10 || usable[index] === true) ? 'closes' : 'closesInPart';
  const change = Math.min(...margins) - highest;
  const firstUsable = seconds[usable.indexOf(true)];
  const lastUsable = seconds[usable.lastIndexOf(true)];
  const rates = seconds.filter((_, index) => usable[index] === true).map((second) => table[bestWaveform(served, second)]?.[1] ?? 0);
  const ageH = spacecraft.isStale ? 148.8 : 9.8;
  const query = `antenna=${antenna.id}&link=${link(served).radio}:${link(served).chain}`;
  const address = `/api/v1/passes/${spacecraft.document.id}/${station.document.id}/${iso((served.aosMs + served.losMs) / 2)}`;
  return {
    spacecraft: spacecraft.document.id, spacecraftName: spacecraft.document.name, station: station.document.id, stationName: station.document.name,
    antenna: antenna.id, antennaName: antenna.name, link: link(served),
    aosUtc: iso(served.aosMs), losUtc: iso(served.losMs), aosIsOpen: false, losIsOpen: false, durationS: (served.losMs - served.aosMs) / 1000,
    maximumElevationUtc: iso(top?.timeMs ?? 0), maximumElevationDeg: top?.elevationDeg ?? 0,
    closestApproachUtc: iso(top?.timeMs ?? 0), closestRangeKm: top?.rangeKm ?? 0,
    aosAzimuthDeg: seconds[0]?.azimuthDeg ?? 0, losAzimuthDeg: seconds.at(-1)?.azimuthDeg ?? 0,
    verdict, requiredMarginDb, highestMarginDb: highest, lowestMarginDb: Math.min(...margins),
    limitingCause: verdict === 'closes' ? '' : verdict === 'closesInPart' ? `Range, −${Math.abs(change).toFixed(1)} dB, below ${(firstUsable?.elevationDeg ?? 0).toFixed(0)}°` : `Best second is ${(requiredMarginDb - highest).toFixed(1)} dB short`,
    cause: verdict === 'doesNotClose' ? { kind: 'power', shortByDb: requiredMarginDb - highest } : verdict === 'closes' ? { kind: 'none' } : { kind: 'range', changeDb: change },
    usableWindows: windows, usableS, yieldBytes: bits / 8, highestBitRateBps: Math.max(0, ...rates),
    ...(firstUsable === undefined || lastUsable === undefined ? {} : { usableElevationFromDeg: firstUsable.elevationDeg, usableElevationToDeg: lastUsable.elevationDeg }),
    elementSet: { epochUtc: iso(nowMs - ageH * 3_600_000), ageH, limitH: 72, isStale: spacecraft.isStale, ...(spacecraft.isStale ? { timingErrorS: 25 } : {}) },
    passUrl: `${address}?${query}`,
    ...(profileStepS === undefined ? {} : {
      marginProfile: {
        startUtc: iso(served.aosMs), stepS: profileStepS, requiredMarginDb,
        marginDb: margins.filter((_, index) => index % profileStepS === 0).map((value) => Number(value.toFixed(2))),
        usable: usable.filter((_, index) => index % profileStepS === 0).map(Number),
      },
    }),
  };
}

export function passDetail(served: Served, others: readonly Served[], nowMs: number): PassDetail {
  const item = passItem(served, undefined, nowMs);
  const [path = '', query = ''] = item.passUrl.split('?');
  const seconds = secondsOf(served, 1);
  const best = seconds.reduce((top, second) => (second.cOverN0DbHz > top.cOverN0DbHz ? second : top));
  return {
    ...item, timelineUrl: `${path}/timeline?${query}`, budgetUrl: `${path}/budget?${query}`, pointingUrl: `${path}/pointing?${query}`,
    stationRevision: 7, spacecraftRevision: 12,
    horizonMask: [{ azimuthDeg: 0, elevationDeg: 5 }, { azimuthDeg: 75, elevationDeg: 12 }, { azimuthDeg: 140, elevationDeg: 6 }, { azimuthDeg: 260, elevationDeg: 8 }],
    waveforms: waveforms[served.spacecraft.band].map(([name, bitRateBps, requiredEbN0Db], index) => ({ index, name, bitRateBps, requiredEbN0Db, implementationLossDb })),
    mostRobustWaveform: 0, bestUtc: iso(best.timeMs), frequencyHz: frequencyHz[served.spacecraft.band],
    sun: { azimuthDeg: 96, elevationDeg: 4 },
    models: [{ name: 'SGP4', edition: 'AIAA 2006-6753', note: '' }, { name: 'Free-space loss', edition: 'ITU-R P.525-5', note: '' }],
    alternatives: others.map((other) => {
      const alternative = passItem(other, undefined, nowMs);
      return { antenna: alternative.antenna, antennaName: alternative.antennaName, link: alternative.link, passUrl: alternative.passUrl, verdict: alternative.verdict, yieldBytes: alternative.yieldBytes };
    }),
  };
}

export function timeline(served: Served): Timeline {
  const seconds = secondsOf(served, 1);
  const usable = usableFlags(served, seconds);
  const table = waveforms[served.spacecraft.band];
  const chosen = seconds.map((second) => bestWaveform(served, second));
  const carrier = frequencyHz[served.spacecraft.band];
  const dopplerHz = seconds.map((second) => -second.rangeRateKmPerS / lightKmPerS * carrier);
  return {
    startUtc: iso(served.aosMs), stepS: 1,
    azimuthDeg: seconds.map((second) => second.azimuthDeg), elevationDeg: seconds.map((second) => second.elevationDeg),
    apparentElevationDeg: seconds.map((second) => second.elevationDeg + 0.1), slantRangeKm: seconds.map((second) => second.rangeKm),
    rangeRateKmPerS: seconds.map((second) => second.rangeRateKmPerS), dopplerHz,
    dopplerRateHzPerS: dopplerHz.map((value, index) => (dopplerHz[index + 1] ?? value) - value),
    pointingErrorDeg: seconds.map((second) => second.pointingErrorDeg), groundGainDbi: seconds.map((second) => 48 - second.pointingLossDb),
    spacecraftOffAxisDeg: seconds.map((second) => 64 - second.elevationDeg * 0.7), spacecraftGainDbi: seconds.map((second) => 6 + second.spacecraftGainDb),
    freeSpaceLossDb: seconds.map((second) => second.freeSpaceLossDb), atmosphericLossDb: seconds.map((second) => second.atmosphericLossDb),
    polarisationLossDb: seconds.map((second) => second.polarisationLossDb),
    systemNoiseTemperatureK: seconds.map((second) => 160 * 10 ** (second.noiseRiseDb / 10)),
    gOverTDbPerK: seconds.map((second) => served.antenna.gOverTDbPerK - second.noiseRiseDb), cOverN0DbHz: seconds.map((second) => second.cOverN0DbHz),
    powerFluxDensityDbWPerM2: seconds.map((second) => served.spacecraft.eirpDbw + second.spacecraftGainDb - 20 * Math.log10(second.rangeKm * 1000) - 11),
    waveform: chosen, marginDb: seconds.map((second, index) => marginDb(second.cOverN0DbHz, table[chosen[index] ?? 0] ?? table[0])),
    usable: usable.map(Number), bitRateBps: chosen.map((waveform, index) => (usable[index] === true ? table[waveform]?.[1] ?? 0 : 0)),
    waveforms: table.map((waveform) => ({ name: waveform[0], bitRateBps: waveform[1], requiredMarginDb, marginDb: seconds.map((second) => marginDb(second.cOverN0DbHz, waveform)) })),
  };
}

export function budget(served: Served, atMs: number): Budget {
  const second = secondAt(served, atMs);
  const [name, bitRateBps, requiredEbN0Db] = waveforms[served.spacecraft.band][0];
  const noiseDb = 10 * Math.log10(160) + second.noiseRiseDb;
  const term = (id: string, label: string, valueDb: number, unit: string, source: string): BudgetLine => ({ id, name: label, valueDb, unit, kind: 'term', source });
  const sum = (id: string, label: string, valueDb: number, unit: string): BudgetLine => ({ id, name: label, valueDb, unit, kind: 'sum', source: 'sum of the lines above' });
  const margin = marginDb(second.cOverN0DbHz, [name, bitRateBps, requiredEbN0Db]);
  const gain = served.spacecraft.eirpDbw - 3.01 + 0.8;
  const eirp = served.spacecraft.eirpDbw + second.spacecraftGainDb;
  return {
    atUtc: iso(atMs), waveform: { name, bitRateBps },
    lines: [
      term('transmitPower', 'Transmit power', 3.01, 'dBW', '2 W, spacecraft revision 12'),
      term('transmitLineLoss', 'Transmit line loss', -0.8, 'dB', 'Spacecraft revision 12'),
      term('transmitAntennaGain', 'Spacecraft antenna gain', gain + second.spacecraftGainDb, 'dBi', 'Measured cut at 38.4° off axis'),
      sum('eirp', 'EIRP', eirp, 'dBW'),
      term('freeSpaceLoss', 'Free-space loss', -second.freeSpaceLossDb, 'dB', 'ITU-R P.525-5, eq. (4)'),
      term('atmosphericLoss', 'Atmospheric loss', -second.atmosphericLossDb, 'dB', 'Entered zenith loss over sin(elevation)'),
      term('polarisationLoss', 'Polarisation loss', -second.polarisationLossDb, 'dB', 'Worst relative tilt'),
      term('receiveAntennaGain', 'Ground antenna gain', served.antenna.gOverTDbPerK + 10 * Math.log10(160), 'dBi', 'Tapered aperture, 3.7 m'),
      term('groundPointingLoss', 'Pointing loss', -second.pointingLossDb, 'dB', `Error ${second.pointingErrorDeg.toFixed(2)}°`),
      term('systemNoiseTemperature', 'System noise temperature', -noiseDb, 'dBK', 'Entered'),
      term('boltzmann', 'Boltzmann constant', 228.599, 'dBW/K/Hz', 'CODATA 2018, exact'),
      sum('cOverN0', 'C/N0', second.cOverN0DbHz, 'dBHz'),
      term('bitRate', 'Bit rate 12.5 Mbit/s', -10 * Math.log10(bitRateBps), 'dBHz', 'Information rate'),
      sum('ebN0', 'Eb/N0', second.cOverN0DbHz - 10 * Math.log10(bitRateBps), 'dB'),
      term('requiredEbN0', 'Required Eb/N0', -requiredEbN0Db, 'dB', name),
      term('implementationLoss', 'Implementation loss', -implementationLossDb, 'dB', 'Spacecraft revision 12'),
      sum('margin', 'Margin', margin, 'dB'),
    ],
    cOverN0DbHz: second.cOverN0DbHz, ebN0Db: second.cOverN0DbHz - 10 * Math.log10(bitRateBps), marginDb: margin, requiredMarginDb,
  };
}
