import katex from 'katex';
import { describe, expect, test } from 'vitest';
import { OFFERED } from '../quantity/unit-choices.js';
import { definitionTex, propertyTex } from '../sheet/definition-tex.js';
import {
  aRequest,
  aSheet,
  compiled,
  compiledEquation,
  idealDensity,
  numbersOf,
  partWith,
  STAGNANT_PART,
} from '../testing/a-sheet.js';
import { unitTex, valueTex, valueText } from './explain.js';

function typeset(tex: string): string {
  return katex.renderToString(tex, { throwOnError: true, strict: 'error' });
}

describe('units as they are set', () => {
  test.each([
    ['m/s', '\\mathrm{m/s}'],
    ['kg/(m^2 s)', '\\mathrm{kg/(m^{2}\\,s)}'],
    ['m^-1', '\\mathrm{m^{-1}}'],
    ['uPa s', '\\mathrm{\\mu Pa\\,s}'],
    ['µm', '\\mathrm{\\mu m}'],
    ['mol/(ug s)', '\\mathrm{mol/(\\mu g\\,s)}'],
    ['u', '\\mathrm{u}'],
  ])('%s', (unit, expected) => {
    expect(unitTex(unit)).toBe(expected);
  });

  test.each(OFFERED.map((unit) => [unit]))('%s is set by KaTeX in its strictest mode', (unit) => {
    expect(typeset(valueTex(12.3, unit))).toContain('katex');
  });

  test('values in words', () => {
    expect(valueText(0.0123456, 'm/s')).toBe('0.01235 m/s');
    expect(valueText(12345, '1')).toBe('12\u2009350');
    expect(valueTex(0.5, '1')).toBe('0.5');
  });
});

describe('everything that is set can be set', () => {
  const request = aRequest(
    {
      rho: null,
      T: { value: 25, unit: 'degC' },
      P: { value: 1, unit: 'atm' },
      p_BM: { value: 99, unit: 'kPa' },
    },
    {
      equations: { rho: 'ideal-density' },
      rows: { gas: 'air' },
      drivingForce: { kind: 'mole-fraction', interface: { value: 0.03 }, bulk: { value: 0.01 } },
    },
  );

  test('each step of an evaluation, in symbols and with numbers', () => {
    const numbers = numbersOf(aSheet({ parts: [STAGNANT_PART] }), request);
    expect(new Set(numbers.steps.map(({ kind }) => kind))).toEqual(
      new Set(['property', 'group', 'result', 'coefficient', 'conversion', 'flux']),
    );
    for (const { tex, texWithNumbers, symbolTex } of numbers.steps)
      for (const formula of [tex, texWithNumbers, symbolTex]) expect(typeset(formula)).toContain('katex');
  });

  test('the definition, with its pieces', () => {
    const sheet = aSheet({
      parts: [
        partWith({
          expression: undefined,
          pieces: [
            { title: 'below', when: [{ on: 'Re', hi: 1e4 }], expression: '0.6*Re^0.5*Sc^(1/3)' },
            {
              when: [
                { on: 'Re', lo: 1e4, hi: 1e7, hiClosed: true },
                { on: 'Sc', lo: 0.5, loClosed: false },
              ],
              expression: '0.02*Re^0.8',
            },
          ],
        }),
      ],
    });
    const tex = definitionTex(compiled(sheet));
    expect(
      tex.groups.map(({ symbol, symbolTex, formulas }) => [symbol, symbolTex, formulas[0]?.tex]),
    ).toEqual([
      ['Re', '\\mathrm{Re}', '\\frac{\\rho \\, u \\, d}{\\mu}'],
      ['Sc', '\\mathrm{Sc}', '\\frac{\\mu}{\\rho \\, D}'],
    ]);
    const [part] = tex.parts;
    expect(part?.result.formulas).toEqual([
      {
        tex: '0.6 \\, {\\mathrm{Re}}^{0.5} \\, {\\mathrm{Sc}}^{1/3}',
        whenTex: '\\mathrm{Re} < 10\\,000',
        title: 'below',
      },
      {
        tex: '0.02 \\, {\\mathrm{Re}}^{0.8}',
        whenTex: '10\\,000 \\le \\mathrm{Re} \\le 1\\times 10^{7},\\ \\mathrm{Sc} > 0.5',
        title: null,
      },
    ]);
    expect(part?.coefficient?.formulas[0]?.tex).toBe('\\frac{\\mathrm{Sh} \\, D}{d}');
    for (const { tex: formula, whenTex } of part?.result.formulas ?? [])
      for (const set of [formula, whenTex ?? '']) expect(typeset(set)).toContain('katex');
  });

  test('a property equation', () => {
    const tex = propertyTex(compiledEquation('ideal-density', idealDensity()));
    expect(tex.answer?.formulas[0]?.tex).toBe('\\frac{P \\, M}{R \\, T}');
    expect(tex.intermediates).toEqual([]);
  });

  test('what the sheet says about its symbols goes first', () => {
    const sheet = aSheet({
      quantities: aSheet().quantities.map((q) => (q.symbol === 'u' ? { ...q, tex: 'u_{\\mathrm{g}}' } : q)),
    });
    expect(numbersOf(sheet, aRequest()).steps[0]?.tex).toContain('u_{\\mathrm{g}}');
  });
});
