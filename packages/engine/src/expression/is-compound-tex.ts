const BRACES = String.raw`\{(?:[^{}]|\{[^{}]*\})*\}`;
const ONE_LETTER = new RegExp(
  String.raw`^(?:\\[A-Za-z]+(?:${BRACES})?|[A-Za-z])(?:_(?:${BRACES}|\\[A-Za-z]+|[A-Za-z0-9]))?$`,
);

/**
 * Whether a symbol is set as more than one letter with its subscript, such as `d/L`, `k_{L}a` or `x^{*}`:
 * under a power it needs brackets then, or it would be read as another formula.
 */
export function isCompoundTex(tex: string): boolean {
  return !ONE_LETTER.test(tex) && !/^\([^()]*\)$/.test(tex);
}
