import { readProblem, unreachable, type Problem } from './problem';

/** An answer of the service: a value (with its revision tag where it has one) or a problem. */
export type Answer<T> =
  | { readonly ok: true; readonly value: T; readonly etag: string | undefined; readonly location: string | undefined }
  | { readonly ok: false; readonly problem: Problem };

export interface Request {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'DELETE';
  readonly json?: unknown;
  readonly text?: { readonly body: string; readonly contentType: string };
  readonly ifMatch?: string;
  readonly signal?: AbortSignal;
}

export const apiRoot = '/api/v1';

/** Asks the service. Only an abort by the caller throws; every other failure is a problem. */
export async function ask<T>(path: string, request: Request = {}): Promise<Answer<T>> {
  const headers = new Headers({ Accept: 'application/json' });
  const init: RequestInit = { method: request.method ?? 'GET', headers, cache: 'no-cache' };
  if (request.json !== undefined) {
    headers.set('Content-Type', 'application/json');
    init.body = JSON.stringify(request.json);
  } else if (request.text !== undefined) {
    headers.set('Content-Type', request.text.contentType);
    init.body = request.text.body;
  }
  if (request.ifMatch !== undefined) headers.set('If-Match', request.ifMatch);
  if (request.signal !== undefined) init.signal = request.signal;

  let response: Response;
  try {
    response = await fetch(path.startsWith('/') ? path : `${apiRoot}/${path}`, init);
  } catch (failure) {
    if (request.signal?.aborted === true) throw failure;
    return { ok: false, problem: unreachable };
  }
  const body = await readBody(response);
  if (!response.ok) return { ok: false, problem: readProblem(response.status, body) };
  return {
    ok: true,
    value: body as T,
    etag: response.headers.get('ETag') ?? undefined,
    location: response.headers.get('Location') ?? undefined,
  };
}

async function readBody(response: Response): Promise<unknown> {
  const body = await response.text();
  if (body === '') return undefined;
  try {
    return JSON.parse(body) as unknown;
  } catch {
    return undefined;
  }
}
