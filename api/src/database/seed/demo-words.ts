/** What the demo office's signatures mean. */
export const DEMO_MEANING = 'Approved for design within its bounds (demo office)';
export const DEMO_REVIEW_NOTE =
  'Demo office: an invented review. Hold the sheet against its sources before real use.';
export const EVERYTHING_CHECKED = {
  expression: true,
  definitions: true,
  ranges: true,
  basis: true,
  recalculated: true,
  duplicates: true,
};
