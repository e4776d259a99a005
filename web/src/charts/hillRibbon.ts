import type { Pass } from '../api/passes';
import { s } from '../dom';
import { areaPath, curveOf, highestTint, joined, linePath, peakExcessDb, runsOf, type Scale } from './ribbonGeometry';

/** Narrower than this a hill cannot be read and becomes a block. */
export const narrowestHillPx = 24;

/** Shorter than this a whisker would read as a tick. */
const leastWhiskerPx = 4;

export interface RibbonLook {
  /** Pixels for one decibel of margin. */
  readonly pxPerDb: number;
}

/**
 * The one shape of the dashboard: margin against time over the required line. Drawn with the line at y = 0.
 * Usable seconds are filled in tints and crested in ink, the others hatched; an old element set dashes the crest.
 */
export function hillRibbon(pass: Pass, x: (timeMs: number) => number, look: RibbonLook): SVGGElement {
  const aosMs = Date.parse(pass.aosUtc);
  const losMs = Date.parse(pass.losUtc);
  const left = x(aosMs);
  const right = x(losMs);
  const group = s('g', { class: pass.elementSet.isStale ? 'ribbon stale' : 'ribbon' });
  if (pass.marginProfile === undefined || right - left < narrowestHillPx) {
    group.append(block(pass, left, right));
    return group;
  }
  const scale: Scale = { x, y: (excessDb) => -excessDb * look.pxPerDb };
  const runs = runsOf(curveOf(pass.marginProfile, losMs), pass.usableWindows);
  for (const run of joined(runs, false)) {
    group.append(
      s('path', { class: 'hatched', d: areaPath(run, scale) }),
      s('path', { class: 'hatch-outline', d: areaPath(run, scale) }),
    );
  }
  for (const run of runs) {
    if (run.tint !== undefined) group.append(s('path', { class: `tint m${run.tint}`, d: areaPath(run, scale) }));
  }
  for (const run of joined(runs, true)) group.append(s('path', { class: 'crest', d: linePath(run, scale) }));
  group.append(s('path', { class: 'required-line', d: `M${left} 0H${right}` }));
  const timingErrorS = pass.elementSet.timingErrorS ?? 0;
  if (pass.elementSet.isStale && timingErrorS > 0) {
    const halfPx = Math.max(leastWhiskerPx, x(aosMs + timingErrorS * 1000) - left);
    group.append(whisker(left, halfPx), whisker(right, halfPx));
  }
  return group;
}

/** A pass too narrow for a hill: a block of 1 to 4 units by its deepest tint, a dash when it does not close. */
export function block(pass: Pass, left: number, right: number, unitPx = 3): SVGElement {
  const width = Math.max(3, right - left);
  const tint = highestTint(pass.usableS, peakExcessDb(pass));
  if (tint === undefined) return s('path', { class: 'block-dash', d: `M${left} -1H${left + Math.max(5, width)}` });
  return s('rect', { class: `block m${tint}`, x: left, y: -unitPx * tint, width, height: unitPx * tint });
}

function whisker(centre: number, halfPx: number): SVGElement {
  return s('path', { class: 'whisker', d: `M${centre - halfPx} -3.5v7M${centre - halfPx} 0H${centre + halfPx}M${centre + halfPx} -3.5v7` });
}
