import { planner, type ProfileKind } from '../../api/planner';
import { errorsByPath, type Problem } from '../../api/problem';
import type { Json, JsonObject } from '../../api/profiles';
import { setPageTitle, type View } from '../../app/view';
import { h, replace } from '../../dom';
import { isObject } from '../../forms/fields';
import { profileForm, type ProfileForm } from '../../forms/profileForm';
import { calendarDate } from '../../format/time';
import { zone } from '../../app/zone';
import { confirmDialog, failure, skeleton } from '../states';
import { elementSets } from './elementSets';
import { profileWords, type ProfileWords } from './kinds';

/** Members that the service writes; they are no part of what a person edits. */
const writtenByService = ['revision', 'savedUtc', 'isDemo'];

/** One station or spacecraft: see it, edit it as a form or as JSON, save it over the revision that was read. */
export function profileView(kind: ProfileKind, id: string | undefined): View {
  const page = new ProfilePage(kind, id);
  return { title: page.words.title, element: page.element, dispose: () => undefined, isUnsaved: () => page.isUnsaved };
}

class ProfilePage {
  readonly element = h('div', { class: 'profile-page' });
  readonly words: ProfileWords;
  isUnsaved = false;
  private etag = '';
  private read: JsonObject = {};
  private form: ProfileForm | undefined;
  private jsonArea: HTMLTextAreaElement | undefined;
  private readonly message = h('div', { class: 'save-message', role: 'status' });
  private readonly editor = h('div', { class: 'editor' });
  private readonly saveButton = h('button', { type: 'button', class: 'button solid', onClick: () => { void this.save(); } });

  constructor(private readonly kind: ProfileKind, private id: string | undefined) {
    this.words = profileWords[kind];
    void this.load();
  }

  private async load(): Promise<void> {
    if (this.id === undefined) {
      this.show(this.words.make(), '');
      return;
    }
    replace(this.element, skeleton(`Loading the ${this.words.one}`));
    const answer = await planner.profile(this.kind, this.id);
    if (answer.ok) this.show(answer.value, answer.etag ?? `"${String(answer.value['revision'])}"`);
    else replace(this.element, failure(answer.problem, () => { void this.load(); }));
  }

  private show(document: JsonObject, etag: string): void {
    this.read = document;
    this.etag = etag;
    this.isUnsaved = false;
    const name = document['name'];
    const title = this.id === undefined ? `New ${this.words.one}` : typeof name === 'string' ? name : this.id;
    setPageTitle(title);
    const revision = document['revision'];
    const saved = document['savedUtc'];
    this.saveButton.textContent = typeof revision === 'number' ? `Save revision ${revision + 1}` : `Save ${this.words.one}`;
    replace(this.message);
    replace(this.element,
      h('p', { class: 'quiet' }, h('a', { href: this.words.path }, this.words.title)),
      h('div', { class: 'title-line' }, h('h1', {}, title),
        h('div', { class: 'controls' },
          typeof revision === 'number' && typeof saved === 'string' && h('span', { class: 'quiet' }, `Revision ${revision}, saved ${calendarDate(Date.parse(saved), zone())}${document['isDemo'] === true ? ', demo' : ''}`),
          this.modeSwitch(),
          this.id !== undefined && h('button', { type: 'button', class: 'button', onClick: () => { void this.remove(); } }, 'Delete'),
          this.saveButton)),
      this.message,
      this.kind === 'spacecraft' && this.id !== undefined && elementSets(this.id),
      this.editor);
    this.showForm(withoutServiceMembers(document));
  }

  private modeSwitch(): HTMLElement {
    const option = (name: string, isChosen: boolean, choose: () => void) => {
      const input = h('input', { type: 'radio', name: 'editor-mode', checked: isChosen, onChange: choose });
      return h('label', {}, input, h('span', {}, name));
    };
    return h('fieldset', { class: 'switch bare', 'aria-label': 'Edit as' },
      option('Form', true, () => {
        const document = this.edited();
        if (document !== undefined) this.showForm(document);
      }),
      option('JSON', false, () => { this.showJson(this.edited() ?? {}); }));
  }

  private readonly touched = (): void => {
    this.isUnsaved = true;
  };

  private showForm(document: JsonObject): void {
    this.jsonArea = undefined;
    this.form = profileForm(this.words.fields, document, this.touched, async () => {
      const answer = await planner.waveforms();
      return answer.ok ? answer.value : [];
    });
    replace(this.editor, this.form.element);
  }

  private showJson(document: JsonObject): void {
    this.form = undefined;
    this.jsonArea = h('textarea', { class: 'field-input json-area', rows: 30, spellcheck: 'false', 'aria-label': `The ${this.words.one} as JSON`, onInput: this.touched }, JSON.stringify(document, null, 2));
    replace(this.editor, this.jsonArea);
  }

