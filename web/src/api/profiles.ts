/** A JSON value; profiles are edited as such so that members no form knows survive a save. */
export type Json = string | number | boolean | null | readonly Json[] | { readonly [key: string]: Json };
export type JsonObject = { readonly [key: string]: Json };

/** The members of a station that pages read; the whole document travels beside them. */
export interface Station {
  readonly id: string;
  readonly name: string;
  readonly position: { readonly latitudeDeg: number; readonly longitudeDeg: number; readonly heightM: number };
  readonly antennas: readonly Antenna[];
  readonly revision: number;
  readonly savedUtc: string;
  readonly isDemo: boolean;
}

export interface Antenna {
  readonly id: string;
  readonly name: string;
  readonly receive?: readonly Chain[];
  readonly transmit?: readonly Chain[];
}

export interface Chain {
  readonly id: string;
  readonly fromHz: number;
  readonly toHz: number;
}

export interface Spacecraft {
  readonly id: string;
  readonly name: string;
  readonly catalogNumber?: number;
  readonly transmitters?: readonly Radio[];
  readonly receivers?: readonly Radio[];
  readonly revision: number;
  readonly savedUtc: string;
  readonly isDemo: boolean;
}

export interface Radio {
  readonly id: string;
  readonly frequencyHz: number;
  readonly waveforms?: readonly { readonly name: string; readonly bitRateBps: number }[];
}

export interface Page<T> {
  readonly items: readonly T[];
  readonly next: string | null;
}

export interface ElementSetEntry {
  readonly epochUtc: string;
  readonly ageH: number;
  readonly catalogNumber: number;
  readonly name: string;
  readonly meanMotionRevPerDay: number;
  readonly eccentricity: number;
  readonly inclinationDeg: number;
  readonly source: string;
  readonly receivedUtc: string;
  readonly isServing: boolean;
}

export interface ElementSetAnswer {
  readonly accepted: readonly ElementSetMention[];
  readonly unchanged: readonly ElementSetMention[];
  readonly unmatched: readonly ElementSetMention[];
  readonly refused: readonly { readonly lineNumber: number; readonly column: number; readonly reason: string }[];
}

export interface ElementSetMention {
  readonly catalogNumber?: number;
  readonly name?: string;
  readonly epochUtc?: string;
}

export interface LibraryWaveform {
  readonly id: string;
  readonly name: string;
  readonly modulation: string;
  readonly codeRate?: number | string;
  readonly requiredEbN0Db: number;
  readonly spectralEfficiencyBitPerSymbol?: number;
  readonly frameEfficiency: number;
  readonly source: string;
}

export interface Status {
  readonly nowUtc: string;
  readonly hasDemo: boolean;
  readonly stations: number;
  readonly spacecraft: number;
  readonly version: string;
  readonly ut1MinusUtcS: number;
  readonly ut1Source: string;
}
