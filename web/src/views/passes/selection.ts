import type { Direction, Pass } from '../../api/passes';

export const periodsH = [2, 4, 12, 24, 168] as const;
export type PeriodH = (typeof periodsH)[number];

/** What the page of passes is asked to show; it lives in the address, so that a link shows the same. */
export interface Selection {
  readonly station: string | undefined;
  readonly spacecraft: string | undefined;
  readonly direction: Direction | undefined;
  readonly periodH: PeriodH;
  readonly closingOnly: boolean;
}

export function readSelection(query: URLSearchParams): Selection {
  const period = Number(query.get('hours') ?? '4');
  const direction = query.get('direction');
  return {
    station: query.get('station') ?? undefined,
    spacecraft: query.get('spacecraft') ?? undefined,
    direction: direction === 'uplink' ? 'uplink' : direction === 'all' ? undefined : 'downlink',
    periodH: periodsH.find((candidate) => candidate === period) ?? 4,
    closingOnly: query.get('closing') === 'true',
  };
}

/** The address of a selection; what is as usual is left out. */
export function selectionUrl(selection: Selection): string {
  const query = new URLSearchParams();
  if (selection.station !== undefined) query.set('station', selection.station);
  if (selection.spacecraft !== undefined) query.set('spacecraft', selection.spacecraft);
  if (selection.direction !== 'downlink') query.set('direction', selection.direction ?? 'all');
  if (selection.periodH !== 4) query.set('hours', String(selection.periodH));
  if (selection.closingOnly) query.set('closing', 'true');
  const text = query.toString();
  return text === '' ? '/' : `/?${text}`;
}

export function isSelected(pass: Pass, selection: Selection): boolean {
  return (selection.station === undefined || pass.station === selection.station)
    && (selection.spacecraft === undefined || pass.spacecraft === selection.spacecraft)
    && (selection.direction === undefined || pass.link.direction === selection.direction)
    && (!selection.closingOnly || pass.usableS > 0);
}