  /** What is in the editor; undefined, and said so, when the JSON cannot be read. */
  private edited(): JsonObject | undefined {
    if (this.jsonArea === undefined) return this.form?.document() ?? withoutServiceMembers(this.read);
    try {
      const value = JSON.parse(this.jsonArea.value) as Json;
      if (isObject(value)) return value;
      this.say('This JSON is no object.', '');
    } catch (reason) {
      this.say('This JSON cannot be read.', reason instanceof Error ? reason.message : '');
    }
    const json = this.editor.closest('.profile-page')?.querySelectorAll<HTMLInputElement>('input[name="editor-mode"]')[1];
    if (json !== undefined) json.checked = true;
    return undefined;
  }

  private say(title: string, detail: string, ...actions: Node[]): void {
    replace(this.message, h('div', { class: 'notice' }, h('p', {}, h('strong', { class: 'caused' }, title), ` ${detail}`), actions));
  }

  private async save(): Promise<void> {
    const document = this.edited();
    if (document === undefined) return;
    this.saveButton.disabled = true;
    const answer = this.id === undefined ? await planner.create(this.kind, document) : await planner.save(this.kind, this.id, document, this.etag);
    this.saveButton.disabled = false;
    if (!answer.ok) {
      this.refuse(answer.problem, document);
      return;
    }
    const saved = answer.value;
    const isNew = this.id === undefined;
    this.id = typeof saved['id'] === 'string' ? saved['id'] : (answer.location?.split('/').at(-1) ?? this.id);
    if (isNew) history.replaceState(null, '', `${this.words.path}/${encodeURIComponent(this.id ?? '')}`);
    this.show(saved, answer.etag ?? `"${String(saved['revision'])}"`);
    replace(this.message, h('div', { class: 'notice plain' }, h('p', {}, h('strong', {}, 'Saved'), ` as revision ${String(saved['revision'])}. `, h('a', { href: '/' }, 'See the passes'))));
  }

  private refuse(problem: Problem, document: JsonObject): void {
    if (problem.status === 412) {
      void this.offerMerge(document);
      return;
    }
    const homeless = this.form?.showErrors(errorsByPath(problem)) ?? problem.errors.map((error) => `${error.pointer}: ${error.detail}`);
    this.say(problem.title, [problem.detail, ...homeless].filter(Boolean).join(' '));
  }

  /** Somebody else saved in the meantime: what was typed stays; the person decides with both in sight. */
  private async offerMerge(mine: JsonObject): Promise<void> {
    if (this.id === undefined) return;
    const answer = await planner.profile(this.kind, this.id);
    if (!answer.ok) {
      this.say(answer.problem.title, answer.problem.detail);
      return;
    }
    const theirs = answer.value;
    const etag = answer.etag ?? `"${String(theirs['revision'])}"`;
    const reload = h('button', { type: 'button', class: 'button small-button', onClick: () => { this.show(theirs, etag); } }, 'Reload theirs, drop mine');
    const keep = h('button', { type: 'button', class: 'button small-button', onClick: () => { this.etag = etag; void this.save(); } }, 'Save mine over it');
    this.say(`Somebody saved revision ${String(theirs['revision'])} meanwhile.`, 'What you typed is still here.', reload, keep);
    this.message.append(comparison(mine, withoutServiceMembers(theirs)));
  }

  private async remove(): Promise<void> {
    if (this.id === undefined) return;
    const sure = await confirmDialog(`Delete this ${this.words.one}?`, 'Its passes are no longer computed. Earlier revisions are kept in the database.', 'Delete');
    if (!sure) return;
    let answer = await planner.remove(this.kind, this.id, false);
    if (!answer.ok && answer.problem.status === 409) {
      const cascade = await confirmDialog(answer.problem.title, `${answer.problem.detail} Delete them too?`, 'Delete all');
      if (!cascade) return;
      answer = await planner.remove(this.kind, this.id, true);
    }
    if (!answer.ok) {
      this.say(answer.problem.title, answer.problem.detail);
      return;
    }
    this.isUnsaved = false;
    const back = h('a', { href: this.words.path });
    this.element.append(back);
    back.click();
  }
}

function withoutServiceMembers(document: JsonObject): JsonObject {
  return Object.fromEntries(Object.entries(document).filter(([name]) => !writtenByService.includes(name)));
}

/** The members that differ, side by side. */
function comparison(mine: JsonObject, theirs: JsonObject): HTMLElement {
  const left = leaves(mine);
  const right = leaves(theirs);
  const paths = [...new Set([...left.keys(), ...right.keys()])].filter((path) => left.get(path) !== right.get(path));
  return h('table', { class: 'profiles comparison' },
    h('thead', {}, h('tr', {}, ['Member', 'Yours', 'Theirs'].map((head) => h('th', { scope: 'col' }, head)))),
    h('tbody', {}, paths.map((path) => h('tr', {}, h('th', { scope: 'row' }, path), h('td', {}, left.get(path) ?? 'left out'), h('td', {}, right.get(path) ?? 'left out')))));
}

function leaves(value: Json, path = '', found = new Map<string, string>()): Map<string, string> {
  if (typeof value === 'object' && value !== null) {
    for (const [name, member] of Object.entries(value)) leaves(member as Json, path === '' ? name : `${path}/${name}`, found);
  } else {
    found.set(path, String(value));
  }
  return found;
}
