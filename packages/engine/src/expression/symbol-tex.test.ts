import katex from 'katex';
import { describe, expect, test } from 'vitest';
import { symbolTex } from './symbol-tex.js';

describe('symbols as they are set', () => {
  test.each([
    ['u', 'u'],
    ['rho', '\\rho'],
    ['epsilon', '\\varepsilon'],
    ['eps', '\\varepsilon'],
    ['phi', '\\varphi'],
    ['Delta', '\\Delta'],
    ['Re', '\\mathrm{Re}'],
    ['Sc', '\\mathrm{Sc}'],
    ['Re_p', '\\mathrm{Re}_{p}'],
    ['p_BM', 'p_{\\mathrm{BM}}'],
    ['k_c', 'k_{c}'],
    ['d2', 'd_{2}'],
    ['d2_out', 'd_{2,\\mathrm{out}}'],
    ['mu_w', '\\mu_{w}'],
    ['mu_rho', '\\mu_{\\rho}'],
    ['eps_G', '\\varepsilon_{G}'],
    ['x_0', 'x_{0}'],
    ['delta_12', '\\delta_{\\mathrm{12}}'],
    ['slope', '\\mathit{slope}'],
    ['jD', '\\mathit{jD}'],
    ['constructor', '\\mathit{constructor}'],
  ])('%s is set as %s', (symbol, expected) => {
    expect(symbolTex(symbol)).toBe(expected);
    expect(katex.renderToString(expected, { throwOnError: true, strict: 'error' })).toContain('katex');
  });

  test('what the sheet says goes first', () => {
    expect(symbolTex('p_BM', 'p_{B,\\mathrm{m}}')).toBe('p_{B,\\mathrm{m}}');
  });
});
