import type { Pass } from '../api/passes';
import { s } from '../dom';
import { hourMinute, dayMonth, type Zone } from '../format/time';
import { worth } from '../format/words';
import { hillRibbon, narrowestHillPx } from './hillRibbon';
import { packLane, type LaneBox } from './laneLayout';
import { highestExcessDb, lowestExcessDb, peakExcessDb } from './ribbonGeometry';
import { lightBands } from './sunlight';
import { fitted, textWidth } from './textWidth';
import { timeScale, timeTicks, type TimeScale } from './timeScale';

/** One antenna's passes in the frame. */
export interface Lane {
  readonly stationId: string;
  readonly stationName: string;
  readonly antennaName: string;
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
  readonly beginsStation: boolean;
  readonly summary: string;
  readonly passes: readonly LanePass[];
}

export interface LanePass {
  readonly key: string;
  readonly url: string;
  readonly label: string;
  readonly spoken: string;
  readonly pass: Pass;
}

export interface LaneChartInput {
  readonly lanes: readonly Lane[];
  readonly fromMs: number;
  readonly toMs: number;
  readonly widthPx: number;
  readonly zone: Zone;
  readonly zoneOffsetMs: number;
}

export interface LaneChart {
  readonly element: SVGSVGElement;
  readonly setNow: (nowMs: number) => void;
}

const gutterPx = 176;
const headPx = 30;
const look = { pxPerDb: 2.3 };
const labelPx = 12;
const lanePaddingPx = 6;
const hillUnderPx = 6;
const labelHalfPx = 16;
const flagHalfPx = 21;
/** A longer name is cut, or a lane would stack as if its passes overlapped. */
const widestNamePx = 132;

/** A lane for each antenna over time; each pass is a hill over its required line, and a link to its page. */
export function laneChart(input: LaneChartInput): LaneChart {
  const scale = timeScale(input.fromMs, input.toMs, gutterPx, input.widthPx);
  const labelled = input.toMs - input.fromMs <= 12.5 * 3_600_000;
  const element = s('svg', { class: 'lanes', width: input.widthPx, role: 'group', 'aria-label': 'Passes by antenna; arrow keys move between passes' });
  const behind = s('g', {});
  const front = s('g', {});
  const inside = s('rect', { x: gutterPx, y: 0, width: input.widthPx - gutterPx });
  element.append(s('defs', {}, s('clipPath', { id: 'lanes-inside' }, inside)), behind, front);

  const links: LaneLink[] = [];
  const hills = s('g', { 'clip-path': 'url(#lanes-inside)' });
  let y = headPx;
  for (const [laneIndex, lane] of input.lanes.entries()) {
    const boxes = lane.passes.map((entry) => boxOf(entry, scale, labelled));
    const layout = packLane(boxes, lanePaddingPx, lane.beginsStation ? 68 : 54);
    behind.append(nightBands(lane, scale, y, layout.height));
    front.append(...laneHead(lane, y), s('path', { class: lane.beginsStation ? 'lane-rule' : 'grid', d: `M${lane.beginsStation ? 0 : gutterPx} ${y + 0.5}H${input.widthPx}` }));
    for (const [index, entry] of lane.passes.entries()) {
      const row = layout.rows[index] ?? 0;
      const box = boxes[index];
      if (box === undefined) continue;
      const link = passLink(entry, box, scale, y + (layout.baselines[row] ?? 0), labelled);
      links.push({ link, laneIndex, middle: (box.left + box.right) / 2 });
      hills.append(link);
    }
    y += layout.height;
  }
  front.append(hills, s('path', { class: 'lane-rule', d: `M0 ${y + 0.5}H${input.widthPx}` }));
  const ticks = timeGrid(scale, y, input);
  behind.append(...ticks.elements);
  element.setAttribute('height', String(y + 1));
  inside.setAttribute('height', String(y));
  element.setAttribute('viewBox', `0 0 ${input.widthPx} ${y + 1}`);
  roveByArrows(element, links);

  const now = s('g', {},
    s('path', { class: 'now-line', d: `M0 ${headPx - 10}V${y}` }),
    s('rect', { class: 'flag', x: -19, y: 2, width: 38, height: 20, rx: 3 }),
    s('text', { class: 'flag-text', x: 0, y: 16 }, 'now'));
  front.append(now);
  return {
    element,
    setNow: (nowMs) => {
      const inside = nowMs >= input.fromMs && nowMs < input.toMs;
      now.setAttribute('visibility', inside ? 'visible' : 'hidden');
      for (const { x, label } of ticks.labels) label.setAttribute('visibility', inside && Math.abs(x + labelHalfPx - scale.x(nowMs)) < labelHalfPx + flagHalfPx ? 'hidden' : 'visible');
      now.setAttribute('transform', `translate(${Math.round(scale.x(nowMs))} 0)`);
    },
  };
}

