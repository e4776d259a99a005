import type { Json, JsonObject } from '../api/profiles';

/** What one member of a profile looks like in a form. Members that no field names are kept as they are. */
export type Field = NumberField | TextField | ChoiceField | FlagField | GroupField | ListField | KindField | VectorField | TableField;

interface Named {
  readonly key: string;
  readonly label: string;
  /** What holds when it is left out. */
  readonly hint?: string;
}

export interface NumberField extends Named {
  readonly type: 'number';
  readonly unit: string;
  /** The document's value for one unit of the form: 1e6 lets a person enter MHz for a member in Hz. */
  readonly factor?: number;
}

export interface TextField extends Named {
  readonly type: 'text';
}

export interface ChoiceField extends Named {
  readonly type: 'choice';
  readonly options: Readonly<Record<string, string>>;
}

export interface FlagField extends Named {
  readonly type: 'flag';
}

export interface GroupField extends Named {
  readonly type: 'group';
  readonly fields: readonly Field[];
  /** Given for a group that may be left out. */
  readonly make?: () => JsonObject;
}

/** Members that depend on the `kind` member. */
export interface KindField extends Named {
  readonly type: 'kind';
  readonly kinds: Readonly<Record<string, { readonly label: string; readonly fields: readonly Field[]; readonly make: () => JsonObject }>>;
  readonly optional: boolean;
  /** The kind is that of the object in which the field stands, not of a member of its own. */
  readonly ofOwner?: true;
}

export interface ListField extends Named {
  readonly type: 'list';
  readonly one: string;
  readonly fields: readonly Field[];
  readonly make: () => JsonObject;
  /** Rows are short enough to stand on one line each. */
  readonly inline?: boolean;
  /** Rows can be taken from the library of waveforms. */
  readonly picksWaveforms?: boolean;
}

/** A fixed count of numbers in one array. */
export interface VectorField extends Named {
  readonly type: 'vector';
  readonly parts: readonly string[];
}

/** Two arrays of one length, entered as lines of two numbers. */
export interface TableField extends Named {
  readonly type: 'table';
  readonly otherKey: string;
  readonly columns: readonly [string, string];
}

export const number = (key: string, label: string, unit: string, more: { hint?: string; factor?: number } = {}): NumberField => ({ type: 'number', key, label, unit, ...more });
export const text = (key: string, label: string, hint?: string): TextField => (hint === undefined ? { type: 'text', key, label } : { type: 'text', key, label, hint });

/** Sets or removes a member without touching the others or the document it came from. */
export function withMember(document: JsonObject, key: string, value: Json | undefined): JsonObject {
  const { [key]: _old, ...rest } = document;
  if (value === undefined) return rest;
  return key in document ? Object.fromEntries(Object.entries(document).map(([name, old]) => [name, name === key ? value : old])) : { ...rest, [key]: value };
}

export function objectAt(document: JsonObject, key: string): JsonObject | undefined {
  const value = document[key];
  return isObject(value) ? value : undefined;
}

export function listAt(document: JsonObject, key: string): readonly JsonObject[] {
  const value = document[key];
  return Array.isArray(value) ? value.filter(isObject) : [];
}

export function isObject(value: Json | undefined): value is JsonObject {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** What a person typed as a number: blank is left out, and what is no number stays as text for the service to refuse. */
export function readNumber(typed: string, factor: number): Json | undefined {
  const clean = typed.trim().replaceAll('\u2212', '-').replace(/[\s\u00a0_]/g, '');
  if (clean === '') return undefined;
  const value = Number(clean);
  return Number.isFinite(value) ? Number((value * factor).toPrecision(15)) : typed.trim();
}

/** A document's value as the form shows it, in the field's unit. */
export function showNumber(value: Json | undefined, factor: number): string {
  if (typeof value === 'number') return String(Number((value / factor).toPrecision(15)));
  return typeof value === 'string' ? value : '';
}

/** Lines of "angle gain" as two arrays; undefined when a line has no two numbers. */
export function readTable(typed: string): { readonly first: number[]; readonly second: number[] } | undefined {
  const first: number[] = [];
  const second: number[] = [];
  for (const line of typed.split('\n')) {
    if (line.trim() === '') continue;
    const numbers = line.trim().replaceAll('\u2212', '-').split(/[\s,;]+/).map(Number);
    const [left, right] = numbers;
    if (numbers.length !== 2 || left === undefined || right === undefined || !Number.isFinite(left) || !Number.isFinite(right)) return undefined;
    first.push(left);
    second.push(right);
  }
  return { first, second };
}

export function showTable(first: Json | undefined, second: Json | undefined): string {
  if (!Array.isArray(first) || !Array.isArray(second)) return '';
  return first.map((value, index) => `${String(value)}, ${String(second[index] ?? '')}`).join('\n');
}
