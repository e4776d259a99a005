/** A failure as the service tells it (RFC 9457), or as the browser meets it when no service answers. */
export interface Problem {
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly errors: readonly ProblemError[];
}

export interface ProblemError {
  readonly pointer: string;
  readonly detail: string;
}

/** What the network left us with when there was no answer at all. */
export const unreachable: Problem = {
  title: 'The service does not answer',
  status: 0,
  detail: 'No connection to the pass planner. Check that it runs and that this device can reach it.',
  errors: [],
};

/** Reads a failure's body; what is not a problem document still becomes one, in words. */
export function readProblem(status: number, body: unknown): Problem {
  const members = isRecord(body) ? body : {};
  return {
    title: text(members['title']) ?? `The service answered ${status}`,
    status,
    detail: text(members['detail']) ?? '',
    errors: Array.isArray(members['errors']) ? members['errors'].flatMap(readError) : [],
  };
}

function readError(entry: unknown): ProblemError[] {
  if (!isRecord(entry)) return [];
  const detail = text(entry['detail']);
  return detail === undefined ? [] : [{ pointer: text(entry['pointer']) ?? '#', detail }];
}

/** The messages of each member: `#/antennas/0/name` becomes the key `antennas/0/name`, escapes undone. */
export function errorsByPath(problem: Problem): Map<string, string[]> {
  const byPath = new Map<string, string[]>();
  for (const error of problem.errors) {
    const path = pathOf(error.pointer);
    byPath.set(path, [...(byPath.get(path) ?? []), error.detail]);
  }
  return byPath;
}

/** The path of an RFC 6901 pointer in its fragment form, without the leading `#/`. */
export function pathOf(pointer: string): string {
  const fragment = pointer.startsWith('#') ? decode(pointer.slice(1)) : pointer;
  return fragment.replace(/^\//, '').replaceAll('~1', '/').replaceAll('~0', '~');
}

function decode(fragment: string): string {
  try {
    return decodeURIComponent(fragment);
  } catch {
    return fragment;
  }
}

/** The longest known path that is the given one or one of its parents; undefined when none is. */
export function nearestPath(path: string, known: ReadonlySet<string>): string | undefined {
  let candidate = path;
  for (;;) {
    if (known.has(candidate)) return candidate;
    const cut = candidate.lastIndexOf('/');
    if (cut < 0) return undefined;
    candidate = candidate.slice(0, cut);
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function text(value: unknown): string | undefined {
  return typeof value === 'string' && value !== '' ? value : undefined;
}
