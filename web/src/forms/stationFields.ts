import type { JsonObject } from '../api/profiles';
import type { Field, GroupField, KindField } from './fields';
import { number, text } from './fields';
import { megahertz, patternField, polarisationField } from './radioFields';

const axis = (key: string, label: string): GroupField => ({
  type: 'group', key, label, make: () => ({}),
  fields: [
    number('minimumDeg', 'Lower end', '°'), number('maximumDeg', 'Upper end', '°'), number('maximumRateDegPerS', 'Greatest rate', '°/s'),
    number('maximumAccelerationDegPerS2', 'Greatest acceleration', '°/s²'),
  ],
});

const mountField: KindField = {
  type: 'kind', key: 'mount', label: 'Mount', optional: true, hint: 'an ideal mount when left out',
  kinds: {
    azimuthElevation: { label: 'Azimuth-elevation', fields: [axis('azimuth', 'Azimuth axis'), axis('elevation', 'Elevation axis')], make: () => ({ kind: 'azimuthElevation' }) },
    overTheTop: { label: 'Over the top', fields: [axis('azimuth', 'Azimuth axis'), axis('elevation', 'Elevation axis')], make: () => ({ kind: 'overTheTop' }) },
    xY: { label: 'X-Y', fields: [axis('x', 'X axis'), axis('y', 'Y axis')], make: () => ({ kind: 'xY' }) },
    fixed: {
      label: 'Fixed', make: () => ({ kind: 'fixed' }),
      fields: [number('fixedAzimuthDeg', 'Azimuth', '°', { hint: '0 when left out' }), number('fixedElevationDeg', 'Elevation', '°', { hint: '90, straight up, when left out' })],
    },
  },
};

const noiseField: KindField = {
  type: 'kind', key: 'noise', label: 'Noise', optional: false,
  kinds: {
    systemTemperature: { label: 'System noise temperature', fields: [number('systemNoiseTemperatureK', 'At the antenna\u2019s terminal', 'K')], make: () => ({ kind: 'systemTemperature', systemNoiseTemperatureK: 200 }) },
    gOverT: { label: 'G/T', fields: [number('gOverTDbPerK', 'On the boresight', 'dB/K')], make: () => ({ kind: 'gOverT', gOverTDbPerK: 10 }) },
    components: {
      label: 'Components', make: () => ({ kind: 'components', receiverNoiseTemperatureK: 60 }),
      fields: [
        number('receiverNoiseTemperatureK', 'Receiver', 'K'), number('lineTemperatureK', 'Line, physical', 'K', { hint: '290 when left out' }),
        number('spilloverTemperatureK', 'Spillover', 'K', { hint: '0 when left out' }),
      ],
    },
  },
};

const circular = { kind: 'rightCircular' };
const makeReceive = (): JsonObject => ({
  id: 's-rx', fromHz: 2.2e9, toHz: 2.29e9, pattern: { kind: 'taperedAperture', diameterM: 3, edgeTaperDb: 11, efficiency: 0.6 },
  polarisation: circular, lineLossDb: 0.3, noise: { kind: 'components', receiverNoiseTemperatureK: 60 },
});
const makeTransmit = (): JsonObject => ({
  id: 's-tx', fromHz: 2.025e9, toHz: 2.11e9, powerW: 20, lineLossDb: 1,
  pattern: { kind: 'taperedAperture', diameterM: 3, edgeTaperDb: 11, efficiency: 0.6 }, polarisation: circular,
});
const lineLoss = number('lineLossDb', 'Line loss', 'dB', { hint: '0 when left out' });
const clearSky = number('clearSkyZenithLossDb', 'Clear-sky loss at the zenith', 'dB', { hint: 'spread by 1/sin(elevation)' });

/** Every member of a station in the order a person thinks of it. */
export const stationFields: readonly Field[] = [
  text('name', 'Name'),
  text('id', 'Identifier', 'made from the name when left out'),
  {
    type: 'group', key: 'position', label: 'Position, WGS-84',
    fields: [number('latitudeDeg', 'Latitude, north positive', '°'), number('longitudeDeg', 'Longitude, east positive', '°'), number('heightM', 'Height above the ellipsoid', 'm', { hint: '0 when left out' })],
  },
  {
    type: 'list', key: 'horizonMask', label: 'Horizon mask', one: 'point', inline: true, hint: 'linear between points and around; 5° when left out',
    make: () => ({ azimuthDeg: 0, elevationDeg: 5 }), fields: [number('azimuthDeg', 'Azimuth', '°'), number('elevationDeg', 'Elevation', '°')],
  },
  { type: 'flag', key: 'maskIsApparent', label: 'The mask is as seen through the air, not geometric' },
  {
    type: 'group', key: 'climate', label: 'Radio climate', hint: 'kept for the weather models', make: () => ({}),
    fields: [
      number('rainRate001MmPerH', 'Rain rate at 0.01 % of the year', 'mm/h'), number('rainHeightKm', 'Rain height', 'km'), number('surfaceTemperatureK', 'Surface temperature', 'K'),
      number('surfacePressureHpa', 'Surface pressure', 'hPa'), number('surfaceVapourDensityGPerM3', 'Surface vapour density', 'g/m³'), number('columnarVapourKgPerM2', 'Columnar vapour', 'kg/m²'),
      number('columnarCloudLiquidKgPerM2', 'Columnar cloud liquid', 'kg/m²'), number('wetRefractivityNUnits', 'Wet refractivity', 'N-units'),
    ],
  },
  {
    type: 'list', key: 'antennas', label: 'Antennas', one: 'antenna', make: () => ({ name: '3 m dish', receive: [makeReceive()], transmit: [] }),
    fields: [
      text('name', 'Name'), text('id', 'Identifier', 'made from the name when left out'),
      number('setUpS', 'Set-up time', 's', { hint: '0 when left out' }), number('tearDownS', 'Tear-down time', 's', { hint: '0 when left out' }),
      mountField,
      {
        type: 'group', key: 'pointing', label: 'Pointing', make: () => ({}), hint: 'perfect when left out',
        fields: [number('biasDeg', 'Bias', '°'), number('jitterRmsDeg', 'Jitter, rms', '°', { hint: 'up to 11' }), number('updateIntervalS', 'Update interval', 's')],
      },
      {
        type: 'list', key: 'receive', label: 'Receive chains', one: 'receive chain', make: makeReceive,
        fields: [text('id', 'Identifier'), megahertz('fromHz', 'From'), megahertz('toHz', 'To'), lineLoss, clearSky, patternField, polarisationField, noiseField],
      },
      {
        type: 'list', key: 'transmit', label: 'Transmit chains', one: 'transmit chain', make: makeTransmit,
        fields: [text('id', 'Identifier'), megahertz('fromHz', 'From'), megahertz('toHz', 'To'), number('powerW', 'Amplifier power', 'W'), lineLoss, clearSky, patternField, polarisationField],
      },
    ],
  },
];

export function newStation(): JsonObject {
  return {
    name: '', position: { heightM: 0 }, horizonMask: [{ azimuthDeg: 0, elevationDeg: 5 }],
    antennas: [{ name: '3 m dish', receive: [makeReceive()], transmit: [] }],
  };
}
