import { h, s } from '../dom';
import { calendarDate, clockTime, zoneName, type Zone } from '../format/time';
import { eachSecond, nowMs } from './clock';
import { onZoneChange, setZone, zone } from './zone';

const pages = [
  { path: '/', name: 'Passes', owns: /^\/($|pass\/)/ },
  { path: '/stations', name: 'Stations', owns: /^\/stations(\/|$)/ },
  { path: '/spacecraft', name: 'Spacecraft', owns: /^\/spacecraft(\/|$)/ },
] as const;

export interface Shell {
  readonly main: HTMLElement;
  /** Marks the page that owns a path in both navigation bars. */
  readonly markPage: (path: string) => void;
}

/** Draws what every page shares: head with navigation and clock, `main`, foot with cautions, tab bar on a phone. */
export function buildShell(root: HTMLElement): Shell {
  const main = h('main', { id: 'main', tabindex: '-1' });
  const topLinks = pages.map((page) => h('a', { href: page.path }, page.name));
  const tabLinks = pages.map((page) => h('a', { href: page.path }, page.name));
  root.append(
    h('a', { class: 'skip-link', href: '#main' }, 'Skip to the page'),
    hatchPatterns(),
    h('header', { class: 'page-head' },
      h('a', { class: 'brand', href: '/' }, brandMark(), h('span', {}, 'Pass planner')),
      h('nav', { class: 'page-nav', 'aria-label': 'Pages' }, topLinks),
      h('div', { class: 'head-time' }, zoneSwitch(), clock())),
    main,
    h('footer', { class: 'page-foot' },
      h('p', {}, h('strong', {}, 'Predicted values. '), 'Orbits, weather and equipment differ from their models; check against what you measure.'),
      h('p', {}, h('strong', {}, 'Transmitting needs a licence. '), 'Follow its limits on frequency, power and direction.'),
      h('p', {}, h('strong', {}, 'Moving antennas start without warning. '), 'Follow the safety rules of the site.')),
    h('nav', { class: 'tab-bar', 'aria-label': 'Pages' }, tabLinks),
  );
  return {
    main,
    markPage: (path) => {
      for (const [index, page] of pages.entries()) {
        for (const link of [topLinks[index], tabLinks[index]]) {
          if (page.owns.test(path)) link?.setAttribute('aria-current', 'page');
          else link?.removeAttribute('aria-current');
        }
      }
    },
  };
}

function brandMark(): SVGSVGElement {
  return s('svg', { viewBox: '0 0 32 16', 'aria-hidden': 'true' },
    s('path', { class: 'mark-fill', d: 'M8 10C12 10 11.5 2 16 2s4 8 8 8z' }),
    s('path', { class: 'mark-line', d: 'M1 10.5h30M8 11c-2 1.2-3.5 2.5-5 4.5M24 11c2 1.2 3.5 2.5 5 4.5' }));
}

function zoneSwitch(): HTMLElement {
  const options: readonly Zone[] = ['utc', 'local'];
  return h('fieldset', { class: 'switch bare', 'aria-label': 'Times in' },
    options.map((option) => h('label', {},
      h('input', { type: 'radio', name: 'zone', value: option, checked: option === zone(), onChange: () => { setZone(option); } }),
      h('span', {}, zoneName(option)))));
}

function clock(): HTMLElement {
  const date = h('span', { class: 'date' });
  const time = h('span', {});
  const show = (instantMs: number) => {
    date.textContent = `${calendarDate(instantMs, zone())}\u2002`;
    time.textContent = clockTime(instantMs, zone());
  };
  show(nowMs());
  eachSecond(show);
  onZoneChange(() => { show(nowMs()); });
  return h('span', { class: 'clock' }, date, time);
}

/** The two hatches, defined once for all drawings of the document. */
function hatchPatterns(): SVGSVGElement {
  const hatch = (id: string, pitchPx: number) =>
    s('pattern', { id, width: pitchPx, height: pitchPx, patternUnits: 'userSpaceOnUse', patternTransform: 'rotate(45)' },
      s('path', { class: 'hatch-line', d: `M0 0V${pitchPx}` }));
  return s('svg', { width: 0, height: 0, style: 'position:absolute', 'aria-hidden': 'true' }, s('defs', {}, hatch('hatch-4', 4), hatch('hatch-7', 7)));
}
