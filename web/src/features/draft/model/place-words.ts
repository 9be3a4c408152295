import type { DraftForm } from './draft-form';

const LISTS: Readonly<Record<string, string>> = {
  quantities: 'Symbol',
  groups: 'Group',
  tables: 'Table',
  intermediates: 'Step',
  parts: 'Part',
  bounds: 'Bound',
  restrictions: 'Restriction',
  cautions: 'Caution',
  sources: 'Source',
  checks: 'Check',
};

const MEMBERS: Readonly<Record<string, string>> = {
  title: 'title',
  authors: 'authors',
  year: 'year',
  geometry: 'geometry',
  phase: 'phase',
  summary: 'summary',
  averaging: 'averaging',
  wall: 'condition at the wall',
  drivingForce: 'driving force',
  propertyState: 'property state',
  symbol: 'symbol',
  is: 'what it stands for',
  unit: 'unit',
  tex: 'typeset form',
  role: 'role',
  at: 'state',
  meaning: 'meaning',
  equations: 'property equations',
  table: 'table',
  name: 'name',
  expression: 'expression',
  pieces: 'pieces',
  when: 'conditions',
  on: 'symbol',
  lo: 'lower limit',
  hi: 'upper limit',
  value: 'value',
  nature: 'nature',
  reach: 'reach',
  beyond: 'sheets beyond',
  basis: 'basis',
  place: 'place',
  note: 'note',
  stretches: 'stretches',
  key: 'key',
  kind: 'kind',
  result: 'result',
  coefficient: 'coefficient',
  per: 'per area or volume',
  rateForm: 'rate form',
  valuePercent: 'figure in %',
  statistic: 'statistic',
  of: 'of what',
  text: 'text',
  csl: 'citation',
  DOI: 'DOI',
  gives: 'what it gave',
  read: 'read or from memory',
  inputs: 'inputs',
  expected: 'expected values',
  tolerancePercent: 'tolerance',
  status: 'status',
  label: 'label',
  rows: 'rows',
  values: 'values',
};

/** A place in the definition as people speak of it: `Group Re, expression`; `Source 2, place`. */
export function placeWords(path: string, form: DraftForm): string {
  const [head = '', ...rest] = path.split('.');
  const list = /^([A-Za-z]+)\[(\d+)\]$/.exec(head);
  if (!list) {
    const words = [head, ...rest].map(memberWords).filter(Boolean);
    return capital(words.join(', '));
  }
  const [, name = '', index = '0'] = list;
  const at = Number(index);
  return [`${LISTS[name] ?? name} ${nameOfRow(form, name, at)}`, ...rest.map(memberWords)]
    .filter(Boolean)
    .join(', ');
}

/** A row is called by its symbol where it has one, else by its place. */
function nameOfRow(form: DraftForm, list: string, at: number): string {
  const symbol =
    list === 'quantities' || list === 'groups' || list === 'intermediates'
      ? form[list][at]?.symbol
      : list === 'bounds'
        ? form.bounds[at]?.on
        : undefined;
  return symbol?.trim() || String(at + 1);
}

function memberWords(step: string): string {
  const [, name = step, index] = /^([A-Za-z]+)\[(\d+)\]$/.exec(step) ?? [];
  const words = MEMBERS[name] ?? name;
  return index === undefined ? words : `${words.replace(/(ch)?e?s$/, singularEnd)} ${Number(index) + 1}`;
}

/** `stretches` is one stretch, `pieces` one piece. */
function singularEnd(end: string): string {
  return end === 'ches' ? 'ch' : end === 'es' ? 'e' : '';
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
