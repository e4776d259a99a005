import type { Answer } from '../../api/client';
import { planner, type ProfileKind } from '../../api/planner';
import type { Spacecraft, Station } from '../../api/profiles';
import type { View } from '../../app/view';
import { h, replace, type Child } from '../../dom';
import { antennas, position, radios } from '../../format/profile';
import { count } from '../../format/words';
import { empty, failure, skeleton } from '../states';
import { profileWords } from './kinds';

interface Row {
  readonly id: string;
  readonly name: string;
  readonly isDemo: boolean;
  readonly first: string;
  readonly second: string;
  readonly revision: number;
}

/** All stations, or all spacecraft, with the way to each and to a new one. */
export function profileListView(kind: ProfileKind): View {
  const words = profileWords[kind];
  const element = h('div', { class: 'profiles-page' });
  const request = new AbortController();
  const load = async () => {
    replace(element, skeleton(`Loading ${words.title.toLowerCase()}`));
    try {
      const answer = await rowsOf(kind, request.signal);
      replace(element, answer.ok ? content(kind, answer.value) : failure(answer.problem, () => { void load(); }));
    } catch (failureOfFetch) {
      if (!request.signal.aborted) throw failureOfFetch;
    }
  };
  void load();
  return { title: words.title, element, dispose: () => { request.abort(); } };
}

async function rowsOf(kind: ProfileKind, signal: AbortSignal): Promise<Answer<readonly Row[]>> {
  if (kind === 'stations') {
    const answer = await planner.stations(signal);
    return answer.ok ? { ...answer, value: answer.value.map(stationRow) } : answer;
  }
  const answer = await planner.spacecraft(signal);
  return answer.ok ? { ...answer, value: answer.value.map(spacecraftRow) } : answer;
}

function stationRow(station: Station): Row {
  const { id, name, isDemo, revision } = station;
  return { id, name, isDemo, revision, first: position(station), second: antennas(station) };
}

function spacecraftRow(spacecraft: Spacecraft): Row {
  const { id, name, isDemo, revision } = spacecraft;
  return { id, name, isDemo, revision, first: spacecraft.catalogNumber === undefined ? 'no catalogue number' : String(spacecraft.catalogNumber), second: radios(spacecraft) };
}

function content(kind: ProfileKind, rows: readonly Row[]): Child {
  const words = profileWords[kind];
  const add = h('a', { class: 'button solid', href: `${words.path}/new` }, `Add a ${words.one}`);
  if (rows.length === 0) return empty(words.none, h('p', { class: 'quiet' }, words.about), add);
  const heads = kind === 'stations' ? ['Name', 'Position', 'Antennas', 'Revision'] : ['Name', 'Catalogue number', 'Radios', 'Revision'];
  return [
    h('div', { class: 'title-line' }, h('h1', {}, kind === 'stations' ? count(rows.length, 'station', 'stations') : `${rows.length} spacecraft`), add),
    h('div', { class: 'table-frame', tabindex: '0', role: 'region', 'aria-label': words.title },
      // The roles are said aloud because the phone lays the rows out as blocks, which takes a table's own roles away.
      h('table', { class: 'profiles', role: 'table' },
        h('thead', { role: 'rowgroup' }, h('tr', { role: 'row' }, heads.map((head) => h('th', { scope: 'col', role: 'columnheader' }, head)))),
        h('tbody', { role: 'rowgroup' }, rows.map((row) => h('tr', { role: 'row' },
          h('th', { scope: 'row', role: 'rowheader' }, h('a', { href: `${words.path}/${encodeURIComponent(row.id)}` }, row.name), row.isDemo && h('span', { class: 'faint' }, ' demo')),
          h('td', { role: 'cell' }, row.first), h('td', { class: 'quiet', role: 'cell' }, row.second), h('td', { role: 'cell', title: 'Revision' }, String(row.revision))))))),
  ];
}
