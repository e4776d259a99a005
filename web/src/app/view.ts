/** A page: what stands in `main`, its title, and what to stop when it goes. */
export interface View {
  readonly title: string;
  readonly element: HTMLElement;
  readonly dispose: () => void;
  /** True while leaving would lose what was typed. */
  readonly isUnsaved?: () => boolean;
}

/** The page's title can become known only when its data has come. */
export function setPageTitle(title: string): void {
  document.title = `${title} · Pass planner`;
}
