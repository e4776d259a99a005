type Attribute = string | number | boolean | undefined | ((event: never) => void);
export type Attributes = Readonly<Record<string, Attribute>>;
export type Child = Node | string | undefined | false | readonly Child[];

const svgNamespace = 'http://www.w3.org/2000/svg';

/** An HTML element: `on…` members are listeners, the others attributes; `undefined` and `false` are left out. */
export function h<K extends keyof HTMLElementTagNameMap>(tag: K, attributes: Attributes = {}, ...children: Child[]): HTMLElementTagNameMap[K] {
  return dress(document.createElement(tag), attributes, children);
}

/** An SVG element, by the same rules. */
export function s<K extends keyof SVGElementTagNameMap>(tag: K, attributes: Attributes = {}, ...children: Child[]): SVGElementTagNameMap[K] {
  return dress(document.createElementNS(svgNamespace, tag), attributes, children);
}

function dress<E extends Element>(element: E, attributes: Attributes, children: readonly Child[]): E {
  for (const [name, value] of Object.entries(attributes)) {
    if (value === undefined || value === false) continue;
    if (typeof value === 'function') element.addEventListener(name.slice(2).toLowerCase(), value as EventListener);
    else element.setAttribute(name, value === true ? '' : String(value));
  }
  append(element, children);
  return element;
}

function append(parent: Element, children: readonly Child[]): void {
  for (const child of children) {
    if (child === undefined || child === false) continue;
    if (Array.isArray(child)) append(parent, child as readonly Child[]);
    else parent.append(child as Node | string);
  }
}

export function replace(parent: Element, ...children: Child[]): void {
  parent.replaceChildren();
  append(parent, children);
}
