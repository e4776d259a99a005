import type { Pass } from '../../api/passes';
import type { Station } from '../../api/profiles';
import { zone } from '../../app/zone';
import type { Lane } from '../../charts/laneChart';
import type { OverviewRow } from '../../charts/overviewStrip';
import { clockTime, duration } from '../../format/time';
import { verdict, worth } from '../../format/words';
import { passKey, passPageUrl } from './passGroups';

interface AntennaRow {
  readonly station: Station;
  readonly antennaId: string;
  readonly antennaName: string;
  readonly passes: readonly Pass[];
}

/** The antennas that can serve the chosen direction, in the stations' order, with their passes by time. */
export function antennaRows(stations: readonly Station[], passes: readonly Pass[], direction: 'downlink' | 'uplink' | undefined): AntennaRow[] {
  const byAntenna = new Map<string, Pass[]>();
  for (const pass of passes) {
    const key = `${pass.station}/${pass.antenna}`;
    const list = byAntenna.get(key);
    if (list === undefined) byAntenna.set(key, [pass]);
    else list.push(pass);
  }
  return stations.flatMap((station) => station.antennas
    .filter((antenna) => direction === undefined || ((direction === 'downlink' ? antenna.receive : antenna.transmit)?.length ?? 0) > 0)
    .map((antenna) => ({
      station, antennaId: antenna.id, antennaName: antenna.name,
      passes: (byAntenna.get(`${station.id}/${antenna.id}`) ?? []).sort((first, second) => Date.parse(first.aosUtc) - Date.parse(second.aosUtc)),
    })));
}

export function overviewRows(rows: readonly AntennaRow[]): OverviewRow[] {
  return rows.map((row) => ({
    name: `${row.station.name} ${row.antennaName}`,
    latitudeDeg: row.station.position.latitudeDeg, longitudeDeg: row.station.position.longitudeDeg, passes: row.passes,
  }));
}

export function lanesInFrame(rows: readonly AntennaRow[], fromMs: number, toMs: number): Lane[] {
  return rows.map((row, index) => {
    const inFrame = row.passes.filter((pass) => Date.parse(pass.losUtc) > fromMs && Date.parse(pass.aosUtc) < toMs);
    const closing = inFrame.filter((pass) => pass.usableS > 0).length;
    return {
      stationId: row.station.id, stationName: row.station.name, antennaName: row.antennaName,
      latitudeDeg: row.station.position.latitudeDeg, longitudeDeg: row.station.position.longitudeDeg,
      beginsStation: rows[index - 1]?.station !== row.station,
      summary: inFrame.length === 0 ? 'no passes' : `${closing} of ${inFrame.length} close`,
      passes: inFrame.map((pass) => ({ key: passKey(pass), url: passPageUrl(pass), label: labelOf(pass, inFrame), spoken: spoken(pass, labelOf(pass, inFrame)), pass })),
    };
  });
}

/** The spacecraft's name; with the radio where one pass has several on this antenna. */
function labelOf(pass: Pass, others: readonly Pass[]): string {
  const shared = others.some((other) => other !== pass && other.spacecraft === pass.spacecraft
    && other.link.radio !== pass.link.radio && other.aosUtc < pass.losUtc && pass.aosUtc < other.losUtc);
  return shared ? `${pass.spacecraftName} ${pass.link.radio}` : pass.spacecraftName;
}

/** Begins with what is seen, so that a voice command can name it. */
function spoken(pass: Pass, label: string): string {
  const usable = pass.usableS > 0 ? `, ${duration(pass.usableS)} usable` : '';
  return `${label} ${worth(pass)}, over ${pass.stationName}, ${pass.antennaName}, ${pass.link.direction}, ${clockTime(Date.parse(pass.aosUtc), zone())}: ${verdict(pass.verdict).toLowerCase()}${usable}`;
}
