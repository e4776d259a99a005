import { planner } from '../../api/planner';
import type { ElementSetAnswer, ElementSetEntry, ElementSetMention } from '../../api/profiles';
import { zone } from '../../app/zone';
import { h, replace, type Child } from '../../dom';
import { orbit } from '../../format/profile';
import { age, dayAndTime } from '../../format/time';
import { count } from '../../format/words';

/** Element sets of a spacecraft: paste new ones, read what became of each line, see which set serves. */
export function elementSets(id: string): HTMLElement {
  const history = h('div', {});
  const answerPlace = h('div', { class: 'answer', role: 'status' });
  const area = h('textarea', { class: 'field-input', id: 'element-set-text', rows: 5, spellcheck: 'false', 'aria-describedby': 'element-set-hint' });
  const anyway = h('input', { type: 'checkbox' });
  const button = h('button', { type: 'submit', class: 'button' }, 'Load element sets');
  const send = async (event: Event) => {
    event.preventDefault();
    if (area.value.trim() === '') {
      replace(answerPlace, h('p', { class: 'field-error' }, 'Paste an element set first.'));
      return;
    }
    button.disabled = true;
    const answer = await planner.postElementSets(id, area.value, anyway.checked);
    button.disabled = false;
    if (!answer.ok) {
      replace(answerPlace, h('p', { class: 'field-error' }, `${answer.problem.title}. ${answer.problem.detail}`),
        answer.problem.errors.length > 0 && h('ul', {}, answer.problem.errors.map((error) => h('li', { class: 'field-error' }, error.detail))));
      return;
    }
    replace(answerPlace, answerWords(answer.value));
    if (answer.value.refused.length === 0) area.value = '';
    await showHistory(history, id);
  };
  void showHistory(history, id);
  return h('section', { class: 'element-sets' },
    h('h2', {}, 'Element sets'),
    h('form', { onSubmit: (event: Event) => { void send(event); } },
      h('label', { for: 'element-set-text' }, 'Paste two- or three-line sets, or OMM as JSON, XML, KVN or CSV'),
      area,
      h('p', { class: 'field-hint', id: 'element-set-hint' }, 'All sets are kept; at each instant the one with the nearest earlier epoch serves.'),
      h('div', { class: 'controls' }, button, h('label', { class: 'check' }, anyway, 'Take lines with a wrong checksum too'))),
    answerPlace, history);
}

function answerWords(answer: ElementSetAnswer): Child {
  const mention = (entry: ElementSetMention) =>
    [entry.name ?? (entry.catalogNumber === undefined ? 'a set' : String(entry.catalogNumber)), entry.epochUtc === undefined ? '' : `of ${dayAndTime(Date.parse(entry.epochUtc), zone())}`].join(' ').trim();
  const group = (title: string, entries: readonly ElementSetMention[]) => entries.length > 0 && h('p', {}, h('strong', {}, `${title}: `), entries.map(mention).join('; '), '.');
  return [
    group('Accepted', answer.accepted), group('Known already', answer.unchanged), group('Of no spacecraft here', answer.unmatched),
    answer.refused.length > 0 && h('div', {}, h('p', { class: 'caused' }, `${count(answer.refused.length, 'line', 'lines')} refused`),
      h('ul', {}, answer.refused.map((line) => h('li', {}, h('strong', {}, `Line ${line.lineNumber}, column ${line.column}: `), line.reason)))),
  ];
}

async function showHistory(place: HTMLElement, id: string): Promise<void> {
  const answer = await planner.elementSets(id);
  if (!answer.ok) {
    replace(place, h('p', { class: 'field-error' }, `${answer.problem.title}. ${answer.problem.detail}`));
    return;
  }
  replace(place, answer.value.length === 0
    ? h('p', { class: 'quiet' }, 'No element set yet: without one there are no passes.')
    : h('div', { class: 'table-frame', tabindex: '0', role: 'region', 'aria-label': 'Element sets' }, h('table', { class: 'profiles' },
      h('thead', {}, h('tr', {}, ['Epoch', 'Age', 'Name', 'Orbit', 'Source', ''].map((head) => h('th', { scope: 'col' }, head === '' ? h('span', { class: 'hidden-text' }, 'Use') : head)))),
      h('tbody', {}, answer.value.map(historyRow)))));
}

function historyRow(entry: ElementSetEntry): HTMLElement {
  return h('tr', {},
    h('th', { scope: 'row' }, dayAndTime(Date.parse(entry.epochUtc), zone())), h('td', {}, age(entry.ageH)), h('td', {}, entry.name),
    h('td', { class: 'quiet' }, orbit(entry)), h('td', { class: 'quiet' }, entry.source), h('td', {}, entry.isServing ? h('strong', {}, 'serves now') : ''));
}
