import { describe, expect, it } from 'vitest';
import { headline, periodWords } from '../../src/views/passes/headline';
import { groupPasses, passPageUrl } from '../../src/views/passes/passGroups';
import { isSelected, readSelection, selectionUrl } from '../../src/views/passes/selection';
import { passItem, servedPasses } from '../mock/passes';
import { scenario, startMs } from '../mock/scenario';

const hourMs = 3_600_000;
const { stations, spacecraft } = scenario('mock');
const passes = servedPasses(stations, spacecraft, startMs, startMs + 12 * hourMs).map((served) => passItem(served, 10, startMs));

describe('groups', () => {
  it('gather the antennas of one pass, the highest yield first', () => {
    const groups = groupPasses(passes);
    expect(groups.length).toBeLessThan(passes.length);
    expect(groups.flatMap((group) => group.passes)).toHaveLength(passes.length);
    for (const group of groups) {
      expect(new Set(group.passes.map((pass) => `${pass.spacecraft} ${pass.station}`)).size).toBe(1);
      expect(group.best.yieldBytes).toBe(Math.max(...group.passes.map((pass) => pass.yieldBytes)));
    }
  });

  it('hold one pass each: links within a group overlap, groups of one pairing do not', () => {
    const lastEnd = new Map<string, number>();
    for (const group of groupPasses(passes)) {
      const pairing = `${group.best.spacecraft} ${group.best.station}`;
      expect(group.aosMs).toBeGreaterThanOrEqual(lastEnd.get(pairing) ?? -Infinity);
      lastEnd.set(pairing, group.losMs);
      expect(group.passes.every((pass) => Date.parse(pass.aosUtc) < group.losMs && Date.parse(pass.losUtc) > group.aosMs)).toBe(true);
      expect(group.losMs - group.aosMs).toBeLessThan(hourMs);
    }
  });

  it('are ordered by AOS', () => {
    const starts = groupPasses([...passes].reverse()).map((group) => group.aosMs);
    expect(starts).toEqual([...starts].sort((first, second) => first - second));
  });

  it('do not change the list they are made from', () => {
    const before = passes.map((pass) => pass.aosUtc);
    groupPasses(passes);
    expect(passes.map((pass) => pass.aosUtc)).toEqual(before);
  });
});

describe('the headline', () => {
  const groups = groupPasses(passes);
  const closing = groups.filter((group) => group.best.usableS > 0);
  const failing = groups.filter((group) => group.best.usableS === 0);

  it('says how many close', () => {
    expect(headline(groups, 'in the next 12 h')).toBe(`${closing.length} of ${groups.length} passes close in the next 12 h`);
    expect(headline(closing.slice(0, 7), 'today')).toBe('All 7 passes close today');
    expect(headline(failing.slice(0, 2), 'today')).toBe('None of 2 passes closes today');
    expect(headline([], 'today')).toBe('No passes today');
    expect(headline(failing.slice(0, 1), 'today')).toBe('The one pass today does not close');
  });

  it('names the period by the clock once the frame has been moved', () => {
    expect(periodWords(startMs, startMs + 4 * hourMs, startMs, true, 'utc')).toBe('before 08:12');
    expect(periodWords(startMs, startMs + 24 * hourMs, startMs, true, 'utc')).toBe('before 19 Mar 04:12');
    expect(periodWords(startMs, startMs + 4 * hourMs, startMs, false, 'utc')).toBe('between 04:12 and 08:12');
    expect(periodWords(startMs + 18 * hourMs, startMs + 22 * hourMs, startMs, false, 'utc')).toBe('between 22:12 and 19 Mar 02:12');
  });
});

describe('a selection', () => {
  it('comes back from its own address', () => {
    const selection = { station: 'talmira', spacecraft: undefined, direction: undefined, periodH: 168, closingOnly: true } as const;
    expect(readSelection(new URL(selectionUrl(selection), 'http://host').searchParams)).toEqual(selection);
  });

  it('has a bare address when it is as usual', () => {
    expect(selectionUrl(readSelection(new URLSearchParams()))).toBe('/');
    expect(readSelection(new URLSearchParams('hours=99')).periodH).toBe(4);
  });

  it('takes only what closes when asked', () => {
    const selection = readSelection(new URLSearchParams('closing=true'));
    expect(passes.filter((pass) => isSelected(pass, selection)).every((pass) => pass.usableS > 0)).toBe(true);
  });
});

describe('the address of a pass', () => {
  it('names an instant inside it, its antenna and its link', () => {
    const pass = passes[0];
    if (pass === undefined) throw new Error('The invented scenario has no pass.');
    const url = new URL(passPageUrl(pass), 'http://host');
    const instant = url.pathname.split('/').at(-1) ?? '';
    expect(Date.parse(instant)).toBeGreaterThan(Date.parse(pass.aosUtc));
    expect(Date.parse(instant)).toBeLessThan(Date.parse(pass.losUtc));
    expect(url.searchParams.get('antenna')).toBe(pass.antenna);
    expect(url.searchParams.get('link')).toBe(`${pass.link.radio}:${pass.link.chain}`);
  });
});
