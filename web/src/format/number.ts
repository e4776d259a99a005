/** A number made ready to show, apart from its unit so that the unit can be set in a lighter ink. */
export interface Quantity {
  readonly number: string;
  readonly unit: string;
}

const minusSign = '\u2212';
/**
 * Between number and unit. The typeface's thin space is 0.11 em, which reads as none at 12 px; its no-break space
 * is a quarter em, and a number never ends a line without its unit.
 */
const unitSpace = '\u00a0';

/** Fixed decimals, a true minus sign, thousands parted by commas; what rounds to nothing carries no sign. */
export function fixed(value: number, decimals: number): string {
  const digits = Math.abs(value).toFixed(decimals);
  const [whole = '0', fraction] = digits.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',');
  const text = fraction === undefined ? grouped : `${grouped}.${fraction}`;
  return value < 0 && Number(digits) !== 0 ? minusSign + text : text;
}

/** As {@link fixed}, with a plus sign before what is above zero. */
export function signed(value: number, decimals: number): string {
  const text = fixed(value, decimals);
  return value > 0 && Number(value.toFixed(decimals)) !== 0 ? `+${text}` : text;
}

/** Three significant digits and at most `decimals` of them behind the point. */
export function significant(value: number, decimals = 2): string {
  const magnitude = Math.abs(value);
  const wholeDigits = magnitude < 9.995 ? 1 : magnitude < 99.95 ? 2 : 3;
  return fixed(value, Math.min(decimals, 3 - wholeDigits));
}

/** A tick or an entered value: as short as the number allows. */
export function short(value: number): string {
  return String(Number(value.toPrecision(12))).replace('-', minusSign);
}

/** Number and unit with a space between; degrees and per cent of an angle stand close. */
export function plain(quantity: Quantity): string {
  if (quantity.unit === '') return quantity.number;
  return quantity.unit.startsWith('°') ? quantity.number + quantity.unit : quantity.number + unitSpace + quantity.unit;
}

export function db(value: number, decimals = 1): Quantity {
  return { number: fixed(value, decimals), unit: 'dB' };
}

export function degrees(value: number, decimals = 0): Quantity {
  return { number: fixed(value, decimals), unit: '°' };
}
