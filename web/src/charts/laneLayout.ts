/** What a pass takes in its lane: its hill and its labels count as one width. */
export interface LaneBox {
  readonly left: number;
  readonly right: number;
  readonly above: number;
  readonly below: number;
}

export interface LaneLayout {
  /** The row of each box, in the order given. */
  readonly rows: readonly number[];
  /** The y of each row's required line from the lane's top. */
  readonly baselines: readonly number[];
  readonly height: number;
}

const gapPx = 8;

/** Packs boxes, ordered by left edge, into the fewest rows first-fit; each row is as tall as its hills. */
export function packLane(boxes: readonly LaneBox[], paddingPx: number, leastHeightPx: number): LaneLayout {
  const rowEnds: number[] = [];
  const above: number[] = [];
  const below: number[] = [];
  const rows = boxes.map((box) => {
    const free = rowEnds.findIndex((end) => end + gapPx <= box.left);
    const row = free < 0 ? rowEnds.length : free;
    rowEnds[row] = box.right;
    above[row] = Math.max(above[row] ?? 0, box.above);
    below[row] = Math.max(below[row] ?? 0, box.below);
    return row;
  });
  let y = paddingPx;
  const baselines = above.map((rise, row) => {
    const baseline = y + rise;
    y = baseline + (below[row] ?? 0) + paddingPx;
    return baseline;
  });
  return { rows, baselines, height: Math.max(leastHeightPx, y) };
}
