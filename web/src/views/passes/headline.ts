import { h, type Child } from '../../dom';
import { bytes } from '../../format/amount';
import { plain } from '../../format/number';
import { countdown, dayAndTime, duration, hourMinute, sameDay, wait, type Zone } from '../../format/time';
import { count } from '../../format/words';
import type { PassGroup } from './passGroups';

/** The period in the headline's words: from now on it has an end only. */
export function periodWords(fromMs: number, toMs: number, nowMs: number, follows: boolean, zone: Zone): string {
  if (follows) return `before ${sameDay(toMs, nowMs, zone) ? hourMinute(toMs, zone) : dayAndTime(toMs, zone)}`;
  const from = sameDay(fromMs, nowMs, zone) ? hourMinute(fromMs, zone) : dayAndTime(fromMs, zone);
  const to = sameDay(toMs, fromMs, zone) ? hourMinute(toMs, zone) : dayAndTime(toMs, zone);
  return `between ${from} and ${to}`;
}

/** The answer as a sentence: how many of the passes close. */
export function headline(groups: readonly PassGroup[], period: string): string {
  const closing = groups.filter((group) => group.best.usableS > 0).length;
  if (groups.length === 0) return `No passes ${period}`;
  if (groups.length === 1) return closing === 1 ? `The one pass ${period} closes` : `The one pass ${period} does not close`;
  if (closing === 0) return `None of ${groups.length} passes closes ${period}`;
  if (closing === groups.length) return `All ${groups.length} passes close ${period}`;
  return `${closing} of ${count(groups.length, 'pass', 'passes')} ${closing === 1 ? 'closes' : 'close'} ${period}`;
}

/** The next pass that can be used, or the one in progress. */
export function nextSentence(groups: readonly PassGroup[], nowMs: number): Child[] {
  const next = groups.find((group) => group.losMs > nowMs && group.best.usableS > 0);
  if (next === undefined) return [];
  const { best } = next;
  const name = h('strong', {}, `${best.spacecraftName} over ${best.stationName}`);
  const figures = `${duration(best.usableS)} usable, ${plain(bytes(best.yieldBytes))}.`;
  return next.aosMs > nowMs
    ? ['Next: ', name, ` in ${wait((next.aosMs - nowMs) / 1000)}, ${figures}`]
    : ['Now: ', name, `, ${countdown((next.losMs - nowMs) / 1000)} to LOS, ${figures}`];
}
