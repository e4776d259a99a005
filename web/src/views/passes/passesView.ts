import { eachSecond, nowMs, whileVisible } from '../../app/clock';
import type { View } from '../../app/view';
import { onZoneChange, zone, zoneOffsetMs } from '../../app/zone';
import type { Problem } from '../../api/problem';
import { laneChart } from '../../charts/laneChart';
import { overviewStrip } from '../../charts/overviewStrip';
import { h, replace } from '../../dom';
import { count } from '../../format/words';
import { empty, failure, skeleton, staleNotice } from '../states';
import { filterGroup, legend, passControls, stationControl, type ControlInput } from './controls';
import { demoNotice } from './demoNotice';
import { headline, nextSentence, periodWords } from './headline';
import { antennaRows, lanesInFrame, overviewRows } from './lanes';
import { loadFeed, type PassFeed } from './passFeed';
import { groupPasses, type PassGroup } from './passGroups';
import { passTable } from './passTable';
import { phoneList } from './phoneList';
import { isSelected, readSelection, selectionUrl, type Selection } from './selection';
import { withoutPassesList } from './withoutPasses';

const refreshMs = 60_000;
const rowsAtFirst = 80;
const hourMs = 3_600_000;
const phone = matchMedia('(max-width: 640px)');

/** Kept when the page is left, so that Back shows it at once. */
let lastFeed: { readonly spanH: number; readonly feed: PassFeed } | undefined;

/** The page that opens first: which of the coming passes close, over which antenna, for how long and how well. */
export function passesView(_parameters: Readonly<Record<string, string>>, query: URLSearchParams): View {
  const page = new PassesPage(readSelection(query));
  return { title: 'Passes', element: page.element, dispose: () => { page.dispose(); } };
}

class PassesPage {
  readonly element = h('div', { class: 'passes-page' });
  private selection: Selection;
  private feed: PassFeed | undefined;
  private problem: Problem | undefined;
  private frameFromMs: number | undefined;
  private showsAllRows = false;
  private request = new AbortController();
  private ticking: ((nowMs: number) => void)[] = [];
  private readonly stops: (() => void)[];

  constructor(selection: Selection) {
    this.selection = selection;
    if (lastFeed?.spanH === this.spanH()) this.feed = lastFeed.feed;
    let width = 0;
    const watchWidth = new ResizeObserver(([entry]) => {
      const next = Math.floor(entry?.contentRect.width ?? 0);
      if (next !== width) {
        width = next;
        this.draw();
      }
    });
    watchWidth.observe(this.element);
    this.stops = [
      () => { watchWidth.disconnect(); },
      eachSecond((instantMs) => { for (const tick of this.ticking) tick(instantMs); }),
      onZoneChange(() => { this.draw(); }),
      whileVisible(refreshMs, () => { void this.load(); }),
    ];
    this.draw();
    void this.load();
  }

  dispose(): void {
    this.request.abort();
    for (const stop of this.stops) stop();
  }

  private spanH(): number {
    return this.selection.periodH === 168 ? 168 : 24;
  }

  private async load(): Promise<void> {
    this.request.abort();
    const request = new AbortController();
    this.request = request;
    const spanH = this.spanH();
    try {
      const answer = await loadFeed(spanH, request.signal, (part) => {
        if (this.feed === undefined) this.show(part, spanH);
      });
      if (answer.ok) this.show(answer.feed, spanH);
      else {
        this.problem = answer.problem;
        this.draw();
      }
    } catch (failureOfFetch) {
      if (!request.signal.aborted) throw failureOfFetch;
    }
  }

  private show(feed: PassFeed, spanH: number): void {
    this.feed = feed;
    this.problem = undefined;
    lastFeed = { spanH, feed };
    this.draw();
  }

  private readonly change = (selection: Selection): void => {
    const needsMore = (selection.periodH === 168) !== (this.selection.periodH === 168);
    this.selection = selection;
    this.showsAllRows = false;
    this.frameFromMs = undefined;
    history.replaceState(null, '', selectionUrl(selection));
    this.draw();
    if (needsMore) void this.load();
  };

  private readonly retry = (): void => {
    this.problem = undefined;
    this.draw();
    void this.load();
  };

  /** Draws all anew from what is known; the focus returns to the thing that had it. */
  private draw(): void {
    const focused = this.element.contains(document.activeElement) ? document.activeElement?.getAttribute('data-key') : undefined;
    this.ticking = [];
    replace(this.element, this.content());
    if (typeof focused === 'string') this.element.querySelector<HTMLElement>(`[data-key="${CSS.escape(focused)}"]`)?.focus({ preventScroll: true });
    for (const tick of this.ticking) tick(nowMs());
  }

  private content(): (Node | undefined)[] {
    const { feed } = this;
    if (feed === undefined) {
      return [this.problem === undefined ? skeleton('Loading passes') : failure(this.problem, this.retry)];
    }
    const stale = this.problem === undefined ? undefined : staleNotice(this.problem, this.retry);
    const demo = feed.status.hasDemo ? demoNotice(this.retry) : undefined;
    const notices = [stale, demo];
    if (feed.stations.length === 0) return [...notices, empty('No stations yet', h('p', { class: 'quiet' }, 'A station is a place with one antenna or more. Passes show here once there is one, and a spacecraft with an element set.'), h('a', { class: 'button solid', href: '/stations/new' }, 'Add a station'))];
    if (feed.spacecraft.length === 0) return [...notices, empty('No spacecraft yet', h('p', { class: 'quiet' }, 'Passes show here once there is a spacecraft with a radio and an element set.'), h('a', { class: 'button solid', href: '/spacecraft/new' }, 'Add a spacecraft'))];
    return phone.matches ? [stale, ...this.phoneContent(feed), demo] : [...notices, ...this.wideContent(feed)];
  }

