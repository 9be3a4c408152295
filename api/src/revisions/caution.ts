/** Stands, short, on every sheet and every result. */
export const CAUTION =
  'Results are estimates from published correlations. They do not replace vendor data, pilot tests, local codes and ' +
  'rules, or the judgement of the engineer who is responsible for the design under the law that applies (licensed ' +
  'where it so demands). "Approved" means: by this office, for the stated use.';
