/** What the service answers about passes. Names and units are the wire's own. */

export type Verdict = 'closes' | 'closesInPart' | 'doesNotClose';
export type Direction = 'downlink' | 'uplink';

export interface LinkReference {
  readonly direction: Direction;
  readonly radio: string;
  readonly chain: string;
}

export interface TimeWindow {
  readonly startUtc: string;
  readonly endUtc: string;
}

export type CauseKind =
  | 'none' | 'range' | 'spacecraftAntenna' | 'pointing'
  | 'atmosphere' | 'polarisation' | 'noise' | 'acquisition' | 'power';

export interface Cause {
  readonly kind: CauseKind;
  readonly changeDb?: number;
  readonly shortByDb?: number;
}

export interface ElementSetAge {
  readonly epochUtc: string;
  readonly ageH: number;
  readonly limitH: number;
  readonly isStale: boolean;
  /** Expected error of the pass times, where the service estimates it. */
  readonly timingErrorS?: number;
}

export interface MarginProfile {
  readonly startUtc: string;
  readonly stepS: number;
  readonly requiredMarginDb: number;
  readonly marginDb: readonly number[];
  readonly usable: readonly number[];
}

export interface Pass {
  readonly spacecraft: string;
  readonly spacecraftName: string;
  readonly station: string;
  readonly stationName: string;
  readonly antenna: string;
  readonly antennaName: string;
  readonly link: LinkReference;
  readonly aosUtc: string;
  readonly losUtc: string;
  readonly aosIsOpen: boolean;
  readonly losIsOpen: boolean;
  readonly durationS: number;
  readonly maximumElevationUtc: string;
  readonly maximumElevationDeg: number;
  readonly closestApproachUtc: string;
  readonly closestRangeKm: number;
  readonly aosAzimuthDeg: number;
  readonly losAzimuthDeg: number;
  readonly verdict: Verdict;
  readonly limitingCause: string;
  readonly cause: Cause;
  readonly requiredMarginDb: number;
  readonly highestMarginDb: number;
  readonly lowestMarginDb: number;
  readonly usableWindows: readonly TimeWindow[];
  readonly usableElevationFromDeg?: number;
  readonly usableElevationToDeg?: number;
  readonly usableS: number;
  readonly yieldBytes: number;
  readonly highestBitRateBps: number;
  readonly elementSet: ElementSetAge;
  readonly passUrl: string;
  readonly timelineUrl?: string;
  readonly marginProfile?: MarginProfile;
}

export type WithoutPassesReason =
  | 'neverUp' | 'noElementSet' | 'decayed' | 'propagationFailed' | 'noAntennaForFrequency' | 'noPassInPeriod';

export interface WithoutPasses {
  readonly spacecraft: string;
  readonly station?: string;
  readonly reason: WithoutPassesReason;
  readonly detail: string;
}

export interface Model {
  readonly name: string;
  readonly edition: string;
  readonly note: string;
}

export interface PassList {
  readonly items: readonly Pass[];
  readonly next: string | null;
  readonly computedUtc: string;
  readonly fromUtc: string;
  readonly toUtc: string;
  readonly withoutPasses: readonly WithoutPasses[];
  readonly models: readonly Model[];
}

export interface WaveformInUse {
  readonly index: number;
  readonly name: string;
  readonly bitRateBps: number;
  readonly requiredEbN0Db: number;
  readonly implementationLossDb: number;
}

export interface PassAlternative {
  readonly antenna: string;
  readonly antennaName: string;
  readonly link: LinkReference;
  readonly passUrl: string;
  readonly verdict: Verdict;
  readonly yieldBytes: number;
}

export interface MaskPoint {
  readonly azimuthDeg: number;
  readonly elevationDeg: number;
}

/** One pass with what its page needs beyond the list. */
export interface PassDetail extends Pass {
  readonly timelineUrl: string;
  readonly budgetUrl: string;
  readonly pointingUrl: string;
  readonly stationRevision: number;
  readonly spacecraftRevision: number;
  readonly horizonMask: readonly MaskPoint[];
  readonly waveforms: readonly WaveformInUse[];
  readonly mostRobustWaveform: number;
  readonly bestUtc: string;
  readonly frequencyHz: number;
  readonly sun: { readonly azimuthDeg: number; readonly elevationDeg: number };
  readonly models: readonly Model[];
  readonly alternatives: readonly PassAlternative[];
}
