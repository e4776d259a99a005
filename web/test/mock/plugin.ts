import type { Plugin } from 'vite';
import type { JsonObject } from '../../src/api/profiles';
import { budget, passDetail, passItem, servedPasses, timeline } from './passes.ts';
import { scenario, startMs, type Scenario } from './scenario.ts';

interface Reply {
  readonly status: number;
  readonly body?: unknown;
  readonly etag?: string;
}

/** Answers /api/v1 from invented passes while developing; the clock starts anew with the server and stands still between requests only. */
export function mockApi(mode: string): Plugin {
  const data = scenario(mode);
  const documents = { stations: new Map<string, JsonObject>(), spacecraft: new Map<string, JsonObject>() };
  for (const station of data.stations) documents.stations.set(station.document.id, station.document);
  for (const craft of data.spacecraft) documents.spacecraft.set(craft.document.id, craft.document);
  return {
    name: 'mock-api',
    apply: 'serve',
    configureServer(server) {
      server.middlewares.use('/api/v1', (request, response) => {
        const url = new URL(request.url ?? '/', 'http://mock');
        let body = '';
        request.on('data', (chunk: unknown) => { body += String(chunk); });
        request.on('end', () => {
          const reply = data.fails
            ? problem(503, 'The store is busy', 'The database did not answer within 5 s.')
            : answer(data, documents, request.method ?? 'GET', url, body, String(request.headers['if-match'] ?? ''));
          response.statusCode = reply.status;
          response.setHeader('Content-Type', reply.status >= 400 ? 'application/problem+json' : 'application/json');
          if (reply.etag !== undefined) response.setHeader('ETag', reply.etag);
          response.end(reply.body === undefined ? '' : JSON.stringify(reply.body));
        });
      });
    },
  };
}

function problem(status: number, title: string, detail: string, errors: readonly { pointer: string; detail: string }[] = []): Reply {
  return { status, body: { type: 'about:blank', title, status, detail, errors } };
}

type Documents = { readonly stations: Map<string, JsonObject>; readonly spacecraft: Map<string, JsonObject> };

function answer(data: Scenario, documents: Documents, method: string, url: URL, body: string, ifMatch: string): Reply {
  const [resource = '', ...rest] = url.pathname.split('/').filter(Boolean).map(decodeURIComponent);
  if (resource === 'status') return { status: 200, body: { nowUtc: new Date(startMs).toISOString(), hasDemo: data.hasDemo, stations: data.stations.length, spacecraft: data.spacecraft.length, version: '0.1.0', ut1MinusUtcS: 0, ut1Source: 'none' } };
  if (resource === 'waveforms') return { status: 200, body: { items: [{ id: 'dvbs2-qpsk-1-2', name: 'DVB-S2 QPSK 1/2', modulation: 'QPSK', codeRate: 0.5, requiredEbN0Db: 1.05, frameEfficiency: 0.99, source: 'ETSI EN 302 307-1, table 13', isPublished: true }], next: null } };
  if (resource === 'passes') return rest.length === 0 ? passList(data, url) : onePass(data, url, rest);
  if (resource === 'spacecraft' && rest[1] === 'element-sets') return elementSets(method);
  if (resource === 'stations' || resource === 'spacecraft') return profile(documents[resource], method, rest[0], body, ifMatch);
  return problem(404, 'No such resource', `Nothing stands at ${url.pathname}.`);
}

function passList(data: Scenario, url: URL): Reply {
  const fromMs = Date.parse(url.searchParams.get('fromUtc') ?? '') || startMs;
  const toMs = Date.parse(url.searchParams.get('toUtc') ?? '') || fromMs + 86_400_000;
  const step = url.searchParams.get('profileStepS');
  const limit = Number(url.searchParams.get('limit') ?? '200');
  const skip = Number(url.searchParams.get('cursor') ?? '0');
  const all = servedPasses(data.stations, data.spacecraft, fromMs, toMs);
  const items = all.slice(skip, skip + limit).map((served) => passItem(served, step === null ? undefined : Number(step), startMs));
  const withoutPasses = data.spacecraft.filter((craft) => craft.orbit === undefined).map((craft) => ({ spacecraft: craft.document.id, reason: 'noElementSet', detail: 'Paste one on the page of the spacecraft.' }));
  return { status: 200, body: { items, next: skip + limit < all.length ? String(skip + limit) : null, computedUtc: new Date(startMs).toISOString(), fromUtc: new Date(fromMs).toISOString(), toUtc: new Date(toMs).toISOString(), withoutPasses, models: [] } };
}

