import type { Verdict } from '../api/passes';
import { s } from '../dom';

const line = 'M0 9.5H15';

/** The three small hills that stand beside a verdict's words: on the line, through it, under it. */
export function verdictMark(verdict: Verdict): SVGSVGElement {
  const mark = s('svg', { class: 'verdict-mark', viewBox: '0 0 15 14', width: 15, height: 14, 'aria-hidden': 'true' });
  if (verdict === 'closes') {
    mark.append(s('path', { class: 'mark-fill', d: 'M2 9.5C4 9.5 4 3 7.5 3S11 9.5 13 9.5Z' }), s('path', { class: 'mark-line', d: line }));
  } else if (verdict === 'closesInPart') {
    mark.append(
      s('path', { class: 'mark-fill', d: 'M3.5 9.5C5.5 7 5.8 3.5 7.5 3.5S9.5 7 11.5 9.5Z' }),
      s('path', { class: 'mark-line', d: `${line}M3.5 9.5Q2.2 11.5 .8 13M11.5 9.5Q12.8 11.5 14.2 13` }),
    );
  } else {
    mark.append(s('path', { class: 'mark-line', d: 'M0 4.5H15M1.5 13C4 10 5.5 7 7.5 7S11 10 13.5 13' }));
  }
  return mark;
}
