import { describe, expect, it } from 'vitest';
import { isCompoundTex } from './is-compound-tex.js';
import { symbolTex } from './symbol-tex.js';

describe('a symbol under a power', () => {
  it.each(['d_e/L', 'H/d', '\\mu/\\mu_w', 'k_{L}a', 'x^{*}', '\\Delta\\rho', '\\sin(\\theta/2)'])(
    'needs brackets as %s',
    (tex) => {
      expect(isCompoundTex(tex)).toBe(true);
    },
  );

  it.each(['d', 'd_p', '\\ell', '\\Gamma', 'F_{a}', '\\mathrm{Re}_{L,w}', '(\\Delta p/\\Delta z)'])(
    'needs none as %s',
    (tex) => {
      expect(isCompoundTex(tex)).toBe(false);
    },
  );

  it.each(['rho', 'p_BM', 'Re_Lw', 'kappa', 'T_G', 'D12', 'phi_w', 'sigma_c'])(
    'needs none where it is set from its own name: %s',
    (symbol) => {
      expect(isCompoundTex(symbolTex(symbol))).toBe(false);
    },
  );
});
