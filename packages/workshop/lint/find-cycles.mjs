/**
 * Finds the knots of a directed graph by Tarjan's algorithm (R. Tarjan, SIAM J. Comput. 1 (1972) 146) and shows one way
 * round in each.
 * @param {Map<string, string[]>} graph node → nodes it points to; targets without an entry point nowhere
 * @returns {string[][]} one closed path per knot, first node repeated at the end; empty when there is none
 */
export const findCycles = (graph) =>
  knotsOf(graph)
    .filter((knot) => knot.size > 1 || [...knot].some((node) => graph.get(node)?.includes(node)))
    .map((knot) => wayRound(graph, knot));

/** @param {Map<string, string[]>} graph @returns {Set<string>[]} */
const knotsOf = (graph) => {
  /** @type {Map<string, { index: number, low: number, onStack: boolean }>} */
  const seen = new Map();
  /** @type {string[]} */
  const stack = [];
  /** @type {Set<string>[]} */
  const knots = [];

  /** @param {string} node */
  const visit = (node) => {
    const mark = { index: seen.size, low: seen.size, onStack: true };
    seen.set(node, mark);
    stack.push(node);
    for (const next of graph.get(node) ?? []) {
      const other = seen.get(next);
      if (other === undefined) mark.low = Math.min(mark.low, visit(next).low);
      else if (other.onStack) mark.low = Math.min(mark.low, other.index);
    }
    if (mark.low === mark.index) {
      const members = stack.splice(stack.indexOf(node));
      for (const member of members) {
        const memberMark = seen.get(member);
        if (memberMark) memberMark.onStack = false;
      }
      knots.push(new Set(members));
    }
    return mark;
  };

  for (const node of graph.keys()) if (!seen.has(node)) visit(node);
  return knots;
};

/** The shortest closed path from the knot's first node, breadth first. @param {Map<string, string[]>} graph @param {Set<string>} knot @returns {string[]} */
const wayRound = (graph, knot) => {
  const start = [...knot].sort()[0] ?? '';
  let paths = [[start]];
  const visited = new Set();
  while (paths.length > 0) {
    /** @type {string[][]} */
    const longer = [];
    for (const path of paths) {
      for (const next of graph.get(path.at(-1) ?? '') ?? []) {
        if (next === start) return [...path, start];
        if (!knot.has(next) || visited.has(next)) continue;
        visited.add(next);
        longer.push([...path, next]);
      }
    }
    paths = longer;
  }
  return [start];
};
