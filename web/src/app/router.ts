import { setPageTitle, type View } from './view';

type Open = (parameters: Readonly<Record<string, string>>, query: URLSearchParams) => View;

export interface Route {
  /** Segments; those that begin with a colon are parameters. */
  readonly path: string;
  readonly open: Open;
}

/** Matches a path against `/stations/:id`; undefined when it does not. */
export function matchPath(pattern: string, path: string): Record<string, string> | undefined {
  const wanted = pattern.split('/').filter(Boolean);
  const given = path.split('/').filter(Boolean);
  if (wanted.length !== given.length) return undefined;
  const parameters: Record<string, string> = {};
  for (const [index, segment] of wanted.entries()) {
    const value = given[index] ?? '';
    if (segment.startsWith(':')) parameters[segment.slice(1)] = decode(value);
    else if (segment !== value) return undefined;
  }
  return parameters;
}

function decode(value: string): string {
  try {
    return decodeURIComponent(value);
  } catch {
    return value;
  }
}

export interface Router {
  readonly go: (url: string) => void;
  readonly reload: () => void;
}

/** Shows the view of the address in `outlet`, and follows links, Back and Forward without reloading the page. */
export function startRouter(outlet: HTMLElement, routes: readonly Route[], missing: Open, onShow: (path: string) => void): Router {
  let shown: View | undefined;
  let shownUrl = '';

  const show = (moveFocus: boolean) => {
    shown?.dispose();
    shownUrl = location.pathname + location.search;
    const query = new URLSearchParams(location.search);
    const found = routes.map((route) => ({ route, parameters: matchPath(route.path, location.pathname) })).find((entry) => entry.parameters !== undefined);
    shown = found === undefined ? missing({}, query) : found.route.open(found.parameters ?? {}, query);
    outlet.replaceChildren(shown.element);
    setPageTitle(shown.title);
    onShow(location.pathname);
    if (moveFocus) {
      window.scrollTo(0, 0);
      outlet.focus({ preventScroll: true });
    }
  };

  const mayLeave = () => shown?.isUnsaved?.() !== true || confirm('Leave without saving? What you typed here would be lost.');

  const go = (url: string) => {
    if (!mayLeave()) return;
    history.pushState(null, '', url);
    show(true);
  };

  document.addEventListener('click', (event) => {
    if (event.defaultPrevented || event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return;
    const anchor = event.target instanceof Element ? event.target.closest('a') : null;
    const url = anchor === null ? undefined : internalUrl(anchor);
    if (url === undefined) return;
    event.preventDefault();
    go(url);
  });
  window.addEventListener('popstate', () => {
    if (location.pathname + location.search === shownUrl) return;
    if (!mayLeave()) {
      history.pushState(null, '', shownUrl);
      return;
    }
    show(true);
  });
  window.addEventListener('beforeunload', (event) => {
    if (shown?.isUnsaved?.() === true) event.preventDefault();
  });
  show(false);
  return { go, reload: () => { show(false); } };
}

/** The address of a link that the router serves itself; downloads, other hosts and the API's own pages are left alone. */
function internalUrl(anchor: Element): string | undefined {
  const href = anchor.getAttribute('href');
  if (href === null || anchor.hasAttribute('download') || anchor.hasAttribute('target')) return undefined;
  const url = new URL(href, location.href);
  if (url.origin !== location.origin || /^\/(api|openapi|health)(\/|$)/.test(url.pathname) || href.startsWith('#')) return undefined;
  return url.pathname + url.search;
}
