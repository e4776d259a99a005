import type { Spacecraft, Station } from '../../api/profiles';
import { h } from '../../dom';
import { periodsH, type PeriodH, type Selection } from './selection';

export interface ControlInput {
  readonly selection: Selection;
  readonly stations: readonly Station[];
  readonly spacecraft: readonly Spacecraft[];
  readonly isPhone: boolean;
  readonly onChange: (selection: Selection) => void;
}

/** The choice of station. A phone shows one station at a time, so there it offers no "all". */
export function stationControl(input: ControlInput): HTMLElement {
  const { selection, onChange } = input;
  return picker('Station', input.isPhone ? undefined : 'All stations', input.stations, selection.station, (value) => {
    onChange({ ...selection, station: value });
  });
}

/** The other filters over the passes; a phone's list has no period to choose. */
export function passControls(input: ControlInput): HTMLElement[] {
  const { selection, onChange } = input;
  const spacecraft = picker('Spacecraft', 'All spacecraft', input.spacecraft, selection.spacecraft, (value) => {
    onChange({ ...selection, spacecraft: value });
  });
  const direction = picker('Direction', 'Both directions', [{ id: 'downlink', name: 'Downlinks' }, { id: 'uplink', name: 'Uplinks' }], selection.direction, (value) => {
    onChange({ ...selection, direction: value === 'downlink' || value === 'uplink' ? value : undefined });
  });
  const period = switchOf('Period', 'period', periodsH.map((hours) => ({ value: String(hours), name: periodName(hours) })), String(selection.periodH), (value) => {
    onChange({ ...selection, periodH: periodsH.find((hours) => String(hours) === value) ?? 4 });
  });
  const closing = switchOf('Which passes', 'closing', [{ value: 'false', name: 'All' }, { value: 'true', name: 'Closing only' }], String(selection.closingOnly), (value) => {
    onChange({ ...selection, closingOnly: value === 'true' });
  });
  return input.isPhone ? [spacecraft, direction, closing] : [spacecraft, direction, period, closing];
}

export function filterGroup(...controls: Node[]): HTMLElement {
  return h('div', { class: 'controls', role: 'group', 'aria-label': 'Filters' }, controls);
}

function periodName(hours: PeriodH): string {
  return hours === 168 ? '7\u00a0d' : `${hours}\u00a0h`;
}

function picker(label: string, all: string | undefined, options: readonly { readonly id: string; readonly name: string }[], value: string | undefined, onPick: (value: string | undefined) => void): HTMLElement {
  const select = h('select', {
    class: 'button', 'aria-label': label, 'data-key': `filter ${label}`,
    onChange: () => { onPick(select.value === '' ? undefined : select.value); },
  },
    all !== undefined && h('option', { value: '' }, all),
    options.map((option) => h('option', { value: option.id, selected: option.id === value }, option.name)));
  return select;
}

function switchOf(label: string, name: string, options: readonly { readonly value: string; readonly name: string }[], value: string, onPick: (value: string) => void): HTMLElement {
  return h('fieldset', { class: 'switch bare', 'aria-label': label },
    options.map((option) => h('label', {},
      h('input', {
        type: 'radio', name, value: option.value, checked: option.value === value, 'data-key': `${name} ${option.value}`,
        onChange: () => { onPick(option.value); },
      }),
      h('span', {}, option.name))));
}

/** What the fills mean; colour never speaks alone. */
export function legend(): HTMLElement {
  const swatch = (name: string, text: string) => h('li', {}, h('i', { class: `swatch ${name}` }), text);
  return h('ul', { class: 'legend', 'aria-label': 'Margin above required' },
    swatch('s1', '0–3'), swatch('s2', '3–6'), swatch('s3', '6–9'), swatch('s4', '9\u00a0dB and more above required'), swatch('hatch', 'below required, or not yet acquired'));
}