interface PassBox extends LaneBox {
  readonly rise: number;
  readonly name: string;
  readonly nameX: number;
  readonly worthX: number;
  readonly worthAnchor: 'start' | 'end';
}

/** Where a pass and its labels stand; at the right edge the labels keep inside the frame. */
function boxOf(entry: LanePass, scale: TimeScale, labelled: boolean): PassBox {
  const { pass } = entry;
  const left = scale.x(Date.parse(pass.aosUtc));
  const right = Math.max(scale.x(Date.parse(pass.losUtc)), left + 5);
  const isHill = right - left >= narrowestHillPx && pass.marginProfile !== undefined;
  const excessDb = Math.min(highestExcessDb, peakExcessDb(pass));
  const rise = isHill ? Math.max(2, excessDb * look.pxPerDb) : 13;
  if (!labelled) return { left, right, rise, above: rise, below: hillUnderPx, name: '', nameX: left, worthX: right, worthAnchor: 'start' };
  const timingErrorMs = pass.elementSet.isStale ? (pass.elementSet.timingErrorS ?? 0) * 1000 : 0;
  const whiskerPx = scale.x(scale.fromMs + timingErrorMs) - scale.left;
  const name = fitted(entry.label, widestNamePx, labelPx, 650);
  const nameWidth = textWidth(name, labelPx, 650);
  const worthWidth = textWidth(worth(pass), labelPx, 400) + 4;
  const nameX = Math.max(scale.left + 2, Math.min(left, scale.right - nameWidth));
  const fitsRight = right + whiskerPx + worthWidth <= scale.right;
  return {
    rise, name, nameX,
    worthX: fitsRight ? right + whiskerPx + 4 : left - whiskerPx - 4, worthAnchor: fitsRight ? 'start' : 'end',
    left: Math.min(nameX, fitsRight ? left - whiskerPx : left - whiskerPx - worthWidth),
    right: Math.max(nameX + nameWidth, fitsRight ? right + whiskerPx + worthWidth : right + whiskerPx),
    above: rise + labelPx + 6,
    below: isHill ? -lowestExcessDb * look.pxPerDb + 2 : hillUnderPx + 6,
  };
}

function passLink(entry: LanePass, box: PassBox, scale: TimeScale, baseline: number, labelled: boolean): SVGAElement {
  const { pass } = entry;
  const left = scale.x(Date.parse(pass.aosUtc));
  const right = Math.max(scale.x(Date.parse(pass.losUtc)), left + 5);
  const link = s('a', { class: 'lane-pass', href: entry.url, 'data-key': entry.key, 'aria-label': entry.spoken, tabindex: '-1', transform: `translate(0 ${baseline})` },
    s('title', {}, entry.spoken),
    s('rect', { class: 'hit', x: left - 3, y: -box.rise - 18, width: right - left + 6, height: box.rise + 34 }),
    hillRibbon(pass, scale.x, look));
  if (labelled) {
    link.append(
      s('text', { class: pass.usableS === 0 ? 'name quiet-name' : 'name', x: box.nameX, y: -box.rise - 5 }, box.name), ' ',
      s('text', { class: 'ink2-text', 'text-anchor': box.worthAnchor, x: box.worthX, y: 11 }, worth(pass)));
  }
  return link;
}

