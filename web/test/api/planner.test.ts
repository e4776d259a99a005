import { describe, expect, it } from 'vitest';
import { elementSetType, wireInstant } from '../../src/api/planner';

describe('the wire', () => {
  it('takes instants as whole seconds of UTC', () => {
    expect(wireInstant(Date.UTC(2027, 2, 18, 4, 36, 48, 400))).toBe('2027-03-18T04:36:48Z');
  });

  it('is told the media type of pasted element sets', () => {
    expect(elementSetType('1 90001U 27001A   27077.50000000 ')).toBe('text/plain');
    expect(elementSetType('\n [{"OBJECT_NAME":"A"}]')).toBe('application/json');
    expect(elementSetType('<?xml version="1.0"?><ndm>')).toBe('application/xml');
    expect(elementSetType('OBJECT_NAME,OBJECT_ID,EPOCH')).toBe('text/csv');
    expect(elementSetType('CCSDS_OMM_VERS = 2.0')).toBe('text/plain');
  });
});
