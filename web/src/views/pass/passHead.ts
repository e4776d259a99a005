import type { PassAlternative, PassDetail } from '../../api/passes';
import { planner, type PassAddress } from '../../api/planner';
import { nowMs } from '../../app/clock';
import { zone } from '../../app/zone';
import { verdictMark } from '../../charts/verdictMark';
import { h, type Child } from '../../dom';
import { bytes } from '../../format/amount';
import { degrees, fixed, plain } from '../../format/number';
import { age, calendarDate, clockTime, dayAndTime, duration, sameDay } from '../../format/time';
import { shortfall, verdict } from '../../format/words';

/** The answer first: does it close, for how long, for how many bytes. */
export function passHeadline(pass: PassDetail): string {
  if (pass.usableS === 0) return `Does not close, ${shortfall(pass)}`;
  const amount = plain(bytes(pass.yieldBytes));
  return pass.usableS >= pass.durationS
    ? `Closes for all of ${duration(pass.durationS)}, ${amount}`
    : `Closes for ${duration(pass.usableS)} of ${duration(pass.durationS)}, ${amount}`;
}

export function passHead(pass: PassDetail, address: PassAddress): HTMLElement {
  const url = planner.timelineUrl(address);
  return h('header', { class: 'pass-head' },
    h('div', { class: 'pass-title' },
      h('p', { class: 'quiet' }, h('a', { href: `/spacecraft/${encodeURIComponent(pass.spacecraft)}` }, pass.spacecraftName), ' over ',
        h('a', { href: `/stations/${encodeURIComponent(pass.station)}` }, pass.stationName), `, ${pass.antennaName}, ${pass.link.radio} ${pass.link.direction}, ${calendarDate(Date.parse(pass.aosUtc), zone())}`),
      h('h1', {}, passHeadline(pass)),
      causeLine(pass)),
    h('div', { class: 'controls' },
      h('button', { type: 'button', class: 'button', onClick: () => { window.print(); } }, 'Print'),
      h('button', { type: 'button', class: 'button', onClick: () => { void downloadCsv(url, pass); } }, 'Timeline CSV'),
      h('a', { class: 'button', href: url, download: `${fileName(pass)}.json` }, 'Timeline JSON')));
}

function causeLine(pass: PassDetail): Child {
  if (pass.limitingCause === '') return h('p', { class: 'cause-line' }, 'Nothing limits it above the elevation that the link asks for.');
  return h('p', { class: 'cause-line' }, pass.usableS > 0 ? 'Limited by: ' : '', h('strong', { class: pass.usableS > 0 ? '' : 'caused' }, pass.limitingCause));
}

function fileName(pass: PassDetail): string {
  return `${pass.spacecraft}-${pass.station}-${pass.aosUtc.slice(0, 19).replaceAll(':', '')}`;
}

/** CSV is the same address asked for with another Accept header, which a plain link cannot send. */
async function downloadCsv(url: string, pass: PassDetail): Promise<void> {
  const response = await fetch(url, { headers: { Accept: 'text/csv' } });
  if (!response.ok) return;
  const link = h('a', { href: URL.createObjectURL(await response.blob()), download: `${fileName(pass)}.csv` });
  link.click();
  URL.revokeObjectURL(link.href);
}

/** The instants that a station operator asks for, and what the answer rests on. */
export function passFacts(pass: PassDetail): HTMLElement {
  const firstWindow = pass.usableWindows[0];
  const lastWindow = pass.usableWindows.at(-1);
  return h('div', { class: 'pass-facts' },
    h('dl', { class: 'facts' },
      fact(pass.aosIsOpen ? 'Up before' : 'AOS', pass.aosUtc, plain(degrees(pass.aosAzimuthDeg))),
      firstWindow !== undefined && fact('Usable from', firstWindow.startUtc, upWords(pass.usableElevationFromDeg)),
      fact('Highest', pass.maximumElevationUtc, plain(degrees(pass.maximumElevationDeg, 1))),
      lastWindow !== undefined && fact('Usable to', lastWindow.endUtc, upWords(pass.usableElevationToDeg)),
      fact(pass.losIsOpen ? 'Still up at' : 'LOS', pass.losUtc, plain(degrees(pass.losAzimuthDeg))),
      pass.usableWindows.length > 1 && h('div', {}, h('dt', {}, 'In'), h('dd', {}, h('strong', {}, `${pass.usableWindows.length} windows`)))),
    provenance(pass));
}

