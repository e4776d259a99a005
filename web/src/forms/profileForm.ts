import type { Json, JsonObject, LibraryWaveform } from '../api/profiles';
import { nearestPath } from '../api/problem';
import { h, replace, type Child } from '../dom';
import {
  listAt, objectAt, readNumber, readTable, showNumber, showTable, withMember,
  type Field, type GroupField, type KindField, type ListField, type NumberField, type TableField, type VectorField,
} from './fields';

export interface ProfileForm {
  readonly element: HTMLElement;
  readonly document: () => JsonObject;
  /** Shows each message at its field, or at the nearest part that the form has; returns those that found no place. */
  readonly showErrors: (errorsByPath: ReadonlyMap<string, readonly string[]>) => string[];
}

interface FormContext {
  readonly onEdit: () => void;
  readonly waveforms: () => Promise<readonly LibraryWaveform[]>;
  /** Where the messages of each path are shown. */
  readonly places: Map<string, { readonly message: HTMLElement; readonly control: HTMLElement | undefined }>;
}

/** The member as the form reads and writes it. */
interface Slot {
  readonly path: string;
  readonly get: () => JsonObject;
  readonly set: (document: JsonObject) => void;
}

let nextId = 0;

/** A form over a JSON document; edits replace only the members they name, so nothing else is lost on save. */
export function profileForm(fields: readonly Field[], initial: JsonObject, onEdit: () => void, waveforms: () => Promise<readonly LibraryWaveform[]>): ProfileForm {
  let document = initial;
  const context: FormContext = { onEdit, waveforms, places: new Map() };
  const slot: Slot = { path: '', get: () => document, set: (changed) => { document = changed; onEdit(); } };
  const element = h('div', { class: 'profile-form' }, fields.map((field) => drawField(field, slot, context)));
  return { element, document: () => document, showErrors: (errors) => showErrors(errors, context) };
}

function showErrors(errors: ReadonlyMap<string, readonly string[]>, context: FormContext): string[] {
  for (const place of context.places.values()) {
    place.message.textContent = '';
    place.control?.removeAttribute('aria-invalid');
  }
  const homeless: string[] = [];
  const connected = new Set([...context.places].filter(([, place]) => place.message.isConnected).map(([path]) => path));
  let first: HTMLElement | undefined;
  for (const [path, messages] of errors) {
    const home = nearestPath(path, connected);
    const place = home === undefined ? undefined : context.places.get(home);
    if (place === undefined) {
      homeless.push(...messages);
      continue;
    }
    place.message.textContent = [place.message.textContent, ...messages].filter(Boolean).join(' ');
    place.control?.setAttribute('aria-invalid', 'true');
    first ??= place.control ?? place.message;
  }
  for (let part = first?.closest('details'); part !== null && part !== undefined; part = part.parentElement?.closest('details')) part.open = true;
  first?.focus();
  first?.scrollIntoView({ block: 'center' });
  return homeless;
}

function drawField(field: Field, parent: Slot, context: FormContext): HTMLElement {
  switch (field.type) {
    case 'number': return numberInput(field, parent, context);
    case 'text': return simpleInput(field, parent, context, (value) => value, (typed) => (typed === '' ? undefined : typed));
    case 'choice': return choiceInput(field.key, field.label, field.hint, field.options, parent, context);
    case 'flag': return flagInput(field.key, field.label, parent, context);
    case 'vector': return vectorInput(field, parent, context);
    case 'table': return tableInput(field, parent, context);
    case 'group': return groupPart(field, parent, context);
    case 'kind': return kindPart(field, parent, context);
    case 'list': return listPart(field, parent, context);
  }
}

function pathOf(parent: Slot, key: string): string {
  return parent.path === '' ? key : `${parent.path}/${key}`;
}

function setMember(parent: Slot, key: string, value: Json | undefined): void {
  parent.set(withMember(parent.get(), key, value));
}

