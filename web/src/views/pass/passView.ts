import { planner, wireInstant, type PassAddress } from '../../api/planner';
import type { Problem } from '../../api/problem';
import type { Budget } from '../../api/timeline';
import { nowMs, setServiceTime, whileVisible } from '../../app/clock';
import { setPageTitle, type View } from '../../app/view';
import { onZoneChange, zone, zoneOffsetMs } from '../../app/zone';
import { budgetLadder } from '../../charts/budgetLadder';
import { budgetFromTimeline } from '../../charts/ladderArithmetic';
import { passData, timeOf, type PassData } from '../../charts/passData';
import { passStack } from '../../charts/passStack';
import { skyView } from '../../charts/skyView';
import { h, replace } from '../../dom';
import { clockTime } from '../../format/time';
import { failure, skeleton, staleNotice } from '../states';
import { cursorFigures } from './cursorFigures';
import { passAlternatives, passFacts, passHead, passNotices } from './passHead';

const refreshMs = 60_000;
const settleMs = 180;
const phone = matchMedia('(max-width: 640px)');

/** The page of one pass: every second of it, and the budget at any of them. */
export function passView(parameters: Readonly<Record<string, string>>, query: URLSearchParams): View {
  const page = new PassPage({
    spacecraft: parameters['spacecraft'] ?? '', station: parameters['station'] ?? '', instantUtc: parameters['instant'] ?? '',
    antenna: query.get('antenna') ?? undefined, link: query.get('link') ?? undefined,
  });
  return { title: 'Pass', element: page.element, dispose: () => { page.dispose(); } };
}

class PassPage {
  readonly element = h('div', { class: 'pass-page' });
  private readonly request = new AbortController();
  private readonly stops: (() => void)[] = [];
  private data: PassData | undefined;
  private best: Budget | undefined;
  private problem: Problem | undefined;
  private cursorMs: number | undefined;
  private settle: ReturnType<typeof setTimeout> | undefined;
  private budgetRequest: AbortController | undefined;
  private readonly openRows = new Set<string>();
  private drawnWidthPx = 0;

  constructor(private readonly address: PassAddress) {
    const widths = new ResizeObserver(([entry]) => {
      const widthPx = Math.floor(entry?.contentRect.width ?? 0);
      if (widthPx === this.drawnWidthPx) return;
      this.drawnWidthPx = widthPx;
      this.draw();
    });
    widths.observe(this.element);
    this.stops.push(
      () => { widths.disconnect(); },
      onZoneChange(() => { this.draw(); }),
      whileVisible(refreshMs, () => { void this.load(); }),
    );
    this.draw();
    void this.load();
  }

  dispose(): void {
    this.request.abort();
    this.budgetRequest?.abort();
    clearTimeout(this.settle);
    for (const stop of this.stops) stop();
  }

  private async load(): Promise<void> {
    const { signal } = this.request;
    try {
      const [status, pass, timeline, budget] = await Promise.all([
        planner.status(signal), planner.pass(this.address, signal), planner.timeline(this.address, signal), planner.budget(this.address, undefined, signal),
      ]);
      if (status.ok) setServiceTime(status.value.nowUtc);
      const failed = [pass, timeline, budget].find((answer) => !answer.ok);
      if (pass.ok && timeline.ok && budget.ok) {
        this.data = passData(pass.value, timeline.value);
        this.best = budget.value;
        this.problem = undefined;
        setPageTitle(`${pass.value.spacecraftName} over ${pass.value.stationName}, ${clockTime(Date.parse(pass.value.aosUtc), zone())}`);
      } else if (failed !== undefined && !failed.ok) {
        this.problem = failed.problem;
      }
      this.draw();
    } catch (failureOfFetch) {
      if (!signal.aborted) throw failureOfFetch;
    }
  }

  private readonly retry = (): void => {
    this.problem = undefined;
    this.draw();
    void this.load();
  };

  private draw(): void {
    const focused = this.element.contains(document.activeElement) ? document.activeElement?.getAttribute('data-key') : undefined;
    const { data, best } = this;
    if (data === undefined || best === undefined) {
      replace(this.element, this.problem === undefined ? skeleton('Loading the pass') : failure(this.problem, this.retry));
      return;
    }
    replace(this.element,
      this.problem !== undefined && staleNotice(this.problem, this.retry),
      passHead(data.pass, this.address), ...passNotices(data.pass), passFacts(data.pass), this.charts(data, best),
      passAlternatives(data.pass, this.address));
    if (typeof focused === 'string') this.element.querySelector<HTMLElement>(`[data-key="${CSS.escape(focused)}"]`)?.focus({ preventScroll: true });
  }

