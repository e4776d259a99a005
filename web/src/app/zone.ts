import type { Zone } from '../format/time';

const key = 'pass-planner.zone';
const listeners = new Set<() => void>();
let current: Zone = read();

function read(): Zone {
  try {
    return localStorage.getItem(key) === 'local' ? 'local' : 'utc';
  } catch {
    return 'utc';
  }
}

/** The zone that all instants are shown in. */
export function zone(): Zone {
  return current;
}

export function setZone(value: Zone): void {
  current = value;
  try {
    localStorage.setItem(key, value);
  } catch {
    // Private windows may refuse storage; the choice then lasts as long as the page.
  }
  for (const listener of [...listeners]) listener();
}

export function onZoneChange(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** What must be added to UTC to read as the zone's clock, ms. */
export function zoneOffsetMs(timeMs: number): number {
  return current === 'utc' ? 0 : -new Date(timeMs).getTimezoneOffset() * 60_000;
}
