import { apiRoot, ask, type Answer } from './client';
import type { LinkReference, PassDetail, PassList } from './passes';
import type {
  ElementSetAnswer, ElementSetEntry, JsonObject, LibraryWaveform, Page, Spacecraft, Station, Status,
} from './profiles';
import type { Budget, Timeline } from './timeline';

export type ProfileKind = 'stations' | 'spacecraft';

export interface PassQuery {
  readonly fromMs: number;
  readonly toMs: number;
  readonly profileStepS: number;
  readonly cursor?: string;
}

export interface PassAddress {
  readonly spacecraft: string;
  readonly station: string;
  readonly instantUtc: string;
  readonly antenna: string | undefined;
  readonly link: string | undefined;
}

/** An instant as the wire wants it: whole seconds, UTC, Z. */
export function wireInstant(instantMs: number): string {
  return new Date(Math.round(instantMs / 1000) * 1000).toISOString().replace('.000Z', 'Z');
}

/** The `link` parameter that names one radio and one chain. */
export function linkParameter(link: LinkReference): string {
  return `${link.radio}:${link.chain}`;
}

function passPath(address: PassAddress, part: string, more: Record<string, string> = {}): string {
  const query = new URLSearchParams(more);
  if (address.antenna !== undefined) query.set('antenna', address.antenna);
  if (address.link !== undefined) query.set('link', address.link);
  const place = [address.spacecraft, address.station, address.instantUtc].map(encodeURIComponent).join('/');
  const text = query.toString();
  return `${apiRoot}/passes/${place}${part}${text === '' ? '' : `?${text}`}`;
}

export const planner = {
  status: (signal?: AbortSignal) => ask<Status>('status', signal === undefined ? {} : { signal }),

  passes(query: PassQuery, signal: AbortSignal): Promise<Answer<PassList>> {
    const parameters = new URLSearchParams({
      fromUtc: wireInstant(query.fromMs),
      toUtc: wireInstant(query.toMs),
      limit: '1000',
      profileStepS: String(query.profileStepS),
    });
    if (query.cursor !== undefined) parameters.set('cursor', query.cursor);
    return ask<PassList>(`passes?${parameters.toString()}`, { signal });
  },

  pass: (address: PassAddress, signal: AbortSignal) => ask<PassDetail>(passPath(address, ''), { signal }),
  timeline: (address: PassAddress, signal: AbortSignal) => ask<Timeline>(passPath(address, '/timeline'), { signal }),

  budget(address: PassAddress, atMs: number | undefined, signal: AbortSignal): Promise<Answer<Budget>> {
    const at: Record<string, string> = atMs === undefined ? {} : { atUtc: wireInstant(atMs) };
    return ask<Budget>(passPath(address, '/budget', at), { signal });
  },

  stations: (signal?: AbortSignal) => everyItem<Station>('stations', signal),
  spacecraft: (signal?: AbortSignal) => everyItem<Spacecraft>('spacecraft', signal),
  waveforms: () => everyItem<LibraryWaveform>('waveforms'),
  elementSets: (id: string) => everyItem<ElementSetEntry>(`spacecraft/${encodeURIComponent(id)}/element-sets`),

  profile: (kind: ProfileKind, id: string) => ask<JsonObject>(`${kind}/${encodeURIComponent(id)}`),
  create: (kind: ProfileKind, document: JsonObject) => ask<JsonObject>(kind, { method: 'POST', json: document }),
  save: (kind: ProfileKind, id: string, document: JsonObject, etag: string) =>
    ask<JsonObject>(`${kind}/${encodeURIComponent(id)}`, { method: 'PUT', json: document, ifMatch: etag }),
  remove: (kind: ProfileKind, id: string, cascade: boolean) =>
    ask<undefined>(`${kind}/${encodeURIComponent(id)}${cascade ? '?cascade=true' : ''}`, { method: 'DELETE' }),

  postElementSets(id: string, body: string, acceptBadChecksums: boolean): Promise<Answer<ElementSetAnswer>> {
    const query = acceptBadChecksums ? '?acceptBadChecksums=true' : '';
    return ask<ElementSetAnswer>(`spacecraft/${encodeURIComponent(id)}/element-sets${query}`, {
      method: 'POST', text: { body, contentType: elementSetType(body) },
    });
  },

  removeDemo: () => ask<undefined>('demo', { method: 'DELETE' }),

  /** Where a program or a spreadsheet reads the same timeline. */
  timelineUrl: (address: PassAddress) => passPath(address, '/timeline'),
};

/** The media type of pasted element sets, from how they begin. */
export function elementSetType(body: string): string {
  const start = body.trimStart();
  if (start.startsWith('{') || start.startsWith('[')) return 'application/json';
  if (start.startsWith('<')) return 'application/xml';
  return /^"?[A-Z_]+"?,/.test(start) ? 'text/csv' : 'text/plain';
}

async function everyItem<T>(path: string, signal?: AbortSignal): Promise<Answer<readonly T[]>> {
  const items: T[] = [];
  let cursor: string | null = null;
  do {
    const query: string = cursor === null ? '' : `?cursor=${encodeURIComponent(cursor)}`;
    const answer: Answer<Page<T>> = await ask<Page<T>>(path + query, signal === undefined ? {} : { signal });
    if (!answer.ok) return answer;
    items.push(...answer.value.items);
    cursor = answer.value.next ?? null;
  } while (cursor !== null);
  return { ok: true, value: items, etag: undefined, location: undefined };
}
