import type { FormProblem } from './form-reading';

const SYMBOL =
  'A symbol is letters and digits, a letter first, and after one _ its subscript, as in rho or rho_L.';
const NAME = 'Small letters and digits, in words joined by single hyphens.';

const BY_MEMBER: Readonly<Record<string, string>> = {
  symbol: SYMBOL,
  on: SYMBOL,
  key: NAME,
  name: NAME,
  geometry: NAME,
  year: 'A year from 1800 to 2100, or none.',
  tolerancePercent: 'More than 0 and at most 50 %.',
  valuePercent: 'More than 0 %, or nothing.',
  reach: 'A factor above 1 and up to 1000.',
  pieces: 'Pieces are two at least; one alone is a single expression.',
  authors: 'One to twelve surnames.',
  quantities: 'A sheet has one symbol at least.',
  sources: 'A sheet has one source at least.',
  checks: 'A sheet has one worked check at least.',
  parts: 'A sheet has one part at least.',
  rows: 'A table has one row at least.',
  when: 'A piece has one condition at least.',
};

/** The structural check's fault at a field, said the way the form speaks. */
export function structuralWords({ field, message }: FormProblem): string {
  const last = field.split('.').at(-1) ?? field;
  const member = last.replace(/\[\d+\]$/, '');
  const words = BY_MEMBER[member];
  const isText = member === 'name' && /^(groups|intermediates)\[/.test(field);
  if (words !== undefined && !isText) return words;
  const tooLong = /less or equal to (\d+)/.exec(message)?.[1];
  if (tooLong !== undefined && message.includes('length')) return `At most ${tooLong} characters or entries.`;
  return `This ${message}`;
}
