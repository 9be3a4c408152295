const SPACES = /[\u00a0 ]/;
const NARROW = /[.,:;'|ilj!()[\]\u00b7]/;
const RAISED = /[\u2070\u00b9\u00b2\u00b3\u2074-\u2079]/;
const WIDE = /[mwMW%@°×<>]/;

/** Width of a label in pixels, estimated a little on the wide side; measuring would need the font to be loaded first. */
export function textWidth(text: string, fontSize: number): number {
  let ems = 0;
  for (const char of text) ems += emsOf(char);
  return ems * fontSize;
}

function emsOf(char: string): number {
  if (SPACES.test(char)) return 0.25;
  if (RAISED.test(char)) return 0.42;
  if (NARROW.test(char)) return 0.3;
  if (WIDE.test(char)) return 0.8;
  return 0.55;
}
