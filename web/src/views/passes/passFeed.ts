import type { Problem } from '../../api/problem';
import { planner } from '../../api/planner';
import type { Pass, WithoutPasses } from '../../api/passes';
import type { Spacecraft, Station, Status } from '../../api/profiles';
import { nowMs, setServiceTime } from '../../app/clock';

/** Everything that the page of passes shows, as last answered. */
export interface PassFeed {
  readonly fromMs: number;
  readonly toMs: number;
  readonly passes: readonly Pass[];
  readonly withoutPasses: readonly WithoutPasses[];
  readonly stations: readonly Station[];
  readonly spacecraft: readonly Spacecraft[];
  readonly status: Status;
}

export type FeedAnswer = { readonly ok: true; readonly feed: PassFeed } | { readonly ok: false; readonly problem: Problem };

const quarterHourMs = 15 * 60_000;

/** The searched period begins a little before now, so that the pass in progress and the one just over are in it. */
export function feedPeriod(spanH: number): { fromMs: number; toMs: number } {
  const fromMs = Math.floor((nowMs() - quarterHourMs / 3) / quarterHourMs) * quarterHourMs;
  return { fromMs, toMs: fromMs + spanH * 3_600_000 };
}

/**
 * Asks for status, profiles and the first page of passes at once; further pages follow, each handed on as it comes.
 * A device whose clock is wrong asks again by the service's.
 */
export async function loadFeed(spanH: number, signal: AbortSignal, onPart: (feed: PassFeed) => void): Promise<FeedAnswer> {
  const { fromMs, toMs } = feedPeriod(spanH);
  const query = { fromMs, toMs, profileStepS: spanH > 24 ? 20 : 5 };
  const [status, stations, spacecraft, first] = await Promise.all([
    planner.status(signal), planner.stations(signal), planner.spacecraft(signal), planner.passes(query, signal),
  ]);
  if (!status.ok) return status;
  if (!stations.ok) return stations;
  if (!spacecraft.ok) return spacecraft;
  if (!first.ok) return first;
  setServiceTime(status.value.nowUtc);
  const isDeviceClockOff = Math.abs(feedPeriod(spanH).fromMs - fromMs) > quarterHourMs;
  if (isDeviceClockOff) return loadFeed(spanH, signal, onPart);

  let feed: PassFeed = {
    fromMs, toMs, passes: first.value.items, withoutPasses: first.value.withoutPasses,
    stations: stations.value, spacecraft: spacecraft.value, status: status.value,
  };
  let cursor = first.value.next ?? null;
  while (cursor !== null) {
    onPart(feed);
    const page = await planner.passes({ ...query, cursor }, signal);
    if (!page.ok) return page;
    feed = { ...feed, passes: [...feed.passes, ...page.value.items] };
    cursor = page.value.next ?? null;
  }
  return { ok: true, feed };
}
