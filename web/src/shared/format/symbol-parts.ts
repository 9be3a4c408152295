const GREEK: Record<string, string> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  epsilon: 'ε',
  eps: 'ε',
  zeta: 'ζ',
  eta: 'η',
  theta: 'θ',
  kappa: 'κ',
  lambda: 'λ',
  mu: 'µ',
  nu: 'ν',
  xi: 'ξ',
  rho: 'ρ',
  sigma: 'σ',
  tau: 'τ',
  phi: 'φ',
  chi: 'χ',
  psi: 'ψ',
  omega: 'ω',
  Gamma: 'Γ',
  Delta: 'Δ',
  Theta: 'Θ',
  Lambda: 'Λ',
  Sigma: 'Σ',
  Phi: 'Φ',
  Psi: 'Ψ',
  Omega: 'Ω',
};

/** A symbol's body and subscript for setting it without KaTeX: `mu_w` gives µ and w; groups such as Re stay upright. */
export function symbolParts(symbol: string): { body: string; subscript: string | null; upright: boolean } {
  const [head = symbol, ...rest] = symbol.split('_');
  const subscript = rest.length ? rest.map((part) => GREEK[part] ?? part).join('_') : null;
  return { body: GREEK[head] ?? head, subscript, upright: !(head in GREEK) && head.length > 1 };
}

/** The symbol in one line of plain text: `µ_w`. */
export function symbolText(symbol: string): string {
  const { body, subscript } = symbolParts(symbol);
  return subscript === null ? body : `${body}_${subscript}`;
}
