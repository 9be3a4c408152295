import { describe, expect, it } from 'vitest';
import { findCycles } from './find-cycles.mjs';

const graph = (edges: Record<string, string[]>) => new Map(Object.entries(edges));

describe('findCycles', () => {
  it('finds none where every path ends', () => {
    expect(findCycles(graph({ a: ['b', 'c'], b: ['c'], c: [], d: ['a', 'elsewhere'] }))).toEqual([]);
  });

  it('finds a node that points to itself', () => {
    expect(findCycles(graph({ a: ['a'], b: ['a'] }))).toEqual([['a', 'a']]);
  });

  it('shows the shortest way round', () => {
    expect(findCycles(graph({ a: ['b'], b: ['c', 'd'], c: ['d'], d: ['a'] }))).toEqual([
      ['a', 'b', 'd', 'a'],
    ]);
  });

  it('reports each knot once', () => {
    const cycles = findCycles(graph({ a: ['b'], b: ['a', 'c'], c: ['d'], d: ['c'], e: ['a'] }));
    expect(cycles).toHaveLength(2);
    expect(cycles).toContainEqual(['a', 'b', 'a']);
    expect(cycles).toContainEqual(['c', 'd', 'c']);
  });
});
