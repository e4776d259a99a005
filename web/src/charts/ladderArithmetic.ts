import type { Budget, BudgetLine } from '../api/timeline';
import { at, type PassData } from './passData';

/** One row of the ladder: the line at the cursor, and what it has changed since the best second. */
export interface LadderRow {
  readonly line: BudgetLine;
  readonly changeDb: number;
  /** Margin left after this line's change, counting down from the best second's. */
  readonly levelDb: number;
  readonly isLargestLoss: boolean;
}

/** Steps smaller than this are drawn but not written. */
export const leastWrittenDb = 0.3;

/** Hangs each line's change since the best second under the best margin; it ends at the cursor's margin. */
export function ladderRows(best: Budget, now: Budget): LadderRow[] {
  const bestById = new Map(best.lines.map((line) => [line.id, line.valueDb]));
  const changes = now.lines.map((line) => (line.kind === 'term' ? line.valueDb - (bestById.get(line.id) ?? line.valueDb) : 0));
  const largestDb = Math.min(0, ...changes);
  let levelDb = best.marginDb;
  let isMarked = false;
  return now.lines.map((line, index) => {
    const changeDb = changes[index] ?? 0;
    levelDb += changeDb;
    const isLargestLoss = !isMarked && changeDb === largestDb && largestDb <= -leastWrittenDb;
    isMarked ||= isLargestLoss;
    return { line, changeDb, levelDb, isLargestLoss };
  });
}

/**
 * The budget of a second from that of the best second and the timeline's columns: shown at once while the cursor
 * moves, until the service's own lines for that second arrive.
 */
export function budgetFromTimeline(best: Budget, data: PassData, index: number, atUtc: string): Budget {
  const { timeline, bestIndex } = data;
  const risen = (column: readonly number[]) => at(column, index) - at(column, bestIndex);
  const isUplink = data.pass.link.direction === 'uplink';
  const spacecraftDb = risen(timeline.spacecraftGainDbi);
  const noiseDb = 10 * Math.log10(at(timeline.systemNoiseTemperatureK, index) / at(timeline.systemNoiseTemperatureK, bestIndex));
  const changes: Record<string, number> = {
    [isUplink ? 'receiveAntennaRelativeGain' : 'transmitAntennaGain']: spacecraftDb,
    groundPointingLoss: risen(timeline.groundGainDbi),
    freeSpaceLoss: -risen(timeline.freeSpaceLossDb),
    atmosphericLoss: -risen(timeline.atmosphericLossDb),
    polarisationLoss: -risen(timeline.polarisationLossDb),
    systemNoiseTemperature: -noiseDb,
  };
  let sumDb = 0;
  const lines = best.lines.map((line) => {
    if (line.kind === 'term') {
      const changeDb = changes[line.id] ?? 0;
      sumDb += changeDb;
      return { ...line, valueDb: line.valueDb + changeDb };
    }
    return { ...line, valueDb: line.valueDb + sumDb };
  });
  return { ...best, atUtc, lines, marginDb: best.marginDb + sumDb, cOverN0DbHz: best.cOverN0DbHz + sumDb, ebN0Db: best.ebN0Db + sumDb };
}
