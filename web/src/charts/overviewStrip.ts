import type { Pass } from '../api/passes';
import { s } from '../dom';
import { dayAndTime, dayMonth, hourMinute, type Zone } from '../format/time';
import { block } from './hillRibbon';
import { lightBands } from './sunlight';
import { fitted } from './textWidth';
import { timeScale, timeTicks } from './timeScale';

export interface OverviewRow {
  readonly name: string;
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
  readonly passes: readonly Pass[];
}

export interface OverviewInput {
  readonly rows: readonly OverviewRow[];
  readonly fromMs: number;
  readonly toMs: number;
  readonly frameMs: number;
  readonly frameFromMs: number;
  readonly widthPx: number;
  readonly zone: Zone;
  readonly zoneOffsetMs: number;
  /** Called with the frame's new beginning while it is dragged or moved by keys; undefined: follow the clock again. */
  readonly onFrame: (fromMs: number | undefined) => void;
}

const gutterPx = 176;
const quarterHourMs = 15 * 60_000;

/** The whole searched period in a strip, with the frame that the lanes below enlarge. */
export function overviewStrip(input: OverviewInput): SVGSVGElement {
  const rowPx = Math.max(3, Math.min(12, Math.floor(240 / Math.max(1, input.rows.length))));
  const height = Math.max(24, rowPx * input.rows.length) + 8;
  const scale = timeScale(input.fromMs, input.toMs, gutterPx, input.widthPx);
  const element = s('svg', { class: 'overview', width: input.widthPx, height: height + 20, viewBox: `0 0 ${input.widthPx} ${height + 20}` });
  for (const [index, row] of input.rows.entries()) {
    const y = 4 + index * rowPx;
    if (rowPx >= 10) element.append(s('text', { x: 0, y: y + 10 }, fitted(row.name, gutterPx - 12, 12, 400)));
    for (const band of lightBands(input.fromMs, input.toMs, row.latitudeDeg, row.longitudeDeg, 10 * 60_000)) {
      element.append(s('rect', { class: `band-${band.light}`, x: scale.x(band.fromMs), y, width: scale.x(band.toMs) - scale.x(band.fromMs), height: rowPx }));
    }
    const marks = s('g', { class: 'overview-row', transform: `translate(0 ${y + rowPx - 1})` });
    for (const pass of row.passes) {
      marks.append(block(pass, Math.max(scale.left, scale.x(Date.parse(pass.aosUtc))), Math.min(scale.right, scale.x(Date.parse(pass.losUtc))), (rowPx - 2) / 4));
    }
    element.append(marks);
  }
  for (const tickMs of timeTicks(scale, 110, input.zoneOffsetMs)) {
    const isMidnight = (tickMs + input.zoneOffsetMs) % 86_400_000 === 0;
    const label = isMidnight ? dayMonth(tickMs, input.zone) : hourMinute(tickMs, input.zone);
    const x = scale.x(tickMs);
    element.append(s('path', { class: 'grid', d: `M${x} ${height}v4` }));
    if (x + 40 < input.widthPx) element.append(s('text', { x, y: height + 17 }, label));
  }
  element.append(frame(element, input, scale, height));
  return element;
}

type Scale = ReturnType<typeof timeScale>;

function frame(strip: SVGSVGElement, input: OverviewInput, scale: Scale, height: number): SVGGElement {
  const lowest = input.fromMs;
  const highest = Math.max(lowest, input.toMs - input.frameMs);
  const left = scale.x(input.frameFromMs);
  const width = scale.x(input.frameFromMs + input.frameMs) - left;
  const rect = s('rect', { class: 'frame', x: left + 1, y: 1, width: Math.max(4, width - 2), height: height - 2, rx: 3 });
  const group = s('g', {
    class: 'frame-group', role: 'slider', tabindex: '0', 'data-key': 'overview-frame', 'aria-label': 'Beginning of the period shown',
    'aria-valuemin': 0, 'aria-valuemax': Math.round((highest - lowest) / 60_000), 'aria-valuenow': Math.round((input.frameFromMs - lowest) / 60_000),
    'aria-valuetext': `${dayAndTime(input.frameFromMs, input.zone)} to ${dayAndTime(input.frameFromMs + input.frameMs, input.zone)}`,
  }, rect);
  const move = (fromMs: number) => {
    input.onFrame(Math.min(highest, Math.max(lowest, Math.round(fromMs / quarterHourMs) * quarterHourMs)));
  };
  group.addEventListener('keydown', (event) => {
    const steps: Record<string, number> = {
      ArrowLeft: -quarterHourMs, ArrowDown: -quarterHourMs, ArrowRight: quarterHourMs, ArrowUp: quarterHourMs,
      PageUp: input.frameMs, PageDown: -input.frameMs,
    };
    const step = steps[event.key];
    if (step !== undefined) move(input.frameFromMs + step);
    else if (event.key === 'Home') input.onFrame(undefined);
    else if (event.key === 'End') move(highest);
    else return;
    event.preventDefault();
  });
  strip.addEventListener('pointerdown', (event) => {
    startDrag(strip, event, scale, input, rect, move);
  });
  return group;
}

/** Drags the frame by where it was taken; a press beside it brings its middle there. */
function startDrag(strip: SVGSVGElement, event: PointerEvent, scale: Scale, input: OverviewInput, rect: SVGRectElement, move: (fromMs: number) => void): void {
  const timeAt = (pointer: PointerEvent) => scale.timeAt(pointer.clientX - strip.getBoundingClientRect().left);
  const pressedMs = timeAt(event);
  if (pressedMs < input.fromMs || event.button !== 0) return;
  event.preventDefault();
  const isInside = pressedMs >= input.frameFromMs && pressedMs < input.frameFromMs + input.frameMs;
  const heldMs = isInside ? pressedMs - input.frameFromMs : input.frameMs / 2;
  let targetMs = isInside ? input.frameFromMs : pressedMs - heldMs;
  const place = () => {
    const leftMs = Math.min(Math.max(input.fromMs, targetMs), Math.max(input.fromMs, input.toMs - input.frameMs));
    rect.setAttribute('x', String(scale.x(leftMs) + 1));
  };
  const follow = (pointer: PointerEvent) => {
    targetMs = timeAt(pointer) - heldMs;
    place();
  };
  place();
  strip.setPointerCapture(event.pointerId);
  strip.addEventListener('pointermove', follow);
  const stop = () => {
    strip.removeEventListener('pointermove', follow);
    move(targetMs);
  };
  strip.addEventListener('pointerup', stop, { once: true });
  strip.addEventListener('pointercancel', stop, { once: true });
}
