import { checkpointText } from './checkpoint-text.js';
import type { CheckpointRow, JournalRow, KeyRow } from './journal.repository.js';
import { leafHash, nodeHash } from './merkle-tree.js';
import { keyIdOf, signatureHolds } from './signing-key.js';

export type FaultKind = 'altered' | 'missing' | 'inserted' | 'tree' | 'checkpoint';

export interface Fault {
  /** The entry concerned; of a checkpoint the last entry that it covers. */
  readonly index: number;
  readonly kind: FaultKind;
  readonly message: string;
}

/** Where the verification reads from, in pages, so that a long journal does not have to fit into memory. */
export interface JournalSource {
  from(index: number, limit: number): JournalRow[];
  nodes(level: number, position: number, limit: number): { position: number; hash: Buffer }[];
  checkpoints(): CheckpointRow[];
  keys(): KeyRow[];
}

export interface Verification {
  readonly ok: boolean;
  readonly entries: number;
  readonly firstFault?: Fault;
}

/**
 * Recomputes every leaf from its entry and holds it against the stored hashes, the hashes against each other, and the
 * signed checkpoints against the recomputed tree. Names the first entry that was altered, removed or put in.
 */
export function verifyJournal(source: JournalSource): Verification {
  const tree = new GrowingTree(source);
  const checkpoints = new Map(source.checkpoints().map((row) => [row.size, row]));
  const last = Math.max(0, ...checkpoints.keys());
  const fail = (fault: Fault): Verification => ({ ok: false, entries: tree.size, firstFault: fault });

  for (const row of rowsOf(source)) {
    const fault = faultOfRow(row, tree, source) ?? tree.add(row);
    if (fault !== undefined) return fail(fault);
    const checkpoint = checkpoints.get(tree.size);
    const broken = checkpoint && faultOfCheckpoint(checkpoint, tree, source.keys());
    if (broken !== undefined) return fail(broken);
  }
  if (tree.size < last || source.nodes(0, tree.size, 1).length > 0) return fail(missing(tree.size));
  return { ok: true, entries: tree.size };
}

const PAGE = 1000;
const LOWEST_ROWID = -(2 ** 63);

function* rowsOf(source: JournalSource): Generator<JournalRow> {
  // An entry that was put in may stand before the first, too.
  let next = LOWEST_ROWID;
  for (;;) {
    const page = source.from(next, PAGE);
    yield* page;
    const final = page.at(-1);
    if (final === undefined || page.length < PAGE) return;
    next = final.index + 1;
  }
}

/** The stored hashes of one level, asked for in order, read in pages. */
class StoredLevel {
  private page = new Map<number, Buffer>();
  private pageEnd = 0;

  constructor(
    private readonly source: JournalSource,
    private readonly level: number,
  ) {}

  at(position: number): Buffer | undefined {
    if (position >= this.pageEnd) {
      const rows = this.source.nodes(this.level, position, PAGE);
      this.page = new Map(rows.map((row) => [row.position, row.hash]));
      this.pageEnd = position + PAGE;
    }
    return this.page.get(position);
  }
}

/** The tree over the entries read so far, kept as its complete subtrees, each held against the stored hash. */
class GrowingTree {
  size = 0;
  private readonly peaks: { level: number; hash: Buffer }[] = [];
  private readonly levels: StoredLevel[] = [];

  constructor(private readonly source: JournalSource) {}

  stored(level: number, position: number): Buffer | undefined {
    return (this.levels[level] ??= new StoredLevel(this.source, level)).at(position);
  }

  /** Adds a leaf that was found right. Returns a fault when a stored hash above it is not what follows from below. */
  add(row: JournalRow): Fault | undefined {
    let hash = leafHash(row.entry);
    let position = row.index;
    for (let level = 0; ; level += 1) {
      if (this.stored(level, position)?.equals(hash) !== true) return treeFault(row.index, level);
      const left = this.peaks.at(-1);
      if (left?.level !== level) {
        this.peaks.push({ level, hash });
        break;
      }
      this.peaks.pop();
      hash = nodeHash(left.hash, hash);
      position = (position - 1) / 2;
    }
    this.size = row.index + 1;
    return undefined;
  }

  root(): string | undefined {
    return this.peaks
      .map(({ hash }) => hash)
      .reduceRight<Buffer | undefined>((right, left) => (right ? nodeHash(left, right) : left), undefined)
      ?.toString('hex');
  }
}

function faultOfRow(row: JournalRow, tree: GrowingTree, source: JournalSource): Fault | undefined {
  const index = tree.size;
  if (row.index > index) return missing(index);
  if (row.index < index) return inserted(row.index);
  const leaf = tree.stored(0, index);
  if (leaf === undefined) return inserted(index);
  const hash = leafHash(row.entry);
  if (leaf.equals(hash)) return undefined;
  // Rows may have been moved up or down, so that a neighbour stands in this place.
  const [following] = source.nodes(0, index + 1, 1);
  if (following?.hash.equals(hash) === true) return missing(index);
  const [next] = source.from(index + 1, 1);
  if (next !== undefined && leaf.equals(leafHash(next.entry))) return inserted(index);
  return { index, kind: 'altered', message: `Entry ${index} is not what was written.` };
}

function missing(index: number): Fault {
  return { index, kind: 'missing', message: `Entry ${index} was written and is no longer there.` };
}

function inserted(index: number): Fault {
  return { index, kind: 'inserted', message: `Entry ${index} was not written by the journal.` };
}

function treeFault(index: number, level: number): Fault {
  return {
    index,
    kind: 'tree',
    message: `The stored hash over ${2 ** level} entries that ends with entry ${index} does not follow from them.`,
  };
}

function faultOfCheckpoint(
  row: CheckpointRow,
  tree: GrowingTree,
  keys: readonly KeyRow[],
): Fault | undefined {
  const fault = (message: string): Fault => ({ index: row.size - 1, kind: 'checkpoint', message });
  if (row.root !== tree.root()) {
    return fault(`The first ${row.size} entries are not those of the checkpoint signed ${row.at}.`);
  }
  const key = keys.find(({ keyId }) => keyId === row.keyId);
  const signed =
    key !== undefined &&
    keyIdOf(key.pem) === row.keyId &&
    row.text === checkpointText(row) &&
    signatureHolds(row.text, row.signature, key.pem);
  return signed
    ? undefined
    : fault(`The signature of the checkpoint over ${row.size} entries does not hold.`);
}
