export interface LabelWish {
  /** Where the label would like its middle, in pixels. */
  at: number;
  width: number;
}

export interface PlacedLabel {
  /** Middle of the label. */
  at: number;
  row: number;
}

const GAP = 10;

/**
 * Places labels so that none overlaps its neighbour or leaves the strip: moved apart as little as possible,
 * on two rows where one is not enough. Wishes come in ascending order.
 */
export function placeLabels(wishes: readonly LabelWish[], width: number): PlacedLabel[] {
  const needed = wishes.reduce((sum, wish) => sum + wish.width + GAP, -GAP);
  if (needed <= width) {
    const row = spread(wishes, width);
    const farthest = Math.max(0, ...row.map((at, index) => Math.abs(at - (wishes[index]?.at ?? at))));
    if (farthest <= 28 || wishes.length < 3) return row.map((at) => ({ at, row: 0 }));
  }
  const even = spread(everyOther(wishes, 0), width);
  const odd = spread(everyOther(wishes, 1), width);
  return wishes.map((wish, index) => ({
    at: (index % 2 ? odd : even)[Math.floor(index / 2)] ?? wish.at,
    row: index % 2,
  }));
}

function everyOther(wishes: readonly LabelWish[], start: 0 | 1): LabelWish[] {
  return wishes.filter((_, index) => index % 2 === start);
}

interface Cluster {
  labels: LabelWish[];
  from: number;
  width: number;
}

/** Labels that touch join into a cluster, which stands where its members are best served on average. */
function spread(wishes: readonly LabelWish[], width: number): number[] {
  const clusters: Cluster[] = [];
  for (const wish of wishes) {
    let cluster = settle([wish], width);
    for (
      let last = clusters.at(-1);
      last && last.from + last.width + GAP > cluster.from;
      last = clusters.at(-1)
    ) {
      clusters.pop();
      cluster = settle([...last.labels, ...cluster.labels], width);
    }
    clusters.push(cluster);
  }
  return clusters.flatMap(middles);
}

function settle(labels: LabelWish[], width: number): Cluster {
  const total = labels.reduce((sum, label) => sum + label.width + GAP, -GAP);
  let offset = 0;
  let wanted = 0;
  for (const label of labels) {
    wanted += label.at - (offset + label.width / 2);
    offset += label.width + GAP;
  }
  const from = Math.max(0, Math.min(wanted / labels.length, width - total));
  return { labels, from, width: total };
}

function middles({ labels, from }: Cluster): number[] {
  let edge = from;
  return labels.map((label) => {
    const middle = edge + label.width / 2;
    edge += label.width + GAP;
    return middle;
  });
}
