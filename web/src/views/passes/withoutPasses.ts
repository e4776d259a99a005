import type { WithoutPasses } from '../../api/passes';
import type { Spacecraft, Station } from '../../api/profiles';
import { h } from '../../dom';
import { count, withoutPasses as reasonText } from '../../format/words';

/** Which spacecraft show nothing, and why. */
export function withoutPassesList(entries: readonly WithoutPasses[], stations: readonly Station[], spacecraft: readonly Spacecraft[]): HTMLElement | undefined {
  if (entries.length === 0) return undefined;
  const names = new Map(spacecraft.map((entry) => [entry.id, entry.name]));
  const stationNames = new Map(stations.map((entry) => [entry.id, entry.name]));
  const items = entries.map((entry) => {
    const over = entry.station === undefined ? '' : ` over ${stationNames.get(entry.station) ?? entry.station}`;
    return h('li', {},
      h('a', { href: `/spacecraft/${encodeURIComponent(entry.spacecraft)}` }, names.get(entry.spacecraft) ?? entry.spacecraft), over,
      ` ${reasonText(entry.reason)}. `, h('span', { class: 'quiet' }, entry.detail));
  });
  const title = `${count(entries.length, 'pairing', 'pairings')} without passes`;
  return h('section', { class: 'without' },
    h('details', { open: entries.length <= 8 }, h('summary', {}, h('h2', {}, title)), h('ul', {}, items)));
}
