import type { Bound, BoundNature, CorrelationDefinition, Source } from '@merestone/engine';

type Definition = CorrelationDefinition;

/** What each coded word of a sheet means, said plainly. */
export const VERIFICATION_WORDS: Readonly<Record<Definition['verification']['status'], string>> = {
  'published-example': 'Recomputed from a published worked example.',
  'expression-seen': 'Expression seen in a source.',
  'from-memory': 'From memory, to be checked against the source.',
};

export const NATURE_WORDS: Readonly<Record<BoundNature, string>> = {
  data: 'where the data end',
  regime: 'change of regime',
  definition: 'edge of the formula’s meaning',
  physical: 'physically possible values',
};

export const BASIS_WORDS: Readonly<Record<Bound['basis'], string>> = {
  stated: 'stated in the source',
  handbook: 'from a handbook',
  'common-practice': 'common practice, no source',
  none: 'no bound on record',
};

export const READ_WORDS: Readonly<Record<Source['read'], string>> = {
  seen: 'The source was seen.',
  memory: 'From memory, the source was not seen.',
};

export const STATE_WORDS: Readonly<Record<Definition['propertyState'], string>> = {
  film: 'Properties at the film, midway between interface and bulk.',
  bulk: 'Properties of the bulk.',
  interface: 'Properties at the interface.',
  inlet: 'Properties at the inlet.',
  'not-stated': 'The source does not say at which state properties are taken.',
};

export const AVERAGING_WORDS: Readonly<Record<Definition['averaging'], string>> = {
  average: 'mean over the surface',
  local: 'local value',
  'not-stated': 'not said whether local or mean',
};

export const WALL_WORDS: Readonly<Record<Definition['wall'], string>> = {
  'constant-concentration': 'constant concentration at the surface',
  'constant-flux': 'constant flux at the surface',
  'not-applicable': 'no wall condition applies',
  'not-stated': 'wall condition not stated',
};

export const FORCE_WORDS: Readonly<Record<Definition['drivingForce'], string>> = {
  local: 'reduced with the local driving force',
  'log-mean': 'reduced with the log-mean driving force',
  inlet: 'reduced with the driving force at the inlet',
  'not-stated': 'driving force of the data not stated',
};

const STATISTIC_WORDS: Readonly<Record<NonNullable<Definition['accuracy']>['statistic'], string>> = {
  max: 'at most',
  mean: 'mean deviation',
  rms: 'root-mean-square deviation',
  '95 %': 'for 95 % of the data',
  'not-stated': 'statistic not stated',
};

/** `±20 % (mean deviation) of Sh, 128 points.` */
export function accuracyText(accuracy: Definition['accuracy']): string {
  if (accuracy === null) return 'No accuracy is on record.';
  const { valuePercent, statistic, of, text } = accuracy;
  const figure =
    valuePercent === null
      ? ''
      : `±${valuePercent} % (${STATISTIC_WORDS[statistic]})${of ? ` of ${of}` : ''}. `;
  return `${figure}${text}`;
}

/** The accuracy as it stands beside a result: where there is a figure, with what it does not cover. */
export function accuracyOfResult(accuracy: Definition['accuracy']): string {
  const text = accuracyText(accuracy);
  return accuracy === null || accuracy.valuePercent === null
    ? text
    : `${text} This is about the published equation; how well the values put in are known comes on top.`;
}

/** What the result of a part is, by its kind. */
export const RESULT_WORDS: Readonly<Record<Definition['parts'][number]['result']['kind'], string>> = {
  Sherwood: 'Sherwood number',
  Stanton: 'Stanton number of mass transfer',
  'j-factor': 'j-factor of mass transfer',
  coefficient: 'coefficient as the source gives it',
  'volumetric-coefficient': 'volumetric coefficient as the source gives it',
  'interfacial-area': 'interfacial area per volume',
};

/** Nature and basis of a bound in words: `where the data end, stated in the source`. */
export function boundWords({ stretches, basis }: Bound): string {
  const ends = stretches.flatMap(({ lo, hi }) => [
    ...(lo ? [['lower', NATURE_WORDS[lo.nature]] as const] : []),
    ...(hi ? [['upper', NATURE_WORDS[hi.nature]] as const] : []),
  ]);
  const natures = new Set(ends.map(([, nature]) => nature));
  const nature =
    natures.size > 1 && stretches.length === 1
      ? ends.map(([side, words]) => `${side}: ${words}`).join('; ')
      : [...natures].join(', ');
  return nature ? `${nature}; ${BASIS_WORDS[basis]}` : BASIS_WORDS[basis];
}
