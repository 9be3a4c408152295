/** Members of a sheet's definition as they are called in a sentence. One without words of its own is read as it is. */
const WORDS: Readonly<Record<string, string>> = {
  drivingForce: 'driving force of the data',
  propertyState: 'state of the properties',
  wall: 'condition at the wall',
  is: 'what it stands for',
  at: 'state',
  tex: 'typeset form',
  equations: 'property equations',
  when: 'conditions',
  on: 'symbol',
  lo: 'lower limit',
  hi: 'upper limit',
  closed: 'whether the limit belongs to the range',
  loClosed: 'whether the lower limit belongs to it',
  hiClosed: 'whether the upper limit belongs to it',
  reach: 'reach of a deviation',
  beyond: 'sheets on the other side',
  place: 'place in the source',
  per: 'per area or volume',
  rateForm: 'form of the rate',
  dimensional: 'whether its constant carries units',
  valuePercent: 'figure in per cent',
  of: 'of what',
  csl: 'citation',
  gives: 'what the source gave',
  read: 'whether the source was read',
  tolerancePercent: 'tolerance in per cent',
  inputs: 'inputs',
  expected: 'expected values',
  rows: 'rows',
  'container-title': 'journal or book',
  issued: 'date',
  page: 'pages',
};

export function memberWords(member: string): string {
  return WORDS[member] ?? member;
}