function laneHead(lane: Lane, y: number): SVGElement[] {
  const head: SVGElement[] = [];
  let line = y + 18;
  const full = `${lane.stationName}, ${lane.antennaName}`;
  if (lane.beginsStation) {
    head.push(s('a', { href: `/stations/${encodeURIComponent(lane.stationId)}` },
      s('title', {}, full), s('text', { class: 'lane-station', x: 0, y: line }, fitted(lane.stationName, gutterPx - 12, 14, 650))));
    line += 18;
  }
  head.push(
    s('text', { class: 'lane-antenna', x: 0, y: line }, fitted(lane.antennaName, gutterPx - 12, 12, 650)),
    s('text', { x: 0, y: line + 16 }, lane.summary));
  return head;
}

function nightBands(lane: Lane, scale: TimeScale, y: number, height: number): SVGElement {
  const stepMs = (scale.toMs - scale.fromMs) / 240;
  return s('g', {}, lightBands(scale.fromMs, scale.toMs, lane.latitudeDeg, lane.longitudeDeg, stepMs).map((band) =>
    s('rect', { class: `band-${band.light}`, x: scale.x(band.fromMs), y, width: scale.x(band.toMs) - scale.x(band.fromMs), height })));
}

interface TimeGrid {
  readonly elements: readonly SVGElement[];
  /** Names of the ticks, which give way to the flag of now. */
  readonly labels: readonly { readonly x: number; readonly label: SVGElement }[];
}

function timeGrid(scale: TimeScale, bottom: number, input: LaneChartInput): TimeGrid {
  const lines: SVGElement[] = [];
  const labels: { x: number; label: SVGElement }[] = [];
  for (const tickMs of timeTicks(scale, 90, input.zoneOffsetMs)) {
    const x = Math.round(scale.x(tickMs)) + 0.5;
    lines.push(s('path', { class: 'grid', d: `M${x} ${headPx - 4}V${bottom}` }));
    if (x + 40 >= scale.right) continue;
    const isMidnight = (tickMs + input.zoneOffsetMs) % 86_400_000 === 0;
    const text = isMidnight ? dayMonth(tickMs, input.zone) : hourMinute(tickMs, input.zone);
    labels.push({ x: x + 4, label: s('text', { class: isMidnight ? 'ink-text' : 'ink2-text', x: x + 4, y: 16 }, text) });
  }
  return { elements: [...lines, ...labels.map(({ label }) => label)], labels };
}

interface LaneLink {
  readonly link: SVGAElement;
  readonly laneIndex: number;
  readonly middle: number;
}

/** One stop for the Tab key; arrows go to the next pass in the lane, or to the nearest one in the next lane. */
function roveByArrows(element: SVGSVGElement, links: readonly LaneLink[]): void {
  links[0]?.link.setAttribute('tabindex', '0');
  const go = (target: LaneLink | undefined) => {
    if (target === undefined) return;
    for (const { link } of links) link.setAttribute('tabindex', link === target.link ? '0' : '-1');
    target.link.focus();
  };
  element.addEventListener('keydown', (event) => {
    const at = links.findIndex(({ link }) => link === document.activeElement);
    const here = links[at];
    if (here === undefined) return;
    const step = { ArrowLeft: -1, ArrowRight: 1 }[event.key];
    const lift = { ArrowUp: -1, ArrowDown: 1 }[event.key];
    if (step !== undefined) go(links[at + step]);
    else if (lift !== undefined) go(nearestInLanes(links, here, lift));
    else return;
    event.preventDefault();
  });
}

function nearestInLanes(links: readonly LaneLink[], here: LaneLink, lift: number): LaneLink | undefined {
  const beyond = links.filter(({ laneIndex }) => Math.sign(laneIndex - here.laneIndex) === lift);
  const laneIndex = lift > 0 ? Math.min(...beyond.map((link) => link.laneIndex)) : Math.max(...beyond.map((link) => link.laneIndex));
  return beyond
    .filter((link) => link.laneIndex === laneIndex)
    .sort((first, second) => Math.abs(first.middle - here.middle) - Math.abs(second.middle - here.middle))[0];
}
