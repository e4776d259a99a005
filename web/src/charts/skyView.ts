import type { MaskPoint } from '../api/passes';
import { s } from '../dom';
import { fixed } from '../format/number';
import { hourMinute, type Zone } from '../format/time';
import { round } from './chartFrame';
import { at, timeOf, type PassData } from './passData';
import { tintOf } from './ribbonGeometry';

export interface SkyView {
  readonly element: SVGSVGElement;
  readonly setCursor: (index: number) => void;
}

export interface SkyPoint {
  readonly x: number;
  readonly y: number;
}

const sizePx = 396;
const centrePx = sizePx / 2;
const radiusPx = 150;
/** Room at the left and right for the names of AOS and LOS. */
const sideRoomPx = 26;
const minuteNameHalfPx = 16;
const degree = Math.PI / 180;

/** Zenith in the centre, radius linear in zenith angle, north up, east to the right. */
export function skyPoint(azimuthDeg: number, elevationDeg: number): SkyPoint {
  const radius = radiusPx * (90 - Math.max(0, elevationDeg)) / 90;
  return { x: centrePx + radius * Math.sin(azimuthDeg * degree), y: centrePx - radius * Math.cos(azimuthDeg * degree) };
}

/** Elevation of a mask at an azimuth: linear between its points, around the circle. */
export function maskElevationDeg(mask: readonly MaskPoint[], azimuthDeg: number): number {
  const points = [...mask].sort((first, second) => first.azimuthDeg - second.azimuthDeg);
  const first = points[0];
  const last = points.at(-1);
  if (first === undefined || last === undefined) return 5;
  const after = points.find((point) => point.azimuthDeg > azimuthDeg) ?? { ...first, azimuthDeg: first.azimuthDeg + 360 };
  const before = points.findLast((point) => point.azimuthDeg <= azimuthDeg) ?? { ...last, azimuthDeg: last.azimuthDeg - 360 };
  const share = (azimuthDeg - before.azimuthDeg) / (after.azimuthDeg - before.azimuthDeg || 1);
  return before.elevationDeg + share * (after.elevationDeg - before.elevationDeg);
}

/** The sky over the station with the mask, the track in tints of margin, the Sun and minute ticks. */
export function skyView(data: PassData, zone: Zone): SkyView {
  const element = s('svg', { class: 'sky', viewBox: `${-sideRoomPx} 0 ${sizePx + 2 * sideRoomPx} ${sizePx}`, role: 'img', 'aria-label': spoken(data) });
  element.append(s('circle', { class: 'sky-disc', cx: centrePx, cy: centrePx, r: radiusPx }), maskRing(data.pass.horizonMask), ...skyGrid());
  element.append(...track(data), ...minuteTicks(data, zone), ...endNames(data), ...sunDot(data));
  const cursor = s('circle', { class: 'cursor-dot sky-cursor', r: 5.5 });
  element.append(cursor);
  return {
    element,
    setCursor: (index) => {
      const { x, y } = pointAt(data, index);
      cursor.setAttribute('cx', String(x));
      cursor.setAttribute('cy', String(y));
    },
  };
}

function spoken(data: PassData): string {
  const { pass } = data;
  return `Sky over ${pass.stationName}: rises at azimuth ${fixed(pass.aosAzimuthDeg, 0)} degrees, highest ${fixed(pass.maximumElevationDeg, 0)} degrees, sets at azimuth ${fixed(pass.losAzimuthDeg, 0)} degrees`;
}

function pointAt(data: PassData, index: number): SkyPoint {
  return skyPoint(at(data.timeline.azimuthDeg, index), at(data.timeline.elevationDeg, index));
}

