import type { Pass } from '../../api/passes';

/** One pass of a spacecraft over a station with all the links that serve it, best first. */
export interface PassGroup {
  readonly key: string;
  readonly aosMs: number;
  readonly losMs: number;
  readonly best: Pass;
  readonly passes: readonly Pass[];
}

/** Gathers the links of one pass; ordered by AOS. */
export function groupPasses(passes: readonly Pass[]): PassGroup[] {
  const open = new Map<string, { aosMs: number; losMs: number; passes: Pass[] }>();
  const groups: { aosMs: number; losMs: number; passes: Pass[] }[] = [];
  for (const pass of [...passes].sort((first, second) => Date.parse(first.aosUtc) - Date.parse(second.aosUtc))) {
    const key = `${pass.spacecraft} ${pass.station}`;
    const aosMs = Date.parse(pass.aosUtc);
    const losMs = Date.parse(pass.losUtc);
    const last = open.get(key);
    if (last !== undefined && aosMs < last.losMs) {
      last.passes.push(pass);
      last.losMs = Math.max(last.losMs, losMs);
      continue;
    }
    const group = { aosMs, losMs, passes: [pass] };
    open.set(key, group);
    groups.push(group);
  }
  return groups.flatMap((group) => {
    const ordered = group.passes.sort(bestFirst);
    const best = ordered[0];
    return best === undefined ? [] : [{ ...group, passes: ordered, best, key: passKey(best) }];
  });
}

function bestFirst(first: Pass, second: Pass): number {
  return second.yieldBytes - first.yieldBytes
    || second.highestMarginDb - first.highestMarginDb
    || (first.antenna < second.antenna ? -1 : 1);
}

/** Names a pass over refreshes of the list: its middle, to ten minutes, moves with no new element set. */
export function passKey(pass: Pass): string {
  const middleMs = (Date.parse(pass.aosUtc) + Date.parse(pass.losUtc)) / 2;
  return [pass.spacecraft, pass.station, pass.antenna, pass.link.radio, pass.link.chain, Math.round(middleMs / 600_000)].join('|');
}

/** The page of one pass, addressed by the instant in its middle, so that it stays good when AOS moves a second. */
export function passPageUrl(pass: Pass): string {
  const middleMs = Math.round((Date.parse(pass.aosUtc) + Date.parse(pass.losUtc)) / 2000) * 1000;
  const instant = new Date(middleMs).toISOString().replace('.000Z', 'Z');
  const query = new URLSearchParams({ antenna: pass.antenna, link: `${pass.link.radio}:${pass.link.chain}` });
  return `/pass/${encodeURIComponent(pass.spacecraft)}/${encodeURIComponent(pass.station)}/${instant}?${query.toString()}`;
}
