const HEADING = 'Merestone journal';

export interface CheckpointHead {
  /** Number of entries. */
  readonly size: number;
  /** Root hash of the tree over them, hex. */
  readonly root: string;
  readonly at: string;
}

/** The text that is signed: heading, number of entries, root hash in base64, time; a line each. */
export function checkpointText({ size, root, at }: CheckpointHead): string {
  return `${HEADING}\n${size}\n${Buffer.from(root, 'hex').toString('base64')}\n${at}\n`;
}
