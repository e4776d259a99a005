import type { JsonObject } from '../api/profiles';
import type { Field, KindField } from './fields';
import { number, text } from './fields';
import { megahertz, patternField, polarisationField, waveformsField } from './radioFields';

const attitudeField: KindField = {
  type: 'kind', key: 'attitude', label: 'Attitude', optional: true, hint: 'nadir when left out',
  kinds: {
    nadir: { label: 'Nadir: body +Z to the Earth\u2019s centre', fields: [], make: () => ({ kind: 'nadir' }) },
    stationTracking: { label: 'Station tracking', fields: [], make: () => ({ kind: 'stationTracking' }) },
    inertial: {
      label: 'Inertial', make: () => ({ kind: 'inertial', quaternion: [0, 0, 0, 1] }),
      fields: [{ type: 'vector', key: 'quaternion', label: 'Rotation from inertial to body axes', parts: ['x', 'y', 'z', 'scalar'] }],
    },
    uncontrolled: {
      label: 'Uncontrolled', make: () => ({ kind: 'uncontrolled', percentile: 10 }),
      fields: [number('percentile', 'Percentile of the gain over the sphere', '%', { hint: 'above 0, below 100; this share of directions has less; 10 when left out' })],
    },
  },
};

const axes = ['X', 'Y', 'Z'];

const linkFields: readonly Field[] = [
  number('requiredMarginDb', 'Required margin', 'dB', { hint: '3 when left out' }),
  number('minimumElevationDeg', 'Must close above elevation', '°', { hint: '10 when left out' }),
  number('acquisitionS', 'Acquisition time', 's', { hint: '0 when left out' }),
  number('availabilityPercent', 'Share of the year', '%', { hint: '99 when left out' }),
  { type: 'vector', key: 'boresight', label: 'Boresight in body axes', parts: axes, hint: '+Z when left out' },
  { type: 'vector', key: 'reference', label: 'Direction of phi = 0', parts: axes, hint: '+X when left out' },
  { type: 'choice', key: 'polarisationCase', label: 'Relative tilt', options: { worst: 'worst', mean: 'mean', best: 'best' }, hint: 'worst when left out' },
  patternField,
  polarisationField,
  waveformsField,
];

const makeWaveform = (): JsonObject => ({ name: 'QPSK 1/2', bitRateBps: 1e6, requiredEbN0Db: 1.05, implementationLossDb: 1.5 });
const makeTransmitter = (): JsonObject => ({
  id: 's-tx', frequencyHz: 2.25e9, powerW: 1, lineLossDb: 0.5, requiredMarginDb: 3, minimumElevationDeg: 10, acquisitionS: 10,
  pattern: { kind: 'gaussianBeam', gainDbi: 6, halfPowerBeamwidthDeg: 80 }, polarisation: { kind: 'rightCircular' }, waveforms: [makeWaveform()],
});
const makeReceiver = (): JsonObject => ({
  id: 's-rx', frequencyHz: 2.05e9, gOverTDbPerK: -28, pattern: { kind: 'isotropic' }, polarisation: { kind: 'rightCircular' },
  waveforms: [{ name: 'Uncoded BPSK', bitRateBps: 4000, requiredEbN0Db: 9.6, implementationLossDb: 2 }],
});

/** Every member of a spacecraft in the order a person thinks of it. */
export const spacecraftFields: readonly Field[] = [
  text('name', 'Name'),
  text('id', 'Identifier', 'made from the name when left out'),
  number('catalogNumber', 'Catalogue number', '', { hint: 'by which element sets are matched' }),
  number('priority', 'Weight of its bytes in a plan', '', { hint: '1 when left out' }),
  attitudeField,
  {
    type: 'list', key: 'transmitters', label: 'Transmitters', one: 'transmitter', make: makeTransmitter,
    fields: [text('id', 'Identifier'), megahertz('frequencyHz', 'Carrier'), number('powerW', 'Amplifier power', 'W'), number('lineLossDb', 'Line loss', 'dB', { hint: '0 when left out' }), ...linkFields],
  },
  {
    type: 'list', key: 'receivers', label: 'Receivers', one: 'receiver', make: makeReceiver,
    fields: [text('id', 'Identifier'), megahertz('frequencyHz', 'Carrier'), number('gOverTDbPerK', 'G/T where the gain is greatest', 'dB/K'), ...linkFields],
  },
  {
    type: 'group', key: 'recorder', label: 'Recorder', make: () => ({ capacityBytes: 64e9 }),
    fields: [
      number('capacityBytes', 'Capacity', 'GB', { factor: 1e9 }), number('generatedBytesPerS', 'Generated', 'kB/s', { factor: 1e3, hint: '0 when left out' }),
      number('storedBytes', 'Stored at the start', 'GB', { factor: 1e9, hint: '0 when left out' }),
    ],
  },
  {
    type: 'list', key: 'needs', label: 'Needs', one: 'need', make: () => ({ kind: 'contactsPerDay', count: 2 }),
    fields: [{
      type: 'kind', key: 'kind', label: 'Need', optional: false, ofOwner: true,
      kinds: {
        contactsPerDay: { label: 'Contacts a day', fields: [number('count', 'Contacts a day', '')], make: () => ({ kind: 'contactsPerDay', count: 2 }) },
        bytesPerDay: { label: 'Bytes a day', fields: [number('bytes', 'Bytes a day', 'GB', { factor: 1e9 })], make: () => ({ kind: 'bytesPerDay', bytes: 1e9 }) },
        longestGap: { label: 'Longest gap', fields: [number('hours', 'Longest gap', 'h')], make: () => ({ kind: 'longestGap', hours: 12 }) },
      },
    }],
  },
];

export function newSpacecraft(): JsonObject {
  return { name: '', attitude: { kind: 'nadir' }, transmitters: [makeTransmitter()], receivers: [] };
}
