import { fixed, significant, type Quantity } from './number';

const byteSteps = [
  { from: 999.5e12, size: 1e15, unit: 'PB' },
  { from: 999.5e9, size: 1e12, unit: 'TB' },
  { from: 999.5e6, size: 1e9, unit: 'GB' },
  { from: 999.5e3, size: 1e6, unit: 'MB' },
  { from: 999.5, size: 1e3, unit: 'kB' },
] as const;

/** Bytes in powers of a thousand; from a megabyte to a gigabyte without decimals, as tables want them. */
export function bytes(value: number): Quantity {
  for (const step of byteSteps) {
    if (value < step.from) continue;
    const scaled = value / step.size;
    const wholeIsEnough = step.unit === 'MB' || step.unit === 'kB';
    return { number: wholeIsEnough && scaled >= 10 ? fixed(scaled, 0) : significant(scaled), unit: step.unit };
  }
  return { number: fixed(value, 0), unit: 'B' };
}

const rateSteps = [
  { from: 999.5e6, size: 1e9, unit: 'Gbit/s' },
  { from: 999.5e3, size: 1e6, unit: 'Mbit/s' },
  { from: 999.5, size: 1e3, unit: 'kbit/s' },
] as const;

/** A bit rate with three significant digits, trailing zeros dropped. */
export function bitRate(bitRateBps: number): Quantity {
  for (const step of rateSteps) {
    if (bitRateBps >= step.from) return { number: trimmed(significant(bitRateBps / step.size)), unit: step.unit };
  }
  return { number: trimmed(significant(bitRateBps)), unit: 'bit/s' };
}

function trimmed(text: string): string {
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

export function kilometres(rangeKm: number): Quantity {
  return { number: fixed(rangeKm, 0), unit: 'km' };
}

/** A frequency shift in the unit that keeps it readable; it flips to kHz from 1000 Hz on. */
export function shift(shiftHz: number): Quantity {
  return Math.abs(shiftHz) >= 999.5
    ? { number: fixed(shiftHz / 1e3, 1), unit: 'kHz' }
    : { number: fixed(shiftHz, 0), unit: 'Hz' };
}

/** A carrier in MHz to the kilohertz, ungrouped as receivers show it. */
export function carrier(frequencyHz: number): Quantity {
  return { number: (frequencyHz / 1e6).toFixed(3), unit: 'MHz' };
}
