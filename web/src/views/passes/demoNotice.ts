import { planner } from '../../api/planner';
import { h } from '../../dom';
import { confirmDialog } from '../states';

/** Says that what is shown is invented, and removes it in one request after a question. */
export function demoNotice(onRemoved: () => void): HTMLElement {
  const said = h('p', {}, h('strong', {}, 'Demo scenario: '), 'invented stations and spacecraft.');
  const button = h('button', { type: 'button', class: 'button small-button', 'data-key': 'remove-demo' }, 'Remove demo');
  button.addEventListener('click', async () => {
    const sure = await confirmDialog('Remove the demo scenario?', 'The invented stations, spacecraft and their element sets go. What you added yourself stays.', 'Remove demo');
    if (!sure) return;
    button.disabled = true;
    const answer = await planner.removeDemo();
    if (answer.ok) onRemoved();
    else {
      button.disabled = false;
      said.textContent = `${answer.problem.title}. ${answer.problem.detail}`;
    }
  });
  return h('aside', { class: 'notice plain demo', 'aria-label': 'Demo scenario' }, said, button);
}
