import { createHash } from 'node:crypto';

/*
 * The hash tree of RFC 9162, section 2.1 (the same as in RFC 6962): the tree over n leaves splits at the largest power
 * of two below n. Kept are the hashes of all complete subtrees, so that one more leaf costs at most log2 n hashes.
 */

/** Where a complete subtree of 2^level leaves stands: the position-th of its level, from 0. */
export interface TreeNode {
  readonly level: number;
  readonly position: number;
  readonly hash: Buffer;
}

export type NodeLookup = (level: number, position: number) => Buffer;

export function leafHash(data: string | Buffer): Buffer {
  return createHash('sha256').update(Buffer.of(0)).update(data).digest();
}

export function nodeHash(left: Buffer, right: Buffer): Buffer {
  return createHash('sha256').update(Buffer.of(1)).update(left).update(right).digest();
}

/** The nodes that come into being when a leaf is put at place `size` of a tree of `size` leaves. */
export function nodesOnAppend(size: number, leaf: Buffer, lookup: NodeLookup): TreeNode[] {
  const nodes: TreeNode[] = [{ level: 0, position: size, hash: leaf }];
  let hash = leaf;
  let position = size;
  for (let level = 0; position % 2 === 1; level += 1) {
    hash = nodeHash(lookup(level, position - 1), hash);
    position = (position - 1) / 2;
    nodes.push({ level: level + 1, position, hash });
  }
  return nodes;
}

/** The complete subtrees that make up a tree of `size` leaves, the largest first. */
export function peaksOf(size: number): { level: number; position: number }[] {
  const peaks: { level: number; position: number }[] = [];
  let start = 0;
  for (let level = Math.floor(Math.log2(Math.max(size, 1))); level >= 0; level -= 1) {
    const span = 2 ** level;
    if (size - start < span) continue;
    peaks.push({ level, position: start / span });
    start += span;
  }
  return peaks;
}

/** Root hash of a tree of `size` leaves; of none it is the hash of nothing. */
export function rootHash(size: number, lookup: NodeLookup): Buffer {
  const hashes = peaksOf(size).map(({ level, position }) => lookup(level, position));
  const root = hashes.reduceRight<Buffer | undefined>(
    (right, left) => (right === undefined ? left : nodeHash(left, right)),
    undefined,
  );
  return root ?? createHash('sha256').digest();
}
