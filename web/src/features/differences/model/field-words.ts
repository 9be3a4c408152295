import type { CorrelationDefinition } from '@merestone/engine';
import { memberWords } from '../../../shared/format/member-words';
import {
  AVERAGING_WORDS,
  BASIS_WORDS,
  FORCE_WORDS,
  NATURE_WORDS,
  READ_WORDS,
  STATE_WORDS,
  VERIFICATION_WORDS,
  WALL_WORDS,
} from '../../../shared/format/plain-words';
import { symbolOnSheet } from '../../../shared/format/symbol-on-sheet';
import { symbolText } from '../../../shared/format/symbol-parts';
import { pathSteps } from './path-steps';

const ENTRIES: Readonly<Record<string, string>> = {
  restrictions: 'restriction',
  cautions: 'caution',
  sources: 'source',
  stretches: 'stretch',
  pieces: 'piece',
  authors: 'author',
  author: 'author',
  when: 'condition',
  parts: 'part',
  tables: 'table',
  rows: 'row',
  checks: 'check',
  equations: 'property equation',
};
const SYMBOLS = new Set(['quantities', 'groups', 'intermediates', 'bounds']);

/** A path in a definition as it is called in a sentence: `Gas density, ρ: unit`; `Caution 2`. */
export function fieldWords(path: string, definition: CorrelationDefinition): string {
  const steps = pathSteps(path);
  if (!steps) return path;
  const words: string[] = [];
  let list = '';
  for (const step of steps) {
    if ('member' in step) {
      list = step.member;
      if (!nextIsEntry(steps, step)) words.push(memberWords(step.member));
    } else words.push(entryWords(list, step.entry, definition));
  }
  const [first = '', ...others] = words;
  const start = first.charAt(0).toUpperCase() + first.slice(1);
  return others.length === 0 ? start : `${start}: ${others.join(', ')}`;
}

function nextIsEntry<T>(steps: readonly T[], step: T): boolean {
  const next = steps[steps.indexOf(step) + 1];
  return typeof next === 'object' && next !== null && 'entry' in next;
}

function entryWords(list: string, entry: string, definition: CorrelationDefinition): string {
  if (SYMBOLS.has(list)) return `${symbolOnSheet(definition, entry).name}, ${symbolText(entry)}`;
  const noun = ENTRIES[list] ?? memberWords(list);
  return /^\d+$/.test(entry) ? `${noun} ${Number(entry) + 1}` : `${noun} “${entry.replaceAll('-', ' ')}”`;
}

const CODED: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  averaging: AVERAGING_WORDS,
  wall: WALL_WORDS,
  drivingForce: FORCE_WORDS,
  propertyState: STATE_WORDS,
  nature: NATURE_WORDS,
  status: VERIFICATION_WORDS,
  read: READ_WORDS,
};

/** A coded value in the sheet's own words; free text and what has no words is given back as it is. */
export function valueWords(path: string, value: string): string {
  const member = /([A-Za-z]+)$/.exec(path)?.[1] ?? '';
  if (member === 'basis' && path.startsWith('bounds'))
    return Object.hasOwn(BASIS_WORDS, value) ? BASIS_WORDS[value as keyof typeof BASIS_WORDS] : value;
  const words = Object.hasOwn(CODED, member) ? CODED[member] : undefined;
  return words && Object.hasOwn(words, value) ? (words[value] ?? value) : value;
}
