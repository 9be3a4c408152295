const GREEK = new Set([
  'alpha',
  'beta',
  'gamma',
  'delta',
  'eps',
  'epsilon',
  'zeta',
  'eta',
  'theta',
  'kappa',
  'lambda',
  'mu',
  'nu',
  'xi',
  'pi',
  'rho',
  'sigma',
  'tau',
  'phi',
  'chi',
  'psi',
  'omega',
  'Gamma',
  'Delta',
  'Theta',
  'Lambda',
  'Sigma',
  'Phi',
  'Psi',
  'Omega',
]);
/** Dimensionless numbers are set upright (ISO 80000-11 sets them in italics; two-letter names read better upright, as handbooks do). */
const UPRIGHT = /^(Re|Sc|Sh|Pe|Gr|Ra|Ga|We|Fr|Gz|Le|St|Nu|Pr|Bo|Eo|Ca|Mo|Bi|Fo|Da|Ar|Ta)$/;

/** A coefficient times interfacial area, written `k_La` in expressions, is a product in print. */
const VOLUMETRIC = /^(k_[cGyLx])a$/;

/** TeX of a symbol: Greek by name (`eps` for short), what follows `_` as subscript, numbers such as Re upright. */
export function symbolTex(symbol: string, override?: string): string {
  if (override) return override;
  const volumetric = VOLUMETRIC.exec(symbol)?.[1];
  if (volumetric) return `${symbolTex(volumetric)}\\,a`;
  const [head = symbol, sub] = symbol.split('_');
  const { letter, tail } = split(head);
  const subscript = [tail, sub]
    .filter(Boolean)
    .map((text) => subscriptTex(text ?? ''))
    .join(',');
  return subscript ? `${letter}_{${subscript}}` : letter;
}

function split(head: string): { letter: string; tail: string } {
  if (GREEK.has(head)) return { letter: greek(head), tail: '' };
  if (UPRIGHT.test(head)) return { letter: `\\mathrm{${head}}`, tail: '' };
  const match = /^([A-Za-z])(\d+)$/.exec(head);
  if (match?.[1]) return { letter: match[1], tail: match[2] ?? '' };
  return head.length === 1 ? { letter: head, tail: '' } : { letter: `\\mathit{${head}}`, tail: '' };
}

function greek(name: string): string {
  if (name === 'epsilon' || name === 'eps') return '\\varepsilon';
  if (name === 'phi') return '\\varphi';
  return `\\${name}`;
}

function subscriptTex(text: string): string {
  if (GREEK.has(text)) return greek(text);
  return text.length === 1 ? text : `\\mathrm{${text}}`;
}
