import { s } from '../dom';
import { kilometres, shift } from '../format/amount';
import { fixed } from '../format/number';
import { clockTime, hourMinute, type Zone } from '../format/time';
import type { ChartFrame, StackedChart } from './chartFrame';
import { lineChart } from './lineChart';
import { lossStack } from './lossStack';
import { marginChart } from './marginChart';
import { at, timeOf, type PassData } from './passData';
import { rateStaircase } from './rateStaircase';
import { timeScale, timeTicks } from './timeScale';

export interface StackInput {
  readonly data: PassData;
  readonly widthPx: number;
  readonly isPhone: boolean;
  readonly zone: Zone;
  readonly zoneOffsetMs: number;
  readonly onCursor: (index: number) => void;
}

export interface PassStack {
  readonly element: SVGSVGElement;
  readonly setCursor: (index: number) => void;
}

const headPx = 30;
const flagHalfPx = 32;
const tickNameHalfPx = 18;

/** All charts of a pass on one time axis under one cursor, moved by pointer, touch or arrow keys. */
export function passStack(input: StackInput): PassStack {
  const { data, widthPx, isPhone } = input;
  const scale = timeScale(data.startMs, timeOf(data, Math.max(1, data.count)), isPhone ? 34 : 132, isPhone ? widthPx - 4 : widthPx - 150);
  const element = s('svg', { class: 'pass-stack', width: widthPx });
  const grid = s('g', {});
  element.append(grid);
  const charts: StackedChart[] = [];
  let top = headPx;
  const add = (heightPx: number, afterPx: number, draw: (frame: ChartFrame) => StackedChart) => {
    const chart = draw({ scale, top, height: heightPx, gutterPx: isPhone ? undefined : 0 });
    element.append(chart.element);
    charts.push(chart);
    top += heightPx + afterPx;
  };
  add(isPhone ? 190 : 240, 22, (frame) => marginChart(data, frame));
  add(isPhone ? 20 : 34, isPhone ? 4 : 42, (frame) => rateStaircase(data, frame));
  if (!isPhone) addLines(data, add);
  const bottom = isPhone ? top - 8 : top - 28;
  const tickNames = timeTicks(scale, 84, input.zoneOffsetMs).map((tickMs) => {
    const x = Math.round(scale.x(tickMs)) + 0.5;
    const name = s('text', { class: 'middle', x, y: 15 }, hourMinute(tickMs, input.zone));
    grid.append(s('path', { class: 'grid', d: `M${x} ${headPx - 4}V${bottom}` }), name);
    return { x, name };
  });
  element.setAttribute('height', String(top));
  element.setAttribute('viewBox', `0 0 ${widthPx} ${top}`);

  const time = s('text', { class: 'flag-text', x: 0, y: 15 });
  const flag = s('g', {}, s('rect', { class: 'flag', x: -flagHalfPx, y: 0, width: flagHalfPx * 2, height: 21, rx: 3 }), time);
  const line = s('path', { class: 'now-line', d: `M0 20V${bottom}` });
  element.append(line, flag);
  let cursorIndex = 0;
  const setCursor = (index: number) => {
    cursorIndex = index;
    const x = scale.x(timeOf(data, index));
    line.setAttribute('transform', `translate(${x} 0)`);
    const flagX = Math.min(widthPx - flagHalfPx, Math.max(flagHalfPx, x));
    flag.setAttribute('transform', `translate(${flagX} 0)`);
    for (const tick of tickNames) tick.name.setAttribute('visibility', Math.abs(tick.x - flagX) < flagHalfPx + tickNameHalfPx ? 'hidden' : 'visible');
    time.textContent = clockTime(timeOf(data, index), input.zone);
    for (const chart of charts) chart.setCursor(index);
    element.setAttribute('aria-valuenow', String(index));
    element.setAttribute('aria-valuetext', `${time.textContent}, margin ${fixed(at(data.robustMarginDb, index), 1)} dB, elevation ${fixed(at(data.timeline.elevationDeg, index), 0)} degrees`);
  };
  makeSlider(element, data, (index) => {
    if (index !== cursorIndex) input.onCursor(index);
  }, () => cursorIndex, (clientX) => {
    const bounds = element.getBoundingClientRect();
    return Math.round((scale.timeAt((clientX - bounds.left) * (widthPx / bounds.width)) - data.startMs) / data.stepMs);
  });
  return { element, setCursor };
}