function labelled(label: string, hint: string | undefined, path: string, control: HTMLElement, unit: string, context: FormContext): HTMLElement {
  const id = `field-${nextId++}`;
  control.id = id;
  const message = h('p', { class: 'field-error', id: `${id}-error`, role: 'status' });
  context.places.set(path, { message, control });
  const described = [`${id}-error`, ...(hint === undefined ? [] : [`${id}-hint`])].join(' ');
  control.setAttribute('aria-describedby', described);
  return h('div', { class: 'field' },
    h('label', { for: id }, label, unit !== '' && h('span', { class: 'hidden-text' }, `, ${unit}`)),
    h('span', { class: 'field-control' }, control, unit !== '' && h('span', { class: 'field-unit', 'aria-hidden': 'true' }, unit)),
    hint !== undefined && h('p', { class: 'field-hint', id: `${id}-hint` }, hint), message);
}

function simpleInput(
  field: { readonly key: string; readonly label: string; readonly hint?: string; readonly unit?: string }, parent: Slot, context: FormContext,
  show: (value: string) => string, read: (typed: string) => Json | undefined,
): HTMLElement {
  const value = parent.get()[field.key];
  const input = h('input', {
    class: 'field-input', type: 'text', autocomplete: 'off', value: typeof value === 'string' ? show(value) : '',
    onInput: () => { setMember(parent, field.key, read(input.value)); },
  });
  return labelled(field.label, field.hint, pathOf(parent, field.key), input, field.unit ?? '', context);
}

function numberInput(field: NumberField, parent: Slot, context: FormContext): HTMLElement {
  const factor = field.factor ?? 1;
  const input = h('input', {
    class: 'field-input', type: 'text', inputmode: 'decimal', autocomplete: 'off', value: showNumber(parent.get()[field.key], factor),
    onInput: () => { setMember(parent, field.key, readNumber(input.value, factor)); },
  });
  return labelled(field.label, field.hint, pathOf(parent, field.key), input, field.unit, context);
}

function choiceInput(key: string, label: string, hint: string | undefined, options: Readonly<Record<string, string>>, parent: Slot, context: FormContext): HTMLElement {
  const value = parent.get()[key];
  const select = h('select', { class: 'field-input', onChange: () => { setMember(parent, key, select.value === '' ? undefined : select.value); } },
    h('option', { value: '' }, 'not set'),
    Object.entries(options).map(([option, name]) => h('option', { value: option, selected: option === value }, name)));
  return labelled(label, hint, pathOf(parent, key), select, '', context);
}

function flagInput(key: string, label: string, parent: Slot, context: FormContext): HTMLElement {
  const box = h('input', { type: 'checkbox', checked: parent.get()[key] === true, onChange: () => { setMember(parent, key, box.checked ? true : undefined); } });
  const message = h('p', { class: 'field-error', role: 'status' });
  context.places.set(pathOf(parent, key), { message, control: box });
  return h('div', { class: 'field flag-field' }, h('label', {}, box, label), message);
}

function vectorInput(field: VectorField, parent: Slot, context: FormContext): HTMLElement {
  const path = pathOf(parent, field.key);
  const value = parent.get()[field.key];
  const numbers: readonly Json[] = Array.isArray(value) ? value : [];
  const inputs = field.parts.map((part, index) => h('input', {
    class: 'field-input', type: 'text', inputmode: 'decimal', 'aria-label': `${field.label}, ${part}`, value: showNumber(numbers[index], 1), placeholder: part,
    onInput: () => {
      const typed = inputs.map((input) => readNumber(input.value, 1));
      setMember(parent, field.key, typed.every((entry) => entry === undefined) ? undefined : typed.map((entry) => entry ?? 0));
    },
  }));
  const message = h('p', { class: 'field-error', role: 'status' });
  context.places.set(path, { message, control: inputs[0] });
  return h('div', { class: 'field', role: 'group', 'aria-label': field.label }, h('span', { class: 'label' }, field.label), h('span', { class: 'field-control vector' }, inputs),
    field.hint !== undefined && h('p', { class: 'field-hint' }, field.hint), message);
}