  private charts(data: PassData, best: Budget): HTMLElement {
    const isPhone = phone.matches;
    const pagePx = this.drawnWidthPx || 1200;
    const sidePx = pagePx >= 1080 ? 430 : 0;
    const figures = cursorFigures(data);
    const sky = skyView(data, zone());
    const ladderTitle = h('h2', {});
    const ladder = h('div', { class: 'ladder-frame' });
    const setCursor = (index: number) => {
      const instantMs = timeOf(data, index);
      this.cursorMs = instantMs;
      stack.setCursor(index);
      sky.setCursor(index);
      figures.setCursor(index);
      ladderTitle.textContent = `Budget at ${clockTime(instantMs, zone())}`;
      this.showLadder(ladder, best, budgetFromTimeline(best, data, index, wireInstant(instantMs)));
      this.askBudget(instantMs, ladder, best);
    };
    const stack = passStack({
      data, widthPx: Math.max(300, pagePx - sidePx - (sidePx > 0 ? 32 : 0)), isPhone, zone: zone(), zoneOffsetMs: zoneOffsetMs(data.startMs), onCursor: setCursor,
    });
    setCursor(this.firstIndex(data));
    return h('div', { class: sidePx > 0 ? 'pass-charts beside' : 'pass-charts' },
      h('section', { class: 'stack-frame', 'aria-label': 'The pass second by second' }, stack.element, isPhone && figures.element),
      h('div', { class: 'pass-side' },
        h('section', {}, h('div', { class: 'side-head' }, h('h2', {}, 'Sky'), h('p', { class: 'faint small' }, 'zenith in the centre, east to the right')), sky.element),
        h('section', {}, h('div', { class: 'side-head' }, ladderTitle, h('p', { class: 'faint small' }, `of ${best.waveform.name}`)), ladder)));
  }

  /** The cursor stays where it was put; at first it stands at now during the pass, else at the end of what is usable. */
  private firstIndex(data: PassData): number {
    const lastWindow = data.pass.usableWindows.at(-1);
    const now = nowMs();
    const isUp = now >= data.startMs && now < timeOf(data, data.count);
    const wantedMs = this.cursorMs ?? (isUp ? now : lastWindow === undefined ? Date.parse(data.pass.bestUtc) : Date.parse(lastWindow.endUtc) - data.stepMs);
    return Math.min(data.count - 1, Math.max(0, Math.round((wantedMs - data.startMs) / data.stepMs)));
  }

  private showLadder(frame: HTMLElement, best: Budget, budget: Budget): void {
    for (const details of frame.querySelectorAll('details')) {
      const name = details.querySelector('summary')?.textContent ?? '';
      if (details.open) this.openRows.add(name);
      else this.openRows.delete(name);
    }
    const focusedRow = frame.contains(document.activeElement) ? document.activeElement?.textContent : undefined;
    replace(frame, budgetLadder(best, budget, zone(), phone.matches ? 130 : 190));
    for (const details of frame.querySelectorAll('details')) {
      const summary = details.querySelector('summary');
      details.open = this.openRows.has(summary?.textContent ?? '');
      if (focusedRow !== undefined && summary?.textContent === focusedRow) summary?.focus({ preventScroll: true });
    }
  }

  /** Once the cursor rests, the service's own lines for that second replace those derived from the timeline. */
  private askBudget(instantMs: number, frame: HTMLElement, best: Budget): void {
    clearTimeout(this.settle);
    this.budgetRequest?.abort();
    this.settle = setTimeout(async () => {
      const request = new AbortController();
      this.budgetRequest = request;
      try {
        const answer = await planner.budget(this.address, instantMs, request.signal);
        if (answer.ok && this.cursorMs === instantMs && frame.isConnected) this.showLadder(frame, best, answer.value);
      } catch (failureOfFetch) {
        if (!request.signal.aborted) throw failureOfFetch;
      }
    }, settleMs);
  }
}
