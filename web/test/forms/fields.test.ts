import { describe, expect, it } from 'vitest';
import { readNumber, readTable, showNumber, showTable, withMember } from '../../src/forms/fields';

describe('editing a document', () => {
  it('keeps members that no form knows, and their order', () => {
    const document = { name: 'A', invented: { deep: [1, 2] }, heightM: 5 };
    expect(JSON.stringify(withMember(document, 'name', 'B'))).toBe('{"name":"B","invented":{"deep":[1,2]},"heightM":5}');
    expect(withMember(document, 'heightM', undefined)).toEqual({ name: 'A', invented: { deep: [1, 2] } });
    expect(document.name).toBe('A');
  });
});

describe('entered numbers', () => {
  it('are read in the unit of the form without binary dust', () => {
    expect(readNumber('437.525', 1e6)).toBe(437_525_000);
    expect(readNumber('\u22125.2', 1)).toBe(-5.2);
    expect(readNumber('8 200', 1e6)).toBe(8.2e9);
  });

  it('are left out when blank and stay text when they are no number', () => {
    expect(readNumber('  ', 1)).toBeUndefined();
    expect(readNumber('ten', 1)).toBe('ten');
  });

  it('come back as they were entered', () => {
    expect(showNumber(437_525_000, 1e6)).toBe('437.525');
    expect(showNumber(0.1 * 3, 1)).toBe('0.3');
    expect(showNumber('ten', 1)).toBe('ten');
  });
});

describe('a measured cut', () => {
  it('is read from lines of two numbers, by comma, space or semicolon', () => {
    expect(readTable('0, 4\n30 5\n\n60;\u22126')).toEqual({ first: [0, 30, 60], second: [4, 5, -6] });
  });

  it('is refused when a line has no two numbers', () => {
    expect(readTable('0, 4\n30')).toBeUndefined();
    expect(readTable('0, 4, 5')).toBeUndefined();
  });

  it('is shown as it is read', () => {
    expect(showTable([0, 30], [4, 5])).toBe('0, 4\n30, 5');
  });
});