function upWords(elevationDeg: number | undefined): string {
  return elevationDeg === undefined ? '' : `${plain(degrees(elevationDeg))} up`;
}

function fact(name: string, instantUtc: string, note: string): HTMLElement {
  return h('div', {}, h('dt', {}, name), h('dd', {}, h('strong', {}, clockTime(Date.parse(instantUtc), zone())), h('span', { class: 'note' }, note)));
}

function provenance(pass: PassDetail): HTMLElement {
  const { elementSet } = pass;
  const epochMs = Date.parse(elementSet.epochUtc);
  const epoch = sameDay(epochMs, nowMs(), zone()) ? clockTime(epochMs, zone()) : dayAndTime(epochMs, zone());
  const timing = elementSet.timingErrorS === undefined ? '' : `, ±${fixed(elementSet.timingErrorS, elementSet.timingErrorS < 10 ? 1 : 0)}\u00a0s`;
  return h('div', { class: 'provenance small' },
    h('p', { class: elementSet.isStale ? 'caused' : '' }, `Element set ${epoch}, ${age(elementSet.ageH)} old${timing}`),
    h('p', {}, `Station revision ${pass.stationRevision}, spacecraft revision ${pass.spacecraftRevision}`),
    h('details', {}, h('summary', {}, 'Models'), h('ul', {}, pass.models.map((model) =>
      h('li', {}, h('strong', {}, model.name), `, ${model.edition}`, model.note !== '' && h('span', { class: 'faint' }, `. ${model.note}`))))));
}

/** What needs a warning: an old element set, and a link that transmits. */
export function passNotices(pass: PassDetail): HTMLElement[] {
  const notices: HTMLElement[] = [];
  if (pass.elementSet.isStale) {
    notices.push(h('div', { class: 'notice' }, h('p', {}, h('strong', { class: 'caused' }, `The element set is ${age(pass.elementSet.ageH)} old, past its limit of ${age(pass.elementSet.limitH)}. `),
      'Times and directions may be off; load a newer set before this contact.'), h('a', { class: 'button small-button', href: `/spacecraft/${encodeURIComponent(pass.spacecraft)}` }, 'Load element sets')));
  }
  if (pass.link.direction === 'uplink') {
    notices.push(h('div', { class: 'notice' }, h('p', {}, h('strong', {}, 'This link transmits. '), 'It needs a licence; values are predicted; the antenna starts without warning. Follow the local safety rules.')));
  }
  return notices;
}

/** The other antennas and links that serve the same pass. */
export function passAlternatives(pass: PassDetail, address: PassAddress): HTMLElement | undefined {
  if (pass.alternatives.length === 0) return undefined;
  return h('section', { class: 'alternatives' }, h('h2', {}, 'The same pass by other links'),
    h('ul', {}, pass.alternatives.map((alternative) => h('li', {}, verdictMark(alternative.verdict),
      h('a', { href: alternativeUrl(address, alternative) }, `${alternative.antennaName}, ${alternative.link.radio} ${alternative.link.direction}`),
      h('span', { class: 'quiet' }, ` ${verdict(alternative.verdict).toLowerCase()}${alternative.yieldBytes > 0 ? `, ${plain(bytes(alternative.yieldBytes))}` : ''}`)))));
}

function alternativeUrl(address: PassAddress, alternative: PassAlternative): string {
  const query = new URLSearchParams({ antenna: alternative.antenna, link: `${alternative.link.radio}:${alternative.link.chain}` });
  return `/pass/${[address.spacecraft, address.station, address.instantUtc].map(encodeURIComponent).join('/')}?${query.toString()}`;
}
