import './styles/tokens.css';
import './styles/base.css';
import './styles/passes.css';
import './styles/pass.css';
import './styles/forms.css';
import { startRouter } from './app/router';
import { buildShell } from './app/shell';
import { missingView } from './views/missingView';
import { passView } from './views/pass/passView';
import { passesView } from './views/passes/passesView';
import { profileListView } from './views/profiles/profileListView';
import { profileView } from './views/profiles/profileView';

const root = document.getElementById('app');
if (root === null) throw new Error('The page has no element #app.');
const shell = buildShell(root);

startRouter(shell.main, [
  { path: '/', open: passesView },
  { path: '/pass/:spacecraft/:station/:instant', open: passView },
  { path: '/stations', open: () => profileListView('stations') },
  { path: '/stations/new', open: () => profileView('stations', undefined) },
  { path: '/stations/:id', open: ({ id }) => profileView('stations', id) },
  { path: '/spacecraft', open: () => profileListView('spacecraft') },
  { path: '/spacecraft/new', open: () => profileView('spacecraft', undefined) },
  { path: '/spacecraft/:id', open: ({ id }) => profileView('spacecraft', id) },
], missingView, shell.markPage);
