import type { LinkReference, Pass, Verdict, WithoutPassesReason } from '../api/passes';
import { bytes } from './amount';
import { fixed, plain } from './number';
import { duration } from './time';

const verdictWords: Record<Verdict, string> = {
  closes: 'Closes',
  closesInPart: 'Closes in part',
  doesNotClose: 'Does not close',
};

export function verdict(value: Verdict): string {
  return verdictWords[value];
}

/** How far the best second is from the required margin, in words. */
export function shortfall(pass: Pass): string {
  const shortByDb = pass.cause.shortByDb ?? pass.requiredMarginDb - pass.highestMarginDb;
  return shortByDb >= 0.05 ? `${fixed(shortByDb, 1)}\u00a0dB short` : 'too short to use';
}

/** What a pass is good for, in a few words for labels and read-aloud names. */
export function worth(pass: Pass): string {
  return pass.usableS > 0 ? plain(bytes(pass.yieldBytes)) : shortfall(pass);
}

/** Why no more of the pass is usable; a dash when nothing limits it. */
export function limitedBy(pass: Pass): string {
  if (pass.limitingCause !== '') return pass.limitingCause;
  return pass.verdict === 'doesNotClose' ? `Best second is ${shortfall(pass)}` : '—';
}

export function usableOf(pass: Pass): string {
  return `${duration(pass.usableS)} of ${duration(pass.durationS)}`;
}

export function direction(link: LinkReference): string {
  return link.direction === 'uplink' ? 'uplink' : 'downlink';
}

const reasonWords: Record<WithoutPassesReason, string> = {
  neverUp: 'never rises above the mask',
  noElementSet: 'has no element set yet',
  decayed: 'has decayed',
  propagationFailed: 'cannot be propagated',
  noAntennaForFrequency: 'finds no antenna for its frequency',
  noPassInPeriod: 'has no pass in this period',
};

export function withoutPasses(reason: WithoutPassesReason): string {
  return reasonWords[reason];
}

/** "1 pass", "2 passes". */
export function count(value: number, one: string, many: string): string {
  return `${fixed(value, 0)} ${value === 1 ? one : many}`;
}
