/** The clock that instants are shown on. */
export type Zone = 'utc' | 'local';

const monthNames = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

interface Parts {
  readonly year: number;
  readonly month: number;
  readonly day: number;
  readonly hour: number;
  readonly minute: number;
  readonly second: number;
}

function parts(instantMs: number, zone: Zone): Parts {
  const date = new Date(Math.floor(instantMs / 1000) * 1000);
  return zone === 'utc'
    ? {
        year: date.getUTCFullYear(), month: date.getUTCMonth(), day: date.getUTCDate(),
        hour: date.getUTCHours(), minute: date.getUTCMinutes(), second: date.getUTCSeconds(),
      }
    : {
        year: date.getFullYear(), month: date.getMonth(), day: date.getDate(),
        hour: date.getHours(), minute: date.getMinutes(), second: date.getSeconds(),
      };
}

function two(value: number): string {
  return String(value).padStart(2, '0');
}

/** 04:36:48 */
export function clockTime(instantMs: number, zone: Zone): string {
  const { hour, minute, second } = parts(instantMs, zone);
  return `${two(hour)}:${two(minute)}:${two(second)}`;
}

/** 04:36 */
export function hourMinute(instantMs: number, zone: Zone): string {
  const { hour, minute } = parts(instantMs, zone);
  return `${two(hour)}:${two(minute)}`;
}

/** 18 Mar 2027 */
export function calendarDate(instantMs: number, zone: Zone): string {
  const { year, month, day } = parts(instantMs, zone);
  return `${day} ${monthNames[month] ?? ''} ${year}`;
}

/** 18 Mar */
export function dayMonth(instantMs: number, zone: Zone): string {
  const { month, day } = parts(instantMs, zone);
  return `${day} ${monthNames[month] ?? ''}`;
}

/** 18 Mar 04:36 */
export function dayAndTime(instantMs: number, zone: Zone): string {
  return `${dayMonth(instantMs, zone)} ${hourMinute(instantMs, zone)}`;
}

/** Whether two instants fall on one calendar day of the zone. */
export function sameDay(firstMs: number, secondMs: number, zone: Zone): boolean {
  return calendarDate(firstMs, zone) === calendarDate(secondMs, zone);
}

/** A length of time: 7:34, or 1:02:05 from an hour on. */
export function duration(seconds: number): string {
  const whole = Math.max(0, Math.round(seconds));
  const hours = Math.floor(whole / 3600);
  const minutes = Math.floor((whole % 3600) / 60);
  return hours > 0 ? `${hours}:${two(minutes)}:${two(whole % 60)}` : `${minutes}:${two(whole % 60)}`;
}

/** A countdown: as a duration, but the second that has begun still counts. */
export function countdown(seconds: number): string {
  return duration(Math.ceil(Math.max(0, seconds)));
}

/** A wait in words: 40 s, 24 min, 1 h 06 min, 2 d 3 h. */
export function wait(seconds: number): string {
  const whole = Math.max(0, Math.floor(seconds));
  if (whole < 60) return `${whole}\u00a0s`;
  const minutes = Math.floor(whole / 60);
  if (minutes < 60) return `${minutes}\u00a0min`;
  const hours = Math.floor(minutes / 60);
  if (hours < 24) return `${hours}\u00a0h ${two(minutes % 60)}\u00a0min`;
  const days = Math.floor(hours / 24);
  return hours % 24 === 0 ? `${days}\u00a0d` : `${days}\u00a0d ${hours % 24}\u00a0h`;
}

/** The age of an element set: 9.8 h, or 6.2 d from two days on. */
export function age(hours: number): string {
  return Math.abs(hours) < 48 ? `${hours.toFixed(1).replace('-', '\u2212')}\u00a0h` : `${(hours / 24).toFixed(1).replace('-', '\u2212')}\u00a0d`;
}

/** The name of the zone as the header shows it. */
export function zoneName(zone: Zone): string {
  return zone === 'utc' ? 'UTC' : 'Local';
}
