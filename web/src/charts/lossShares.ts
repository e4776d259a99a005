import { at, type PassData } from './passData';

export type LossKind = 'pointing' | 'range' | 'spacecraftAntenna' | 'atmosphere' | 'rest';

/** In the order they hang under the axis, the largest movers first but for pointing, which may be the cause. */
export const lossKinds: readonly LossKind[] = ['range', 'spacecraftAntenna', 'atmosphere', 'rest', 'pointing'];

/** What each part of the link has lost at a second since the best one, dB; the shares add up to the change of margin. */
export function lossSharesDb(data: PassData, index: number): Record<LossKind, number> {
  const { timeline, bestIndex } = data;
  const risen = (column: readonly number[]) => at(column, index) - at(column, bestIndex);
  const range = risen(timeline.freeSpaceLossDb);
  const spacecraftAntenna = -risen(timeline.spacecraftGainDbi);
  const atmosphere = risen(timeline.atmosphericLossDb);
  const pointing = -risen(timeline.groundGainDbi);
  const total = -risen(data.robustMarginDb);
  return { range, spacecraftAntenna, atmosphere, pointing, rest: total - range - spacecraftAntenna - atmosphere - pointing };
}