function maskRing(mask: readonly MaskPoint[]): SVGPathElement {
  let inner = '';
  for (let azimuthDeg = 0; azimuthDeg < 360; azimuthDeg += 2) {
    const { x, y } = skyPoint(azimuthDeg, maskElevationDeg(mask, azimuthDeg));
    inner += `${azimuthDeg === 0 ? 'M' : 'L'}${round(x)} ${round(y)}`;
  }
  const rim = `M${centrePx - radiusPx} ${centrePx}a${radiusPx} ${radiusPx} 0 1 0 ${2 * radiusPx} 0a${radiusPx} ${radiusPx} 0 1 0 ${-2 * radiusPx} 0Z`;
  return s('path', { class: 'sky-mask', 'fill-rule': 'evenodd', d: `${rim}${inner}Z` });
}

function skyGrid(): SVGElement[] {
  const ring = (elevationDeg: number) => {
    const radius = radiusPx * (90 - elevationDeg) / 90;
    return [
      s('circle', { class: 'grid', cx: centrePx, cy: centrePx, r: radius }),
      s('text', { x: centrePx + 4, y: centrePx - radius + 13 }, `${elevationDeg}°`),
    ];
  };
  const name = (text: string, x: number, y: number) => s('text', { class: 'ink-text middle', x, y }, text);
  return [
    s('path', { class: 'grid', d: `M${centrePx - radiusPx} ${centrePx}h${2 * radiusPx}M${centrePx} ${centrePx - radiusPx}v${2 * radiusPx}` }),
    ...ring(30), ...ring(60),
    name('N', centrePx, centrePx - radiusPx - 8), name('S', centrePx, centrePx + radiusPx + 18),
    name('E', centrePx + radiusPx + 14, centrePx + 4), name('W', centrePx - radiusPx - 14, centrePx + 4),
  ];
}

/** A tube: ink edges under tints where usable, empty with cross ticks where not. */
function track(data: PassData): SVGElement[] {
  const all = path(data, 0, data.count - 1);
  const elements: SVGElement[] = [
    s('path', { class: 'track-edge', d: all }), s('path', { class: 'track-empty', d: all }), s('path', { class: 'track-ticks', d: all }),
  ];
  for (let from = 0; from < data.count - 1;) {
    const tint = tintAt(data, from);
    let to = from + 1;
    while (to < data.count - 1 && tintAt(data, to) === tint) to++;
    if (tint !== undefined) elements.push(s('path', { class: `track-tint t${tint}`, d: path(data, from, to) }));
    from = to;
  }
  return elements;
}

function tintAt(data: PassData, index: number): number | undefined {
  return at(data.timeline.usable, index) === 1 ? tintOf(Math.max(0, at(data.robustMarginDb, index) - data.requiredMarginDb)) : undefined;
}

function path(data: PassData, from: number, to: number): string {
  let text = '';
  for (let index = from; index <= to; index++) {
    const { x, y } = pointAt(data, index);
    text += `${index === from ? 'M' : 'L'}${round(x)} ${round(y)}`;
  }
  return text;
}

/** Which side of the track looks away from the zenith: 1 when that is to the right of its course on the screen, else -1. */
function outerSide(data: PassData): 1 | -1 {
  const highest = data.timeline.elevationDeg.indexOf(Math.max(...data.timeline.elevationDeg));
  const middle = Math.min(data.count - 2, Math.max(1, highest));
  const here = pointAt(data, middle);
  const before = pointAt(data, middle - 1);
  const after = pointAt(data, middle + 1);
  const outward = -(after.y - before.y) * (here.x - centrePx) + (after.x - before.x) * (here.y - centrePx);
  return outward >= 0 ? 1 : -1;
}

