import type { JsonObject } from '../../src/api/profiles';
import type { CircularOrbit } from './orbit.ts';

export interface MockSpacecraft {
  readonly document: JsonObject & { readonly id: string; readonly name: string };
  readonly orbit: CircularOrbit | undefined;
  readonly band: 'x' | 's' | 'uhf';
  readonly eirpDbw: number;
  readonly isStale: boolean;
}

export interface MockStation {
  readonly document: JsonObject & { readonly id: string; readonly name: string };
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
  readonly antennas: readonly { readonly id: string; readonly name: string; readonly gOverTDbPerK: number; readonly band: 'x' | 's' | 'uhf'; readonly sends: boolean }[];
}

export interface Scenario {
  readonly stations: readonly MockStation[];
  readonly spacecraft: readonly MockSpacecraft[];
  readonly hasDemo: boolean;
  readonly fails: boolean;
}

export const frequencyHz = { x: 8.2e9, s: 2.25e9, uhf: 437e6 } as const;
export const startMs = Date.UTC(2027, 2, 18, 4, 12, 20);

const circular = { kind: 'rightCircular', axialRatioDb: 1 };

function station(id: string, name: string, latitudeDeg: number, longitudeDeg: number, antennas: MockStation['antennas']): MockStation {
  const chain = (antenna: MockStation['antennas'][number]) => ({
    id: `${antenna.band}-rx`, fromHz: frequencyHz[antenna.band] * 0.97, toHz: frequencyHz[antenna.band] * 1.03,
    pattern: { kind: 'taperedAperture', diameterM: 3.7, edgeTaperDb: 11, efficiency: 0.62, surfaceErrorRmsMm: 0.5 },
    polarisation: circular, lineLossDb: 0.3, noise: { kind: 'gOverT', gOverTDbPerK: antenna.gOverTDbPerK },
  });
  const transmit = (antenna: MockStation['antennas'][number]) => ({
    id: `${antenna.band}-tx`, fromHz: 2.025e9, toHz: 2.11e9, powerW: 20, lineLossDb: 1,
    pattern: { kind: 'gaussianBeam', gainDbi: 34, halfPowerBeamwidthDeg: 2.8 }, polarisation: circular,
  });
  return {
    latitudeDeg, longitudeDeg, antennas,
    document: {
      id, name, position: { latitudeDeg, longitudeDeg, heightM: 310 },
      horizonMask: [{ azimuthDeg: 0, elevationDeg: 5 }, { azimuthDeg: 75, elevationDeg: 12 }, { azimuthDeg: 140, elevationDeg: 6 }, { azimuthDeg: 260, elevationDeg: 8 }],
      climate: { rainRate001MmPerH: 22 },
      antennas: antennas.map((antenna) => ({
        id: antenna.id, name: antenna.name, setUpS: 120, tearDownS: 60,
        mount: { kind: 'azimuthElevation', azimuth: { minimumDeg: -270, maximumDeg: 270, maximumRateDegPerS: 6, maximumAccelerationDegPerS2: 3 } },
        pointing: { biasDeg: 0.05, jitterRmsDeg: 0.03, updateIntervalS: 1 },
        receive: [chain(antenna)], transmit: antenna.sends ? [transmit(antenna)] : [],
      })),
      revision: 7, savedUtc: '2027-03-12T09:00:00Z', isDemo: true,
    },
  };
}

function craft(id: string, name: string, band: 'x' | 's' | 'uhf', eirpDbw: number, orbit: CircularOrbit | undefined, isStale = false): MockSpacecraft {
  return {
    orbit, band, eirpDbw, isStale,
    document: {
      id, name, catalogNumber: 90000 + id.length, priority: 1, attitude: { kind: 'nadir' },
      transmitters: [{
        id: `${band}-tx`, frequencyHz: frequencyHz[band], powerW: 2, lineLossDb: 0.8, requiredMarginDb: 3, minimumElevationDeg: 10, acquisitionS: 10,
        pattern: { kind: 'measured', cuts: [{ phiDeg: 0, angleDeg: [0, 30, 60, 75], gainDbi: [4, 5, 6, 1] }] },
        boresight: [0, 0, 1], polarisation: { kind: 'rightCircular', axialRatioDb: 2 },
        waveforms: [{ name: 'QPSK 1/2', bitRateBps: 12.5e6, requiredEbN0Db: 1.05, implementationLossDb: 1.5 }],
      }],
      receivers: [], recorder: { capacityBytes: 64e9, generatedBytesPerS: 150e3 }, needs: [{ kind: 'contactsPerDay', count: 2 }],
      revision: 12, savedUtc: '2027-03-10T09:00:00Z', isDemo: true,
    },
  };
}

