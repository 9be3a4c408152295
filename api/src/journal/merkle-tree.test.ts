import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leafHash, nodeHash, nodesOnAppend, peaksOf, rootHash, type NodeLookup } from './merkle-tree.js';

/** Builds a tree leaf by leaf, as the journal does, keeping every node that comes into being. */
function grow(leaves: readonly Buffer[]): { lookup: NodeLookup; nodes: number } {
  const nodes = new Map<string, Buffer>();
  const lookup: NodeLookup = (level, position) => {
    const hash = nodes.get(`${level}/${position}`);
    if (hash === undefined) throw new Error(`No node ${level}/${position}`);
    return hash;
  };
  for (const [size, leaf] of leaves.entries()) {
    for (const { level, position, hash } of nodesOnAppend(size, leafHash(leaf), lookup)) {
      nodes.set(`${level}/${position}`, hash);
    }
  }
  return { lookup, nodes: nodes.size };
}

/** MTH of RFC 9162, section 2.1.1, word for word: an independent second computation. */
function treeHash(leaves: readonly Buffer[]): Buffer {
  const [only] = leaves;
  if (only === undefined) return createHash('sha256').digest();
  if (leaves.length === 1)
    return createHash('sha256')
      .update(Buffer.concat([Buffer.of(0), only]))
      .digest();
  let split = 1;
  while (split * 2 < leaves.length) split *= 2;
  const inner = [Buffer.of(1), treeHash(leaves.slice(0, split)), treeHash(leaves.slice(split))];
  return createHash('sha256').update(Buffer.concat(inner)).digest();
}

// The leaves and roots that implementations of RFC 6962 share as their reference; written down from memory, and
// confirmed here by the recursive definition.
const REFERENCE_LEAVES = [
  '',
  '00',
  '10',
  '2021',
  '3031',
  '40414243',
  '5051525354555657',
  '606162636465666768696a6b6c6d6e6f',
].map((hex) => Buffer.from(hex, 'hex'));
const REFERENCE_ROOTS = [
  '6e340b9cffb37a989ca544e6bb780a2c78901d3fb33738768511a30617afa01d',
  'fac54203e7cc696cf0dfcb42c92a1d9dbaf70ad9e621f4bd8d98662f00e3c125',
  'aeb6bcfe274b70a14fb067a5e5578264db0fa9b51af5e0ba159158f329e06e77',
  'd37ee418976dd95753c1c73862b9398fa2a2cf9b4ff0fdfe8b30cd95209614b7',
  '4e3bbb1f7b478dcfe71fb631631519a3bca12c9aefca1612bfce4c13a86264d4',
  '76e67dadbcdf1e10e1b74ddc608abd2f98dfb16fbce75277b5232a127f2087ef',
  'ddb89be403809e325750d3d263cd78929c2942b7942a34b77e122c9594a74c8c',
  '5dc9da79a70659a9ad559cb701ded9a2ab9d823aad2f4960cfe370eff4604328',
];

describe('the tree of RFC 9162', () => {
  it('has the hash of nothing as the root of no leaves', () => {
    expect(rootHash(0, grow([]).lookup).toString('hex')).toBe(
      'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855',
    );
  });

  it.each(REFERENCE_ROOTS.map((root, index) => [index + 1, root] as const))(
    'has the reference root over %i leaves',
    (size, root) => {
      const leaves = REFERENCE_LEAVES.slice(0, size);
      expect(rootHash(leaves.length, grow(leaves).lookup).toString('hex')).toBe(root);
      expect(treeHash(leaves).toString('hex')).toBe(root);
    },
  );

  it('agrees with the recursive definition for any leaves and every earlier size', () => {
    fc.assert(
      fc.property(fc.array(fc.uint8Array({ maxLength: 40 }), { maxLength: 70 }), (data) => {
        const leaves = data.map((bytes) => Buffer.from(bytes));
        const { lookup } = grow(leaves);
        for (let size = 0; size <= leaves.length; size += 1) {
          expect(rootHash(size, lookup)).toEqual(treeHash(leaves.slice(0, size)));
        }
      }),
      { numRuns: 60 },
    );
  });

  it('makes fewer than two nodes a leaf and never more than log2 n + 1 at once', () => {
    const leaves = Array.from({ length: 1000 }, (_, index) => Buffer.from(String(index)));
    expect(grow(leaves).nodes).toBeLessThan(2000);
    const seven = nodesOnAppend(7, leafHash('x'), () => leafHash('left'));
    expect(seven.map(({ level, position }) => [level, position])).toEqual([
      [0, 7],
      [1, 3],
      [2, 1],
      [3, 0],
    ]);
  });

  it('is made of its complete subtrees', () => {
    expect(peaksOf(0)).toEqual([]);
    expect(peaksOf(11)).toEqual([
      { level: 3, position: 0 },
      { level: 1, position: 4 },
      { level: 0, position: 10 },
    ]);
  });

  it('tells a leaf from a node', () => {
    const [left, right] = [leafHash('a'), leafHash('b')];
    expect(leafHash(Buffer.concat([left, right]))).not.toEqual(nodeHash(left, right));
  });
});
