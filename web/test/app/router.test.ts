import { describe, expect, it } from 'vitest';
import { matchPath } from '../../src/app/router';

describe('routes', () => {
  it('take parameters out of a path', () => {
    expect(matchPath('/pass/:spacecraft/:station/:instant', '/pass/lark-1/oruwai/2027-03-18T04%3A36%3A48Z')).toEqual({ spacecraft: 'lark-1', station: 'oruwai', instant: '2027-03-18T04:36:48Z' });
  });

  it('match whole paths only', () => {
    expect(matchPath('/stations', '/stations/new')).toBeUndefined();
    expect(matchPath('/', '/')).toEqual({});
    expect(matchPath('/', '/x')).toBeUndefined();
  });

  it('survive an address that is no valid escape', () => {
    expect(matchPath('/stations/:id', '/stations/%E0%A4%A')).toEqual({ id: '%E0%A4%A' });
  });
});
