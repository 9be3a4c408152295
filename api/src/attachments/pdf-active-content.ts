import { inflateSync } from 'node:zlib';
import { ACTIVE_CONTENT, type ActiveContent } from '../common/attachment.js';

/** Names of PDF dictionaries (ISO 32000) that make something happen, or that carry a file along. */
const ACTIVE_NAMES: ReadonlyMap<string, ActiveContent> = new Map([
  ['JavaScript', 'script'],
  ['JS', 'script'],
  ['Launch', 'launch'],
  ['EmbeddedFile', 'embedded-file'],
  ['EmbeddedFiles', 'embedded-file'],
  ['GoToE', 'embedded-file'],
  ['OpenAction', 'open-action'],
  ['AA', 'event-action'],
  ['RichMedia', 'rich-media'],
  ['Rendition', 'rich-media'],
  ['Movie', 'rich-media'],
  ['XFA', 'form'],
  ['SubmitForm', 'form'],
  ['ImportData', 'form'],
]);
/** So short that they turn up in compressed data by chance. */
const SHORTEST_IN_DATA = 6;

/** A stream's dictionary is right before it; what is further off is not looked at for its kind. */
const LONGEST_DICTIONARY = 4096;

/** How much of object streams is unpacked: no more than a large document has, no less than a bomb wants. */
const MOST_STREAMS = 5000;
const MOST_UNPACKED_EACH = 8 * 1024 * 1024;
const MOST_UNPACKED = 48 * 1024 * 1024;

/**
 * What of a PDF would act. A mark for people, not a proof of harmlessness: a file is never shown by the server itself.
 * Looks through dictionaries, through object streams unpacked, and for the longer names through everything.
 */
export function pdfActiveContent(bytes: Buffer): ActiveContent[] {
  const text = bytes.toString('latin1');
  const found = new Set(namesIn(text, SHORTEST_IN_DATA));
  const { outside, packed } = takeApart(text);
  for (const kind of namesIn(outside)) found.add(kind);
  let room = MOST_UNPACKED;
  for (const [i, { from, to, dictionary }] of packed.entries()) {
    const unpacked =
      i < MOST_STREAMS && room > 0 ? unpack(bytes.subarray(from, to), dictionary, room) : undefined;
    if (unpacked === undefined) {
      found.add('not-inspected');
      continue;
    }
    room -= unpacked.length;
    for (const kind of namesIn(unpacked)) found.add(kind);
  }
  return ACTIVE_CONTENT.filter((kind) => found.has(kind));
}

interface ObjectStream {
  readonly from: number;
  readonly to: number;
  readonly dictionary: string;
}

/** The text outside of streams, and the streams that hold objects. */
function takeApart(text: string): { outside: string; packed: ObjectStream[] } {
  const outside: string[] = [];
  const packed: ObjectStream[] = [];
  const start = /stream\r?\n/g;
  let done = 0;
  for (let found = start.exec(text); found !== null; found = start.exec(text)) {
    const between = text.slice(done, found.index);
    outside.push(between);
    const from = found.index + found[0].length;
    const end = text.indexOf('endstream', from);
    const to = end < 0 ? text.length : end;
    const dictionary = decoded(between.slice(-LONGEST_DICTIONARY));
    if (/\/ObjStm(?![A-Za-z0-9])/.test(dictionary)) packed.push({ from, to, dictionary });
    done = end < 0 ? text.length : end + 'endstream'.length;
    start.lastIndex = done;
  }
  outside.push(text.slice(done));
  return { outside: outside.join(' '), packed };
}

const FLATE_ALONE = /\/Filter\s*(?:\[\s*\/Fl(?:ateDecode)?\s*\]|\/Fl(?:ateDecode)?(?![A-Za-z0-9]))/;

function unpack(data: Buffer, dictionary: string, room: number): string | undefined {
  if (!dictionary.includes('/Filter')) return data.toString('latin1');
  if (!FLATE_ALONE.test(dictionary)) return undefined;
  try {
    return inflateSync(data, { maxOutputLength: Math.min(MOST_UNPACKED_EACH, room) }).toString('latin1');
  } catch {
    return undefined;
  }
}

function namesIn(text: string, shortest = 1): Set<ActiveContent> {
  const kinds = new Set<ActiveContent>();
  const add = (name: string): void => {
    const kind = name.length < shortest ? undefined : ACTIVE_NAMES.get(name);
    if (kind !== undefined) kinds.add(kind);
  };
  for (const [, name = ''] of text.matchAll(PLAIN_NAME)) add(name);
  let escaped = 0;
  for (const [, name = ''] of text.matchAll(ESCAPED_NAME)) {
    escaped += 1;
    if (escaped > MOST_ESCAPED) return kinds.add('not-inspected');
    add(decoded(name));
  }
  return kinds;
}

const PLAIN_NAME = new RegExp(`/(${[...ACTIVE_NAMES.keys()].join('|')})(?![A-Za-z0-9#])`, 'g');
const ESCAPED_NAME = /\/([A-Za-z0-9]{0,16}(?:#[0-9A-Fa-f]{2}[A-Za-z0-9]{0,16}){1,16})(?![A-Za-z0-9#])/g;
/** No program writes so many; they would only be there to hide among. */
const MOST_ESCAPED = 100_000;

/** A name may write any of its characters as # and two digits. */
function decoded(text: string): string {
  if (!text.includes('#')) return text;
  return text.replace(/#([0-9A-Fa-f]{2})/g, (_, hex: string) =>
    String.fromCharCode(Number.parseInt(hex, 16)),
  );
}
