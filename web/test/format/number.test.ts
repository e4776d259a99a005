import { describe, expect, it } from 'vitest';
import { bitRate, bytes, shift } from '../../src/format/amount';
import { degrees, fixed, plain, short, signed, significant } from '../../src/format/number';

const minus = '\u2212';

describe('numbers', () => {
  it('carry a true minus sign, and none when they round to nothing', () => {
    expect(fixed(-174.049, 2)).toBe(`${minus}174.05`);
    expect(fixed(-0.004, 2)).toBe('0.00');
    expect(signed(0.004, 2)).toBe('0.00');
    expect(signed(2.6, 2)).toBe('+2.60');
  });

  it('part thousands by commas only in front of the point', () => {
    expect(fixed(1467.4, 0)).toBe('1,467');
    expect(fixed(1234567.25, 2)).toBe('1,234,567.25');
  });

  it('show three significant digits without jumping at a power of ten', () => {
    expect(significant(1.536)).toBe('1.54');
    expect(significant(9.996)).toBe('10.0');
    expect(significant(99.96)).toBe('100');
  });

  it('stand apart from their unit, but for degrees', () => {
    expect(plain({ number: '3.1', unit: 'dB' })).toBe('3.1\u00a0dB');
    expect(plain(degrees(29.4))).toBe('29°');
  });

  it('show ticks as short as they are', () => {
    expect(short(-0.025)).toBe(`${minus}0.025`);
    expect(short(0.1 + 0.2)).toBe('0.3');
  });
});

describe('amounts', () => {
  it('count bytes by thousands', () => {
    expect(plain(bytes(1.536e9))).toBe('1.54\u00a0GB');
    expect(plain(bytes(763.4e6))).toBe('763\u00a0MB');
    expect(plain(bytes(396e3))).toBe('396\u00a0kB');
    expect(plain(bytes(512))).toBe('512\u00a0B');
  });

  it('step up the unit rather than write a thousand of the lower one', () => {
    expect(plain(bytes(999.6e6))).toBe('1.00\u00a0GB');
    expect(plain(bytes(999.4e6))).toBe('999\u00a0MB');
  });

  it('drop the trailing zeros of a bit rate', () => {
    expect(plain(bitRate(37.5e6))).toBe('37.5\u00a0Mbit/s');
    expect(plain(bitRate(25e6))).toBe('25\u00a0Mbit/s');
    expect(plain(bitRate(18.75e6))).toBe('18.8\u00a0Mbit/s');
    expect(plain(bitRate(9600))).toBe('9.6\u00a0kbit/s');
    expect(plain(bitRate(100e6))).toBe('100\u00a0Mbit/s');
  });

  it('show a Doppler shift in the unit that keeps it short', () => {
    expect(plain(shift(-186_812))).toBe(`${minus}186.8\u00a0kHz`);
    expect(plain(shift(-12.4))).toBe(`${minus}12\u00a0Hz`);
  });
});
