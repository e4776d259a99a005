import { describe, expect, it } from 'vitest';
import { age, calendarDate, clockTime, countdown, dayAndTime, duration, wait } from '../../src/format/time';

const instantMs = Date.UTC(2027, 2, 18, 4, 36, 48, 900);

describe('instants', () => {
  it('are shown to the whole second that has begun', () => {
    expect(clockTime(instantMs, 'utc')).toBe('04:36:48');
    expect(calendarDate(instantMs, 'utc')).toBe('18 Mar 2027');
    expect(dayAndTime(instantMs, 'utc')).toBe('18 Mar 04:36');
  });

  it('fall on the whole second before them also before 1970', () => {
    expect(clockTime(-500, 'utc')).toBe('23:59:59');
  });
});

describe('durations', () => {
  it('are minutes and seconds, with hours only when there are some', () => {
    expect(duration(454)).toBe('7:34');
    expect(duration(59.6)).toBe('1:00');
    expect(duration(3725)).toBe('1:02:05');
    expect(duration(-3)).toBe('0:00');
  });

  it('count down to nothing and stay there', () => {
    expect(countdown(1467.2)).toBe('24:28');
    expect(countdown(-8)).toBe('0:00');
  });
});

describe('waits', () => {
  it('are told as people tell them', () => {
    expect(wait(40)).toBe('40\u00a0s');
    expect(wait(24 * 60 + 59)).toBe('24\u00a0min');
    expect(wait(66 * 60)).toBe('1\u00a0h 06\u00a0min');
    expect(wait(51 * 3600)).toBe('2\u00a0d 3\u00a0h');
    expect(wait(48 * 3600)).toBe('2\u00a0d');
  });
});

describe('the age of an element set', () => {
  it('turns from hours to days at two days', () => {
    expect(age(9.84)).toBe('9.8\u00a0h');
    expect(age(148.8)).toBe('6.2\u00a0d');
    expect(age(-1.5)).toBe('\u22121.5\u00a0h');
  });
});