function onePass(data: Scenario, url: URL, [craftId, stationId, instant, part]: readonly string[]): Reply {
  const atMs = Date.parse(instant ?? '');
  const near = servedPasses(data.stations.filter((entry) => entry.document.id === stationId), data.spacecraft.filter((entry) => entry.document.id === craftId), atMs - 3_600_000, atMs + 3_600_000)
    .filter((served) => served.aosMs <= atMs && atMs < served.losMs);
  const chosen = near.find((served) => served.antenna.id === (url.searchParams.get('antenna') ?? served.antenna.id));
  if (chosen === undefined) return problem(404, 'No pass then', `${craftId} is not above the mask of ${stationId} at ${instant}.`);
  if (part === 'timeline') return { status: 200, body: timeline(chosen) };
  if (part === 'budget') {
    const detail = passDetail(chosen, [], startMs);
    return { status: 200, body: budget(chosen, Date.parse(url.searchParams.get('atUtc') ?? detail.bestUtc)) };
  }
  return { status: 200, body: passDetail(chosen, near.filter((served) => served !== chosen), startMs) };
}

function elementSets(method: string): Reply {
  if (method === 'POST') return { status: 200, body: { accepted: [{ catalogNumber: 90006, name: 'LARK 1', epochUtc: '2027-03-17T18:50:00Z' }], unchanged: [], unmatched: [], refused: [{ lineNumber: 4, column: 69, reason: 'the checksum is 3; the line adds up to 7' }] } };
  return { status: 200, body: { items: [{ epochUtc: '2027-03-17T18:50:00Z', ageH: 9.4, catalogNumber: 90006, name: 'LARK 1', meanMotionRevPerDay: 15.19, eccentricity: 0.0004, inclinationDeg: 97.5, source: 'pasted', receivedUtc: '2027-03-17T20:00:00Z', isServing: true }], next: null } };
}

function profile(documents: Map<string, JsonObject>, method: string, id: string | undefined, body: string, ifMatch: string): Reply {
  if (id === undefined) {
    if (method === 'GET') return { status: 200, body: { items: [...documents.values()], next: null } };
    return store(documents, JSON.parse(body) as JsonObject, 1);
  }
  const kept = documents.get(id);
  if (kept === undefined) return problem(404, 'Not found', `Nothing is called ${id}.`);
  const etag = `"${String(kept['revision'])}"`;
  if (method === 'GET') return { status: 200, body: kept, etag };
  if (method === 'DELETE') {
    documents.delete(id);
    return { status: 204 };
  }
  if (ifMatch !== etag) return problem(412, 'Somebody saved meanwhile', `The current revision is ${etag}.`);
  return store(documents, JSON.parse(body) as JsonObject, Number(kept['revision']) + 1);
}

function store(documents: Map<string, JsonObject>, document: JsonObject, revision: number): Reply {
  const name = document['name'];
  if (typeof name !== 'string' || name === '') return problem(422, 'The document was refused', 'One member needs attention.', [{ pointer: '#/name', detail: 'name is missing; it must be 1 to 120 characters' }]);
  const id = typeof document['id'] === 'string' ? document['id'] : name.toLowerCase().replace(/[^a-z0-9]+/g, '-');
  const antennas = Array.isArray(document['antennas']) ? document['antennas'] as readonly JsonObject[] : [];
  const zeroAt = antennas.findIndex((antenna) => JSON.stringify(antenna).includes('"diameterM":0'));
  if (zeroAt >= 0) return problem(422, 'The document was refused', 'One member needs attention.', [{ pointer: `#/antennas/${zeroAt}/receive/0/pattern/diameterM`, detail: 'diameterM is 0; it must be above 0 and at most 100 m' }]);
  const saved = { ...document, id, revision, savedUtc: new Date(startMs).toISOString(), isDemo: false };
  documents.set(id, saved);
  return { status: revision === 1 ? 201 : 200, body: saved, etag: `"${revision}"` };
}
