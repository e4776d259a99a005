import type { Problem } from '../api/problem';
import { h, type Child } from '../dom';
import { plain, type Quantity } from '../format/number';

/** Grey shapes where the page will stand. */
export function skeleton(label: string): HTMLElement {
  return h('div', { class: 'skeleton', role: 'status', 'aria-label': label },
    h('span', { class: 'tall' }), h('span', {}), h('span', { class: 'wide' }), h('span', {}), h('span', {}));
}

/** What went wrong, in the service's words, with a way to try again. */
export function failure(problem: Problem, retry: () => void): HTMLElement {
  return h('div', { class: 'state', role: 'alert' },
    h('h1', {}, problem.title),
    problem.detail !== '' && h('p', { class: 'quiet' }, problem.detail),
    h('button', { type: 'button', class: 'button', onClick: retry }, 'Retry'));
}

/** A failure of a quiet refresh: what is shown stays, and says that it is old. */
export function staleNotice(problem: Problem, retry: () => void): HTMLElement {
  return h('div', { class: 'notice', role: 'status' },
    h('p', {}, h('strong', { class: 'caused' }, `${problem.title}. `), 'What you see is from the last answer.'),
    h('button', { type: 'button', class: 'button small-button', onClick: retry }, 'Retry'));
}

export function empty(title: string, ...rest: Child[]): HTMLElement {
  return h('div', { class: 'state' }, h('h1', {}, title), rest);
}

/** A quantity with its unit in the lighter ink. */
export function shown(quantity: Quantity): HTMLElement {
  const text = plain(quantity);
  return h('span', { class: 'quantity' }, quantity.number, h('span', { class: 'unit' }, text.slice(quantity.number.length)));
}

/** Asks before something that cannot be undone; resolves true on yes. */
export function confirmDialog(title: string, detail: string, yes: string): Promise<boolean> {
  return new Promise((resolve) => {
    const dialog = h('dialog', { 'aria-labelledby': 'confirm-title' },
      h('form', { method: 'dialog' },
        h('h2', { id: 'confirm-title' }, title),
        h('p', { class: 'quiet' }, detail),
        h('div', { class: 'controls' },
          h('button', { class: 'button', value: 'no' }, 'Keep it'),
          h('button', { class: 'button solid', value: 'yes' }, yes))));
    dialog.addEventListener('close', () => {
      dialog.remove();
      resolve(dialog.returnValue === 'yes');
    });
    document.body.append(dialog);
    dialog.showModal();
  });
}
