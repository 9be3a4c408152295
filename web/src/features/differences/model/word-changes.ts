/** A stretch of a text: unchanged, taken out, or put in. */
export interface WordChange {
  kind: 'same' | 'out' | 'in';
  text: string;
}

/** Above this many pairs of words the middle is told as a whole; a sheet's longest text stays below. */
const MOST_PAIRS = 400_000;

/** What became of a text, word by word: the fewest words taken out and put in. */
export function wordChanges(before: string, after: string): WordChange[] {
  const old = words(before);
  const now = words(after);
  let start = 0;
  while (start < old.length && start < now.length && old[start] === now[start]) start += 1;
  let end = 0;
  while (
    end < old.length - start &&
    end < now.length - start &&
    old[old.length - 1 - end] === now[now.length - 1 - end]
  )
    end += 1;
  const middle = between(old.slice(start, old.length - end), now.slice(start, now.length - end));
  return joined([...old.slice(0, start).map(same), ...middle, ...old.slice(old.length - end).map(same)]);
}

/** Share of the later text that was there before, 0 to 1. */
export function shareKept(changes: readonly WordChange[]): number {
  const length = (kinds: readonly WordChange['kind'][]) =>
    changes.reduce((sum, { kind, text }) => sum + (kinds.includes(kind) ? text.length : 0), 0);
  return length(['same']) / Math.max(1, length(['same', 'in']), length(['same', 'out']));
}

/** A word with the space after it. */
function words(text: string): string[] {
  return text.match(/\S+\s*|\s+/g) ?? [];
}

function between(old: readonly string[], now: readonly string[]): WordChange[] {
  if (old.length * now.length > MOST_PAIRS) return [...old.map(out), ...now.map(put)];
  const lengths = commonLengths(old, now);
  const at = (i: number, j: number) => lengths[i]?.[j] ?? 0;
  const changes: WordChange[] = [];
  let [i, j] = [0, 0];
  while (i < old.length || j < now.length) {
    const [gone = '', come = ''] = [old[i], now[j]];
    if (i < old.length && j < now.length && gone === come) {
      changes.push(same(gone));
      i += 1;
      j += 1;
    } else if (j >= now.length || (i < old.length && at(i + 1, j) >= at(i, j + 1))) {
      changes.push(out(gone));
      i += 1;
    } else {
      changes.push(put(come));
      j += 1;
    }
  }
  return changes;
}

/** Length of the longest common subsequence of what is left from each pair of places on. */
function commonLengths(old: readonly string[], now: readonly string[]): Uint16Array[] {
  const lengths = Array.from({ length: old.length + 1 }, () => new Uint16Array(now.length + 1));
  for (let i = old.length - 1; i >= 0; i -= 1) {
    const [row, below] = [lengths[i], lengths[i + 1]];
    for (let j = now.length - 1; row && below && j >= 0; j -= 1)
      row[j] = old[i] === now[j] ? (below[j + 1] ?? 0) + 1 : Math.max(below[j] ?? 0, row[j + 1] ?? 0);
  }
  return lengths;
}

function joined(changes: readonly WordChange[]): WordChange[] {
  const stretches: WordChange[] = [];
  for (const { kind, text } of changes) {
    const last = stretches.at(-1);
    if (last?.kind === kind) last.text += text;
    else stretches.push({ kind, text });
  }
  return stretches;
}

const same = (text: string): WordChange => ({ kind: 'same', text });
const out = (text: string): WordChange => ({ kind: 'out', text });
const put = (text: string): WordChange => ({ kind: 'in', text });