  private phoneContent(feed: PassFeed): (Node | undefined)[] {
    const station = feed.stations.find((entry) => entry.id === this.selection.station) ?? feed.stations[0];
    const selection = { ...this.selection, station: station?.id };
    const groups = groupPasses(feed.passes.filter((pass) => isSelected(pass, selection)));
    const input: ControlInput = { selection, stations: feed.stations, spacecraft: feed.spacecraft, isPhone: true, onChange: this.change };
    const filters = filterGroup(...passControls(input));
    const stationPicker = filterGroup(stationControl(input));
    if (groups.every((group) => group.losMs <= nowMs())) {
      return [stationPicker, h('div', { class: 'state' }, h('h1', {}, 'No passes in the next 24\u00a0h'), h('p', { class: 'quiet' }, `Over ${station?.name ?? 'this station'}, with these filters.`)), filters, ...this.without(feed)];
    }
    const list = phoneList(groups, nowMs());
    this.ticking.push(list.setNow);
    return [stationPicker, list.leading ?? h('h1', {}, 'No pass closes in the next 24\u00a0h'), filters, list.following, ...this.without(feed)];
  }

  private wideContent(feed: PassFeed): Node[] {
    const periodMs = this.selection.periodH * hourMs;
    const isWhole = feed.toMs - feed.fromMs <= periodMs;
    const fromMs = isWhole ? feed.fromMs : (this.frameFromMs ?? feed.fromMs);
    const toMs = fromMs + (isWhole ? feed.toMs - feed.fromMs : periodMs);
    const selected = feed.passes.filter((pass) => isSelected(pass, this.selection));
    const groups = groupPasses(selected);
    const framed = groups.filter((group) => group.losMs > Math.max(fromMs, this.frameFromMs === undefined ? nowMs() : 0) && group.aosMs < toMs);
    const input: ControlInput = { selection: this.selection, stations: feed.stations, spacecraft: feed.spacecraft, isPhone: false, onChange: this.change };
    const period = periodWords(fromMs, toMs, nowMs(), this.frameFromMs === undefined, zone());
    return [
      h('h1', {}, headline(framed, period)),
      this.nextLine(groups),
      filterGroup(stationControl(input), ...passControls(input)),
      legend(),
      this.charts(feed, selected, fromMs, toMs, isWhole),
      ...this.tables(framed),
      ...this.without(feed),
    ];
  }

  private nextLine(groups: readonly PassGroup[]): Node {
    const line = h('p', { class: 'next-line' });
    this.ticking.push((instantMs) => { replace(line, ...nextSentence(groups, instantMs)); });
    return line;
  }

  private charts(feed: PassFeed, selected: PassFeed['passes'], fromMs: number, toMs: number, isWhole: boolean): Node {
    const widthPx = Math.max(600, Math.floor(this.element.clientWidth || 1000));
    const stations = this.selection.station === undefined ? feed.stations : feed.stations.filter((station) => station.id === this.selection.station);
    const rows = antennaRows(stations, selected, this.selection.direction);
    const shared = { widthPx, zone: zone(), zoneOffsetMs: zoneOffsetMs(fromMs) };
    const lanes = laneChart({ ...shared, lanes: lanesInFrame(rows, fromMs, toMs), fromMs, toMs });
    this.ticking.push(lanes.setNow);
    const overview = isWhole ? undefined : overviewStrip({
      ...shared, rows: overviewRows(rows), fromMs: feed.fromMs, toMs: feed.toMs, frameMs: toMs - fromMs, frameFromMs: fromMs,
      onFrame: (frameFromMs) => {
        this.frameFromMs = frameFromMs;
        this.draw();
      },
    });
    return h('div', { class: 'charts' }, overview, lanes.element);
  }

  private tables(framed: readonly PassGroup[]): Node[] {
    if (framed.length === 0) return [h('p', { class: 'quiet' }, 'No pass in this period fits the filters.')];
    const some = this.showsAllRows ? framed : framed.slice(0, rowsAtFirst);
    const table = passTable(some, nowMs(), this.selection.direction === undefined);
    this.ticking.push(table.setNow);
    const more = framed.length - some.length;
    const showAll = h('button', { type: 'button', class: 'button', onClick: () => { this.showsAllRows = true; this.draw(); } }, `Show ${count(more, 'more pass', 'more passes')}`);
    return [h('h2', {}, 'The same passes in figures'), table.element, ...(more > 0 ? [showAll] : []), ...this.uplinkCaution(framed)];
  }

  private uplinkCaution(framed: readonly PassGroup[]): Node[] {
    const hasUplink = framed.some((group) => group.passes.some((pass) => pass.link.direction === 'uplink'));
    return hasUplink ? [h('p', { class: 'notice' }, 'Uplinks are listed: transmitting needs a licence, and people near the antenna need the site\u2019s safety rules.')] : [];
  }

  private without(feed: PassFeed): Node[] {
    const entries = feed.withoutPasses.filter((entry) => (this.selection.station === undefined || entry.station === undefined || entry.station === this.selection.station)
      && (this.selection.spacecraft === undefined || entry.spacecraft === this.selection.spacecraft));
    const list = withoutPassesList(entries, feed.stations, feed.spacecraft);
    return list === undefined ? [] : [list];
  }
}
