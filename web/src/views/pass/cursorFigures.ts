import { at, type PassData } from '../../charts/passData';
import { h, replace } from '../../dom';
import { bitRate, carrier, kilometres } from '../../format/amount';
import { db, degrees, type Quantity } from '../../format/number';
import { shown } from '../states';

export interface CursorFigures {
  readonly element: HTMLElement;
  readonly setCursor: (index: number) => void;
}

/** What a phone beside the antenna shows of the second at the cursor. */
export function cursorFigures(data: PassData): CursorFigures {
  const { timeline, pass } = data;
  const isUplink = pass.link.direction === 'uplink';
  const figures: readonly (readonly [string, (index: number) => Quantity])[] = [
    ['Margin', (index) => db(at(data.robustMarginDb, index))],
    ['Azimuth', (index) => degrees(at(timeline.azimuthDeg, index), 1)],
    ['Elevation', (index) => degrees(at(timeline.elevationDeg, index), 1)],
    ['Rate', (index) => bitRate(at(timeline.bitRateBps, index))],
    ['Range', (index) => kilometres(at(timeline.slantRangeKm, index))],
    isUplink
      ? ['Transmit at', (index) => carrier(pass.frequencyHz - at(timeline.dopplerHz, index))]
      : ['Receive at', (index) => carrier(pass.frequencyHz + at(timeline.dopplerHz, index))],
  ];
  const cells = figures.map(([name, read]) => ({ read, value: h('dd', {}), name }));
  const element = h('dl', { class: 'facts cursor-figures' }, cells.map((cell) => h('div', {}, h('dt', {}, cell.name), cell.value)));
  return {
    element,
    setCursor: (index) => {
      for (const cell of cells) replace(cell.value, h('strong', {}, shown(cell.read(index))));
    },
  };
}
