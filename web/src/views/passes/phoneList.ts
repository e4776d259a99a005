import type { Pass } from '../../api/passes';
import { zone } from '../../app/zone';
import { fixedRibbon, phoneLook } from '../../charts/tableRibbon';
import { h } from '../../dom';
import { bytes } from '../../format/amount';
import { degrees, plain } from '../../format/number';
import { age, clockTime, countdown, dayMonth, duration, hourMinute, sameDay, wait } from '../../format/time';
import { shortfall, usableOf } from '../../format/words';
import { passKey, passPageUrl, type PassGroup } from './passGroups';
import { shown } from '../states';

export interface PhoneList {
  /** The next pass that can be used, with its countdown; undefined when none can. */
  readonly leading: HTMLElement | undefined;
  readonly following: HTMLElement;
  readonly setNow: (nowMs: number) => void;
}

/** One station's passes, time running down: the countdown first, free time and overlaps between passes. */
export function phoneList(groups: readonly PassGroup[], nowMs: number): PhoneList {
  const coming = groups.filter((group) => group.losMs > nowMs);
  const lead = coming.find((group) => group.best.usableS > 0);
  const head = lead === undefined ? undefined : leading(lead);
  const items = h('ol', { class: 'phone-passes' });
  let busyUntilMs = lead?.losMs ?? nowMs;
  for (const group of coming) {
    if (group === lead) continue;
    if (lead === undefined || group.aosMs > lead.aosMs) items.append(h('li', { class: 'between' }, betweenWords(group, busyUntilMs)));
    items.append(h('li', {}, item(group, nowMs)));
    busyUntilMs = Math.max(busyUntilMs, group.losMs);
  }
  return { leading: head?.element, following: items, setNow: (instantMs) => { head?.setNow(instantMs); } };
}

function betweenWords(group: PassGroup, busyUntilMs: number): string {
  const gapS = (group.aosMs - busyUntilMs) / 1000;
  return gapS >= 0 ? `${wait(gapS)} free` : `overlaps the pass above by ${duration(Math.min(-gapS, (group.losMs - group.aosMs) / 1000))}`;
}

function leading(group: PassGroup): { readonly element: HTMLElement; readonly setNow: (nowMs: number) => void } {
  const { best } = group;
  const count = h('span', { class: 'countdown' });
  const until = h('span', {});
  const firstWindow = best.usableWindows[0];
  const lastWindow = best.usableWindows.at(-1);
  const element = h('section', { class: 'leading', 'aria-label': 'Next pass' },
    h('a', { href: passPageUrl(best), 'data-key': passKey(best) },
      h('h1', { class: 'leading-name' }, h('strong', {}, best.spacecraftName), ` on the ${best.antennaName}`),
      count,
      h('p', {}, until, `, ${duration(best.usableS)} usable, ${plain(bytes(best.yieldBytes))}`),
      fixedRibbon(best, { ...phoneLook, pxPerMinute: Math.min(33, 330 / (best.durationS / 60)) })),
    h('dl', { class: 'facts' },
      fact('AOS', clockTime(group.aosMs, zone()), `at ${plain(degrees(best.aosAzimuthDeg))}`),
      firstWindow === undefined ? undefined : fact('Closes from', clockTime(Date.parse(firstWindow.startUtc), zone()), upWords(best.usableElevationFromDeg)),
      lastWindow === undefined ? undefined : fact('to', clockTime(Date.parse(lastWindow.endUtc), zone()), upWords(best.usableElevationToDeg))));
  return {
    element,
    setNow: (nowMs) => {
      const isUp = nowMs >= group.aosMs;
      count.textContent = countdown(((isUp ? group.losMs : group.aosMs) - nowMs) / 1000);
      until.textContent = isUp ? 'to LOS' : 'to AOS';
    },
  };
}

function upWords(elevationDeg: number | undefined): string {
  return elevationDeg === undefined ? '' : `at ${plain(degrees(elevationDeg))} up`;
}

function fact(name: string, value: string, note: string): HTMLElement {
  return h('div', {}, h('dt', {}, name), h('dd', {}, h('strong', {}, value), h('span', { class: 'note' }, note)));
}

function item(group: PassGroup, nowMs: number): HTMLElement {
  const { best } = group;
  const others = group.passes.length - 1;
  const day = sameDay(group.aosMs, nowMs, zone()) ? '' : `${dayMonth(group.aosMs, zone())} `;
  return h('a', { class: best.usableS > 0 ? 'phone-pass' : 'phone-pass not-closing', href: passPageUrl(best), 'data-key': passKey(best) },
    h('span', { class: 'line' },
      h('strong', {}, `${day}${hourMinute(group.aosMs, zone())}\u2002${best.spacecraftName}`),
      best.elementSet.isStale && h('span', { class: 'caused' }, `set ${age(best.elementSet.ageH)} old`),
      h('strong', { class: 'amount' }, worthShort(best))),
    fixedRibbon(best, phoneLook),
    h('span', { class: 'line quiet' }, `${usableOf(best)}, ${best.antennaName}${others > 0 ? ` and ${others} more` : ''}`));
}

function worthShort(pass: Pass): Node | string {
  return pass.usableS > 0 ? shown(bytes(pass.yieldBytes)) : shortfall(pass);
}