function tableInput(field: TableField, parent: Slot, context: FormContext): HTMLElement {
  const current = parent.get();
  const area = h('textarea', {
    class: 'field-input', rows: 6, spellcheck: 'false',
    onInput: () => {
      const table = readTable(area.value);
      const message = context.places.get(pathOf(parent, field.key))?.message;
      if (message !== undefined) message.textContent = table === undefined ? 'Each line takes two numbers.' : '';
      if (table !== undefined) parent.set(withMember(withMember(parent.get(), field.key, table.first), field.otherKey, table.second));
    },
  }, showTable(current[field.key], current[field.otherKey]));
  const element = labelled(field.label, `${field.columns[0]}, then ${field.columns[1]}, a pair on each line`, pathOf(parent, field.key), area, '', context);
  const place = context.places.get(pathOf(parent, field.key));
  if (place !== undefined) context.places.set(pathOf(parent, field.otherKey), place);
  return element;
}

function memberSlot(parent: Slot, key: string): Slot {
  return { path: pathOf(parent, key), get: () => objectAt(parent.get(), key) ?? {}, set: (changed) => { setMember(parent, key, changed); } };
}

/** The heading of a part, and where messages about the part as a whole go. */
function partShell(label: string, hint: string | undefined, path: string, context: FormContext, body: HTMLElement, ...tools: Child[]): HTMLElement {
  const message = h('p', { class: 'field-error', tabindex: '-1', role: 'status' });
  context.places.set(path, { message, control: undefined });
  const isOuter = !path.includes('/');
  return h('div', { class: 'part', role: 'group', 'aria-label': label },
    h('div', { class: 'part-head' }, h(isOuter ? 'h2' : 'h3', {}, label), hint !== undefined && h('span', { class: 'faint small' }, hint), h('span', { class: 'part-tools' }, tools)), message, body);
}

function smallButton(text: string, spoken: string, act: () => void): HTMLButtonElement {
  return h('button', { type: 'button', class: 'button small-button', 'aria-label': spoken, onClick: act }, text);
}

function groupPart(field: GroupField, parent: Slot, context: FormContext): HTMLElement {
  const slot = memberSlot(parent, field.key);
  const body = h('div', { class: 'fields' });
  const { make } = field;
  const toggle = make === undefined ? undefined : smallButton('', field.label, () => {
    setMember(parent, field.key, objectAt(parent.get(), field.key) === undefined ? make() : undefined);
    draw();
  });
  const draw = () => {
    const isPresent = make === undefined || objectAt(parent.get(), field.key) !== undefined;
    replace(body, isPresent && field.fields.map((member) => drawField(member, slot, context)));
    if (toggle !== undefined) {
      toggle.textContent = isPresent ? 'Leave out' : 'Enter';
      toggle.setAttribute('aria-label', `${toggle.textContent} ${field.label}`);
    }
  };
  draw();
  return partShell(field.label, field.hint, slot.path, context, body, toggle);
}

function kindPart(field: KindField, parent: Slot, context: FormContext): HTMLElement {
  const slot = field.ofOwner === true ? parent : memberSlot(parent, field.key);
  const body = h('div', { class: 'fields' });
  const select = h('select', { class: 'button small-button', 'aria-label': `Kind of ${field.label.toLowerCase()}` },
    field.optional && h('option', { value: '' }, 'left out'), Object.entries(field.kinds).map(([kind, { label }]) => h('option', { value: kind }, label)));
  const draw = () => {
    const kind = slot.get()['kind'];
    const known = typeof kind === 'string' ? field.kinds[kind] : undefined;
    if (typeof kind === 'string' && known === undefined) select.append(h('option', { value: kind }, kind));
    select.value = typeof kind === 'string' ? kind : '';
    replace(body, known?.fields.map((member) => drawField(member, slot, context)));
  };
  select.addEventListener('change', () => {
    const chosen = field.kinds[select.value];
    if (field.ofOwner !== true) setMember(parent, field.key, chosen?.make());
    else if (chosen !== undefined) slot.set(chosen.make());
    draw();
  });
  draw();
  const element = partShell(field.label, field.hint, slot.path, context, body, select);
  context.places.set(`${slot.path}/kind`, { message: element.querySelector<HTMLElement>('.field-error') ?? element, control: select });
  return element;
}