function addLines(data: PassData, add: (heightPx: number, afterPx: number, draw: (frame: ChartFrame) => StackedChart) => void): void {
  const { timeline } = data;
  add(64, 32, (frame) => lineChart(data, frame, {
    name: 'Elevation', column: timeline.elevationDeg, axisFactor: 1, ticks: [0, 45, 90],
    show: (index) => ({ quantity: { number: fixed(at(timeline.elevationDeg, index), 1), unit: 'degrees' } }),
  }));
  add(64, 32, (frame) => lineChart(data, frame, {
    name: 'Range', column: timeline.slantRangeKm, axisFactor: 1,
    show: (index) => ({ quantity: kilometres(at(timeline.slantRangeKm, index)) }),
  }));
  const dopplerInKilohertz = Math.max(...timeline.dopplerHz.map(Math.abs)) >= 1000;
  add(64, 36, (frame) => lineChart(data, frame, {
    name: 'Doppler', column: timeline.dopplerHz, axisFactor: dopplerInKilohertz ? 1e-3 : 1,
    show: (index) => ({
      quantity: dopplerInKilohertz
        ? { number: fixed(at(timeline.dopplerHz, index) / 1e3, 1), unit: 'kHz' }
        : { number: fixed(at(timeline.dopplerHz, index), 0), unit: 'Hz' },
      note: rateWords(at(timeline.dopplerRateHzPerS, index)),
    }),
  }));
  add(56, 34, (frame) => lineChart(data, frame, {
    name: 'Pointing error', column: timeline.pointingErrorDeg, axisFactor: 1, lowest: 0,
    show: (index) => ({ quantity: { number: fixed(at(timeline.pointingErrorDeg, index), 2), unit: 'degrees' } }),
  }));
  add(92, 28, (frame) => lossStack(data, frame));
}

function rateWords(rateHzPerS: number): string {
  const rate = shift(rateHzPerS);
  return `${rate.number} ${rate.unit}/s`;
}

function makeSlider(element: SVGSVGElement, data: PassData, move: (index: number) => void, cursor: () => number, indexAt: (clientX: number) => number): void {
  const last = data.count - 1;
  const moveTo = (index: number) => { move(Math.min(last, Math.max(0, index))); };
  for (const [name, value] of Object.entries({
    role: 'slider', tabindex: '0', 'data-key': 'pass-cursor', 'aria-label': 'Second of the pass', 'aria-valuemin': '0', 'aria-valuemax': String(last),
  })) element.setAttribute(name, value);
  element.addEventListener('keydown', (event) => {
    const fast = event.shiftKey ? 10 : 1;
    const targets: Record<string, number> = {
      ArrowLeft: cursor() - fast, ArrowDown: cursor() - fast, ArrowRight: cursor() + fast, ArrowUp: cursor() + fast,
      PageDown: cursor() - 30, PageUp: cursor() + 30, Home: 0, End: last,
    };
    const target = targets[event.key];
    if (target === undefined) return;
    moveTo(target);
    event.preventDefault();
  });
  const follow = (event: PointerEvent) => { moveTo(indexAt(event.clientX)); };
  element.addEventListener('pointermove', (event) => {
    if (event.pointerType === 'mouse' || element.hasPointerCapture(event.pointerId)) follow(event);
  });
  element.addEventListener('pointerdown', (event) => {
    element.setPointerCapture(event.pointerId);
    follow(event);
  });
}
