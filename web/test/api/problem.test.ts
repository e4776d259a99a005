import { describe, expect, it } from 'vitest';
import { errorsByPath, nearestPath, pathOf, readProblem } from '../../src/api/problem';

describe('a problem', () => {
  it('is read from its document', () => {
    const problem = readProblem(422, { title: 'Refused', detail: 'One member.', errors: [{ pointer: '#/antennas/0/name', detail: 'name is missing' }] });
    expect(problem).toEqual({ title: 'Refused', status: 422, detail: 'One member.', errors: [{ pointer: '#/antennas/0/name', detail: 'name is missing' }] });
  });

  it('is made in words from an answer that is no problem document', () => {
    expect(readProblem(502, undefined)).toEqual({ title: 'The service answered 502', status: 502, detail: '', errors: [] });
    expect(readProblem(500, 'oops').errors).toEqual([]);
  });

  it('leaves out errors without words', () => {
    expect(readProblem(400, { errors: [null, 'x', { pointer: '#/a' }, { detail: 'kept' }] }).errors).toEqual([{ pointer: '#', detail: 'kept' }]);
  });
});

describe('pointers', () => {
  it('become paths with their escapes undone', () => {
    expect(pathOf('#/antennas/0/receive/1/pattern/diameterM')).toBe('antennas/0/receive/1/pattern/diameterM');
    expect(pathOf('#/a~1b/c~0d/e%20f')).toBe('a/b/c~d/e f');
    expect(pathOf('#')).toBe('');
    expect(pathOf('#/100%')).toBe('100%');
  });

  it('gather the messages of one member', () => {
    const problem = readProblem(422, { errors: [{ pointer: '#/name', detail: 'first' }, { pointer: '#/name', detail: 'second' }] });
    expect(errorsByPath(problem).get('name')).toEqual(['first', 'second']);
  });

  it('find the nearest part that a form shows', () => {
    const known = new Set(['antennas/0', 'antennas/0/name']);
    expect(nearestPath('antennas/0/name', known)).toBe('antennas/0/name');
    expect(nearestPath('antennas/0/receive/3/x', known)).toBe('antennas/0');
    expect(nearestPath('position/latitudeDeg', known)).toBeUndefined();
  });
});
