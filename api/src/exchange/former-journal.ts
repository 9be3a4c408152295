import type { FieldProblem } from '../common/problem.js';
import { leafHash, nodesOnAppend } from '../journal/merkle-tree.js';
import { verifyJournal, type JournalSource } from '../journal/verify-journal.js';
import { isCanonical } from './register-faults.js';
import type { ExchangedJournal } from './register-format.js';

/** Holds a journal that came along against its own signed checkpoints. At most one fault: what follows rests on it. */
export function journalFaults(journal: ExchangedJournal, path: string): FieldProblem[] {
  const fault = (place: string, message: string): FieldProblem[] => [
    { field: `${path}.${place}`, code: 'malformed', message },
  ];
  const odd = journal.entries.findIndex((text, index) => !isEntry(text, index));
  if (odd >= 0) return fault(`entries.${odd}`, 'This is not the entry that belongs here.');
  try {
    const { firstFault } = verifyJournal(sourceOf(journal));
    return firstFault === undefined ? [] : fault(`entries.${firstFault.index}`, firstFault.message);
  } catch {
    return fault('keys', 'The keys of the journal cannot be read.');
  }
}

function isEntry(text: string, index: number): boolean {
  return isCanonical(text) && (JSON.parse(text) as { index?: unknown }).index === index;
}

/** The journal with the hashes that follow from its entries, so that only the checkpoints can contradict it. */
function sourceOf({ entries, checkpoints, keys }: ExchangedJournal): JournalSource {
  const levels: Buffer[][] = [];
  const lookup = (level: number, position: number): Buffer => {
    const hash = levels[level]?.[position];
    if (hash === undefined) throw new RangeError('A hash of the tree is not there.');
    return hash;
  };
  for (const [index, text] of entries.entries()) {
    for (const { level, position, hash } of nodesOnAppend(index, leafHash(text), lookup)) {
      (levels[level] ??= [])[position] = hash;
    }
  }
  return {
    from: (index, limit) => {
      const start = Math.max(0, index);
      return entries.slice(start, start + limit).map((entry, i) => ({ index: start + i, entry }));
    },
    nodes: (level, position, limit) =>
      (levels[level] ?? [])
        .slice(position, position + limit)
        .map((hash, i) => ({ position: position + i, hash })),
    checkpoints: () => checkpoints,
    keys: () => keys,
  };
}
