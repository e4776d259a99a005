/** A pass second by second, as columns of one length. */
export interface Timeline {
  readonly startUtc: string;
  readonly stepS: number;
  readonly azimuthDeg: readonly number[];
  readonly elevationDeg: readonly number[];
  readonly apparentElevationDeg: readonly number[];
  readonly slantRangeKm: readonly number[];
  readonly rangeRateKmPerS: readonly number[];
  readonly dopplerHz: readonly number[];
  readonly dopplerRateHzPerS: readonly number[];
  readonly pointingErrorDeg: readonly number[];
  readonly groundGainDbi: readonly number[];
  readonly spacecraftOffAxisDeg: readonly number[];
  readonly spacecraftGainDbi: readonly number[];
  readonly freeSpaceLossDb: readonly number[];
  readonly atmosphericLossDb: readonly number[];
  readonly polarisationLossDb: readonly number[];
  readonly systemNoiseTemperatureK: readonly number[];
  readonly gOverTDbPerK: readonly number[];
  readonly cOverN0DbHz: readonly number[];
  readonly powerFluxDensityDbWPerM2: readonly number[];
  readonly waveform: readonly number[];
  readonly marginDb: readonly number[];
  readonly usable: readonly number[];
  readonly bitRateBps: readonly number[];
  readonly waveforms: readonly WaveformMargin[];
}

export interface WaveformMargin {
  readonly name: string;
  readonly bitRateBps: number;
  readonly requiredMarginDb: number;
  readonly marginDb: readonly number[];
}

export interface BudgetLine {
  readonly id: string;
  readonly name: string;
  readonly valueDb: number;
  readonly unit: string;
  readonly kind: 'term' | 'sum';
  readonly source: string;
}

/** Every line of the link equation at one second; the terms add up to the margin. */
export interface Budget {
  readonly atUtc: string;
  readonly waveform: { readonly name: string; readonly bitRateBps: number };
  readonly lines: readonly BudgetLine[];
  readonly cOverN0DbHz: number;
  readonly ebN0Db: number;
  readonly marginDb: number;
  readonly requiredMarginDb: number;
}