function listPart(field: ListField, parent: Slot, context: FormContext): HTMLElement {
  const path = pathOf(parent, field.key);
  const body = h('div', { class: field.inline === true ? 'rows inline-rows' : 'rows' });
  const write = (items: readonly JsonObject[]) => {
    setMember(parent, field.key, items);
    draw();
  };
  const row = (index: number): HTMLElement => {
    const slot: Slot = {
      path: `${path}/${index}`, get: () => listAt(parent.get(), field.key)[index] ?? {},
      set: (changed) => { setMember(parent, field.key, listAt(parent.get(), field.key).map((item, at) => (at === index ? changed : item))); },
    };
    const remove = smallButton('Remove', `Remove ${field.one} ${index + 1}`, () => { write(listAt(parent.get(), field.key).filter((_, at) => at !== index)); });
    const fields = h('div', { class: 'fields' }, field.fields.map((member) => drawField(member, slot, context)));
    if (field.inline === true) return h('div', { class: 'row' }, fields, remove);
    return h('details', { class: 'row', open: true }, h('summary', {}, rowTitle(slot.get(), field.one, index)), fields, h('div', { class: 'row-foot' }, remove));
  };
  const draw = () => {
    const items = listAt(parent.get(), field.key);
    replace(body, items.length === 0 && h('p', { class: 'faint small' }, `No ${field.one} yet.`), items.map((_, index) => row(index)));
  };
  draw();
  const add = smallButton(`Add ${field.one}`, `Add ${field.one}`, () => { write([...listAt(parent.get(), field.key), field.make()]); });
  const picker = field.picksWaveforms === true ? waveformPicker(context, (waveform) => {
    write([...listAt(parent.get(), field.key), fromLibrary(waveform)]);
  }) : undefined;
  return partShell(field.label, field.hint, path, context, body, picker, add);
}

function rowTitle(item: JsonObject, one: string, index: number): string {
  const name = item['name'] ?? item['id'];
  return typeof name === 'string' && name !== '' ? name : `${one} ${index + 1}`;
}

function fromLibrary(waveform: LibraryWaveform): JsonObject {
  return {
    name: waveform.name, bitRateBps: 1e6, requiredEbN0Db: waveform.requiredEbN0Db, implementationLossDb: 1.5,
    frameEfficiency: waveform.frameEfficiency, source: waveform.source,
  };
}

/** Adds a row with published figures; the bit rate remains the operator's to enter. */
function waveformPicker(context: FormContext, onPick: (waveform: LibraryWaveform) => void): HTMLElement {
  const select = h('select', { class: 'button small-button', 'aria-label': 'Add a waveform from the library' }, h('option', { value: '' }, 'From the library…'));
  let library: readonly LibraryWaveform[] = [];
  const fill = async () => {
    if (library.length > 0) return;
    library = await context.waveforms();
    select.append(...library.map((waveform) => h('option', { value: waveform.id }, `${waveform.name}, ${showNumber(waveform.requiredEbN0Db, 1)} dB`)));
  };
  select.addEventListener('focus', () => { void fill(); });
  select.addEventListener('pointerdown', () => { void fill(); });
  select.addEventListener('change', () => {
    const chosen = library.find((waveform) => waveform.id === select.value);
    select.value = '';
    if (chosen !== undefined) onPick(chosen);
  });
  return select;
}

