import type { KindField, ListField, NumberField } from './fields';
import { number, text } from './fields';

export const megahertz = (key: string, label: string): NumberField => number(key, label, 'MHz', { factor: 1e6 });

const gain = number('gainDbi', 'Peak gain', 'dBi');

export const patternField: KindField = {
  type: 'kind', key: 'pattern', label: 'Pattern', optional: false,
  kinds: {
    isotropic: { label: 'Isotropic', fields: [{ ...gain, hint: '0 dBi when left out' }], make: () => ({ kind: 'isotropic' }) },
    halfWaveDipole: {
      label: 'Half-wave dipole', make: () => ({ kind: 'halfWaveDipole' }),
      fields: [{ ...gain, hint: 'the dipole\u2019s own when left out' }, number('ohmicEfficiency', 'Ohmic efficiency', '', { hint: '1 when left out' })],
    },
    gaussianBeam: {
      label: 'Gaussian beam', make: () => ({ kind: 'gaussianBeam', gainDbi: 20, halfPowerBeamwidthDeg: 15 }),
      fields: [gain, number('halfPowerBeamwidthDeg', 'Half-power beamwidth', '°'), number('floorDbi', 'Floor', 'dBi', { hint: '30 dB below the peak when left out' }), number('ohmicEfficiency', 'Ohmic efficiency', '', { hint: 'when gain or width is left out' })],
    },
    taperedAperture: {
      label: 'Tapered aperture', make: () => ({ kind: 'taperedAperture', diameterM: 3, edgeTaperDb: 11, efficiency: 0.6 }),
      fields: [
        number('diameterM', 'Diameter', 'm'), number('edgeTaperDb', 'Edge taper', 'dB', { hint: '11 when left out' }),
        number('halfPowerBeamwidthDeg', 'Half-power beamwidth', '°', { hint: 'instead of the edge taper' }),
        megahertz('halfPowerBeamwidthFrequencyHz', 'Width measured at'),
        number('pedestalExponent', 'Exponent of the taper', '', { hint: '1 or 2; 1 when left out' }), number('efficiency', 'Aperture efficiency', '', { hint: 'what taper and blockage leave when left out' }),
        number('ohmicEfficiency', 'Ohmic efficiency', '', { hint: '1 when left out' }), number('blockageDiameterM', 'Blockage diameter', 'm', { hint: '0 when left out' }),
        number('surfaceErrorRmsMm', 'Surface error, rms', 'mm', { hint: '0 when left out' }),
      ],
    },
    measured: {
      label: 'Measured cuts', make: () => ({ kind: 'measured', cuts: [{ phiDeg: 0, angleDeg: [0, 90], gainDbi: [6, -6] }] }),
      fields: [{
        type: 'list', key: 'cuts', label: 'Cuts', one: 'cut', make: () => ({ phiDeg: 90, angleDeg: [0, 90], gainDbi: [6, -6] }),
        fields: [number('phiDeg', 'Plane, phi', '°', { hint: '0 when left out' }), { type: 'table', key: 'angleDeg', otherKey: 'gainDbi', label: 'Gain against angle', columns: ['angle, °', 'gain, dBi'] }],
      }],
    },
  },
};

export const polarisationField: KindField = {
  type: 'kind', key: 'polarisation', label: 'Polarisation', optional: false,
  kinds: {
    rightCircular: { label: 'Right circular', fields: [number('axialRatioDb', 'Axial ratio', 'dB', { hint: '0 when left out' })], make: () => ({ kind: 'rightCircular' }) },
    leftCircular: { label: 'Left circular', fields: [number('axialRatioDb', 'Axial ratio', 'dB', { hint: '0 when left out' })], make: () => ({ kind: 'leftCircular' }) },
    linear: { label: 'Linear', fields: [number('tiltDeg', 'Tilt', '°', { hint: 'unknown when left out' })], make: () => ({ kind: 'linear' }) },
    elliptical: {
      label: 'Elliptical', make: () => ({ kind: 'elliptical', axialRatioDb: 3, sense: 'right' }),
      fields: [
        number('axialRatioDb', 'Axial ratio', 'dB'), { type: 'choice', key: 'sense', label: 'Sense', options: { right: 'right', left: 'left' } },
        number('tiltDeg', 'Tilt', '°', { hint: 'unknown when left out' }),
      ],
    },
  },
};

export const waveformsField: ListField = {
  type: 'list', key: 'waveforms', label: 'Waveforms', one: 'waveform', picksWaveforms: true,
  make: () => ({ name: 'QPSK 1/2', bitRateBps: 1e6, requiredEbN0Db: 1.05, implementationLossDb: 1.5 }),
  fields: [
    text('name', 'Name'), number('bitRateBps', 'Information bit rate', 'kbit/s', { factor: 1e3 }), number('requiredEbN0Db', 'Required Eb/N0', 'dB'),
    number('implementationLossDb', 'Implementation loss', 'dB', { hint: '0 when left out' }), number('frameEfficiency', 'Frame efficiency', '', { hint: '1 when left out' }),
    number('occupiedBandwidthHz', 'Occupied bandwidth', 'kHz', { factor: 1e3 }), text('source', 'Source of the figures'),
  ],
};
