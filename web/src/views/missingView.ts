import type { View } from '../app/view';
import { h } from '../dom';
import { empty } from './states';

/** An address that no page has. */
export function missingView(): View {
  return {
    title: 'No such page',
    element: empty('No such page', h('p', { class: 'quiet' }, 'This address belongs to no page of the pass planner.'), h('a', { class: 'button', href: '/' }, 'See the coming passes')),
    dispose: () => undefined,
  };
}
