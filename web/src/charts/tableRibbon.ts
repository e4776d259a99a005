import type { Pass } from '../api/passes';
import { s } from '../dom';
import { hillRibbon } from './hillRibbon';
import { highestExcessDb, lowestExcessDb } from './ribbonGeometry';

export interface FixedRibbon {
  readonly pxPerMinute: number;
  readonly pxPerDb: number;
  readonly widthPx: number;
  /** Where the pass stands: its greatest elevation in the middle, or AOS at the left edge. */
  readonly anchor: 'middle' | 'start';
}

export const tableLook: FixedRibbon = { pxPerMinute: 13, pxPerDb: 1.15, widthPx: 195, anchor: 'middle' };
export const phoneLook: FixedRibbon = { pxPerMinute: 27, pxPerDb: 2.6, widthPx: 350, anchor: 'start' };

/** The ribbon at a fixed scale, so that rows compare. A pass longer than the strip is cut at its edges. */
export function fixedRibbon(pass: Pass, look: FixedRibbon): SVGSVGElement {
  const above = highestExcessDb * look.pxPerDb + 2;
  const height = above - lowestExcessDb * look.pxPerDb + 2;
  const pxPerMs = look.pxPerMinute / 60_000;
  const originMs = look.anchor === 'middle' ? Date.parse(pass.maximumElevationUtc) : Date.parse(pass.aosUtc);
  const originPx = look.anchor === 'middle' ? look.widthPx / 2 : 10;
  const x = (timeMs: number) => originPx + (timeMs - originMs) * pxPerMs;
  return s('svg', { class: 'fixed-ribbon', width: look.widthPx, height, viewBox: `0 0 ${look.widthPx} ${height}`, 'aria-hidden': 'true' },
    s('g', { transform: `translate(0 ${above})` },
      look.anchor === 'middle' && s('path', { class: 'grid', d: `M0 0H${look.widthPx}` }),
      hillRibbon(pass, x, look)));
}