const stations = [
  station('isenvarde', 'Isenvarde', 78.1, 21.3, [
    { id: 'big', name: '3.7 m dish', gOverTDbPerK: 25.6, band: 'x', sends: true },
    { id: 'small', name: '2.4 m dish', gOverTDbPerK: 20.6, band: 'x', sends: false },
  ]),
  station('talmira', 'Talmira', 38.6, -28.1, [
    { id: 'dish', name: '3.0 m dish', gOverTDbPerK: 12, band: 's', sends: true },
    { id: 'yagi', name: 'Crossed Yagi', gOverTDbPerK: -15, band: 'uhf', sends: false },
  ]),
  station('oruwai', 'Oruwai', -45.2, 168.4, [
    { id: 'dish', name: '2.4 m dish', gOverTDbPerK: 9, band: 's', sends: false },
    { id: 'x', name: '1.5 m dish', gOverTDbPerK: 14, band: 'x', sends: false },
  ]),
];

const spacecraft = [
  craft('lark-1', 'Lark 1', 'x', 8.5, { altitudeKm: 520, inclinationDeg: 97.5, nodeDeg: 40, phaseDeg: 10 }),
  craft('lark-2', 'Lark 2', 'x', 8.5, { altitudeKm: 530, inclinationDeg: 97.5, nodeDeg: 60, phaseDeg: 250 }),
  craft('dunlin', 'Dunlin', 'x', 6.5, { altitudeKm: 600, inclinationDeg: 97.8, nodeDeg: 200, phaseDeg: 160 }, true),
  craft('merle', 'Merle', 's', 2, { altitudeKm: 500, inclinationDeg: 55, nodeDeg: 120, phaseDeg: 90 }),
  craft('siskin', 'Siskin', 'uhf', 0, { altitudeKm: 420, inclinationDeg: 51.6, nodeDeg: 300, phaseDeg: 20 }),
  craft('knot', 'Knot', 'uhf', 0, undefined),
];

const longName = 'Sixty characters of a name that somebody typed in all ernest';

export function scenario(mode: string): Scenario {
  const usual: Scenario = { stations, spacecraft, hasDemo: true, fails: false };
  switch (mode) {
    case 'mock-empty': return { ...usual, stations: [], spacecraft: [], hasDemo: false };
    case 'mock-fails': return { ...usual, fails: true };
    case 'mock-weak': return { ...usual, spacecraft: spacecraft.map((entry) => ({ ...entry, eirpDbw: entry.eirpDbw - 30 })) };
    case 'mock-never': return { ...usual, spacecraft: spacecraft.map((entry) => ({ ...entry, orbit: undefined })) };
    case 'mock-hostile': return {
      ...usual,
      stations: stations.map((entry, index) => station(entry.document.id, `${longName.slice(0, 58)} ${index}`, entry.latitudeDeg, entry.longitudeDeg, entry.antennas.map((antenna) => ({ ...antenna, name: `${longName}` })))),
      spacecraft: spacecraft.map((entry) => ({ ...entry, document: { ...entry.document, name: index60(entry.document.name) } })),
    };
    case 'mock-many': return {
      ...usual,
      spacecraft: Array.from({ length: 200 }, (_, index) => craft(`many-${index}`, `Many ${index}`, (['x', 's', 'uhf'] as const)[index % 3] ?? 'x', 5, { altitudeKm: 450 + index, inclinationDeg: 97, nodeDeg: index * 37, phaseDeg: index * 71 })),
    };
    default: return usual;
  }
}

function index60(name: string): string {
  return `${name} <b>&amp; ${longName}`.slice(0, 60);
}
