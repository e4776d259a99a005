import type { Pass } from '../../api/passes';
import { zone } from '../../app/zone';
import { fixedRibbon, tableLook } from '../../charts/tableRibbon';
import { verdictMark } from '../../charts/verdictMark';
import { h, type Child } from '../../dom';
import { bitRate, bytes } from '../../format/amount';
import { degrees, plain } from '../../format/number';
import { age, clockTime, countdown, dayMonth, duration, sameDay, wait } from '../../format/time';
import { limitedBy, verdict } from '../../format/words';
import { passKey, passPageUrl, type PassGroup } from './passGroups';
import { shown } from '../states';

const headings = [
  ['AOS', ''], ['In', ''], ['Spacecraft', ''], ['Antenna', ''], ['Margin, centred on highest elevation', ''], ['Verdict', ''],
  ['Usable', 'right'], ['Up to', 'right'], ['Yield', 'right'], ['Max. el.', 'right'], ['Limited by', ''],
] as const;

export interface PassTable {
  readonly element: HTMLElement;
  readonly setNow: (nowMs: number) => void;
}

/** The lanes' passes in figures. A second antenna of one pass repeats neither time nor name. */
export function passTable(groups: readonly PassGroup[], nowMs: number, showsDirection: boolean): PassTable {
  const waits: { readonly group: PassGroup; readonly cell: HTMLElement }[] = [];
  const body = h('tbody', {});
  for (const group of groups) {
    for (const [index, pass] of group.passes.entries()) {
      const cell = h('span', {});
      if (index === 0) waits.push({ group, cell });
      body.append(row(pass, index === 0, cell, nowMs, showsDirection));
    }
  }
  const setNow = (instantMs: number) => {
    for (const { group, cell } of waits) cell.textContent = waitWords(group, instantMs);
  };
  setNow(nowMs);
  const element = h('div', { class: 'table-frame', tabindex: '0', role: 'region', 'aria-label': 'Passes in figures' },
    h('table', { class: 'passes' },
      h('thead', {}, h('tr', {}, headings.map(([text, side]) => h('th', { scope: 'col', class: side }, text)))), body));
  return { element, setNow };
}

function waitWords(group: PassGroup, nowMs: number): string {
  if (group.aosMs > nowMs) return wait((group.aosMs - nowMs) / 1000);
  return group.losMs > nowMs ? `now, ${countdown((group.losMs - nowMs) / 1000)} left` : 'over';
}

function row(pass: Pass, isFirst: boolean, waitCell: HTMLElement, nowMs: number, showsDirection: boolean): HTMLElement {
  const url = passPageUrl(pass);
  const closes = pass.usableS > 0;
  const aosMs = Date.parse(pass.aosUtc);
  const day: Child = sameDay(aosMs, nowMs, zone()) ? undefined : h('span', { class: 'faint' }, `${dayMonth(aosMs, zone())} `);
  const link = { href: url, 'data-key': `row ${passKey(pass)}` };
  const time = isFirst && h('a', link, pass.aosIsOpen ? 'up before ' : '', day, clockTime(aosMs, zone()));
  const place = showsDirection ? `${pass.stationName}, ${pass.antennaName}, ${pass.link.direction}` : `${pass.stationName}, ${pass.antennaName}`;
  const antenna = isFirst ? place : h('a', link, h('span', { class: 'hidden-text' }, `${pass.spacecraftName} ${clockTime(aosMs, zone())} over `), place);
  return h('tr', {
    class: [isFirst ? 'first' : '', closes ? '' : 'not-closing'].join(' '),
    onClick: (event: MouseEvent) => {
      if (event.target instanceof Element && event.target.closest('a') === null && getSelection()?.isCollapsed !== false) openRow(event);
    },
  },
    isFirst ? h('th', { scope: 'row', class: 'time' }, time) : h('td', {}),
    h('td', { class: 'wait' }, waitCell),
    h('td', { class: 'craft' }, isFirst && h('span', {}, pass.spacecraftName), isFirst && pass.elementSet.isStale && h('span', { class: 'caused' }, ` set ${age(pass.elementSet.ageH)}`)),
    h('td', { class: 'antenna' }, antenna),
    h('td', { class: 'ribbon-cell' }, fixedRibbon(pass, tableLook)),
    h('td', { class: 'verdict' }, verdictMark(pass.verdict), h('span', {}, verdict(pass.verdict))),
    h('td', { class: 'right' }, closes ? duration(pass.usableS) : '–', h('span', { class: 'faint' }, ` of ${duration(pass.durationS)}`)),
    h('td', { class: 'right' }, closes ? shown(bitRate(pass.highestBitRateBps)) : '–'),
    h('td', { class: 'right yield' }, closes ? shown(bytes(pass.yieldBytes)) : '–'),
    h('td', { class: 'right' }, plain(degrees(pass.maximumElevationDeg))),
    h('td', { class: closes ? 'cause' : 'cause caused-cell' }, limitedBy(pass)),
  );
}

/** A press anywhere in a row follows the row's link, with the same keys held. */
function openRow(event: MouseEvent): void {
  const anchor = event.currentTarget instanceof Element ? event.currentTarget.querySelector('a') : null;
  anchor?.dispatchEvent(new MouseEvent('click', { bubbles: true, cancelable: true, ctrlKey: event.ctrlKey, metaKey: event.metaKey, shiftKey: event.shiftKey }));
}