/** Ticks each minute outside the track; each second one named, where the names find room. */
function minuteTicks(data: PassData, zone: Zone): SVGElement[] {
  const elements: SVGElement[] = [];
  const minuteMs = 60_000;
  const side = outerSide(data);
  const everyMin = data.count * data.stepMs > 30 * minuteMs ? 10 : 2;
  for (let timeMs = Math.ceil(data.startMs / minuteMs) * minuteMs; timeMs < timeOf(data, data.count - 1); timeMs += minuteMs) {
    const index = Math.round((timeMs - data.startMs) / data.stepMs);
    if (index < 1 || index >= data.count - 1) continue;
    const here = pointAt(data, index);
    const before = pointAt(data, index - 1);
    const after = pointAt(data, index + 1);
    const length = Math.hypot(after.x - before.x, after.y - before.y) || 1;
    const [normalX, normalY] = [(-side * (after.y - before.y)) / length, (side * (after.x - before.x)) / length];
    const named = (timeMs / minuteMs) % everyMin === 0;
    if (everyMin > 2 && !named) continue;
    elements.push(s('path', { class: 'minute-tick', d: `M${round(here.x + normalX * 6)} ${round(here.y + normalY * 6)}l${round(normalX * 5)} ${round(normalY * 5)}` }));
    const anchor = normalX > 0.3 ? '' : normalX < -0.3 ? 'end' : 'middle';
    const place = { x: here.x + normalX * 15, y: here.y + normalY * 15 + 4 };
    const middle = { x: place.x + (anchor === 'end' ? -minuteNameHalfPx : anchor === '' ? minuteNameHalfPx : 0), y: place.y };
    if (named && isClearOfNames(data, middle)) elements.push(s('text', { class: anchor, ...place }, hourMinute(timeMs, zone)));
  }
  return elements;
}

/** Whether a minute's name keeps clear of the compass letters, the zenith and the names of AOS and LOS. */
function isClearOfNames(data: PassData, place: SkyPoint): boolean {
  const last = data.count - 1;
  const taken = [
    ...[0, 90, 180, 270].map((azimuthDeg) => outside(azimuthDeg, 14)), { x: centrePx, y: centrePx },
    outside(at(data.timeline.azimuthDeg, 0), 8), outside(at(data.timeline.azimuthDeg, last), 8),
  ];
  return taken.every((name) => Math.hypot((name.x - place.x) / 1.6, name.y - place.y) > 20);
}

function outside(azimuthDeg: number, distancePx: number): SkyPoint {
  const rim = skyPoint(azimuthDeg, 0);
  return { x: rim.x + distancePx * Math.sin(azimuthDeg * degree), y: rim.y - distancePx * Math.cos(azimuthDeg * degree) };
}

/** AOS and LOS with their azimuths outside the rim, clear of the letters of the compass. */
function endNames(data: PassData): SVGElement[] {
  const name = (index: number, text: string) => {
    const azimuthDeg = at(data.timeline.azimuthDeg, index);
    const { x, y } = skyPoint(azimuthDeg, 0);
    const [sine, cosine] = [Math.sin(azimuthDeg * degree), Math.cos(azimuthDeg * degree)];
    const isByNorthOrSouth = Math.abs(sine) < 0.22;
    const isByEastOrWest = Math.abs(cosine) < 0.12;
    const side = sine >= 0 ? 1 : -1;
    return s('text', {
      class: side > 0 ? 'ink-text' : 'ink-text end',
      x: isByNorthOrSouth ? centrePx + side * Math.max(16, Math.abs(x - centrePx) + 4) : x + 8 * sine,
      y: y - 8 * cosine + 4 + (isByNorthOrSouth ? -6 * cosine : 0) + (isByEastOrWest ? (cosine > 0 ? -14 : 18) : 0),
    }, text);
  };
  const last = data.count - 1;
  return [
    name(0, `AOS ${fixed(at(data.timeline.azimuthDeg, 0), 0)}°`),
    name(last, `LOS ${fixed(at(data.timeline.azimuthDeg, last), 0)}°`),
  ];
}

function sunDot(data: PassData): SVGElement[] {
  const { sun } = data.pass;
  if (sun.elevationDeg < -0.833) return [];
  const { x, y } = skyPoint(sun.azimuthDeg, sun.elevationDeg);
  return [
    s('circle', { class: 'sun-ring', cx: x, cy: y, r: 5 }), s('circle', { class: 'sun-core', cx: x, cy: y, r: 1.6 }),
    s('text', { class: 'end', x: x - 9, y: y + 4 }, 'Sun'),
  ];
}
