import { compileCorrelation } from '@merestone/engine';
import { describe, expect, test } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { formOfDefinition } from './form-of-definition';
import { inputOfCheck, tryOut, tryOutFields } from './try-out';

const compilation = compileCorrelation(gillilandSherwood);
if (!compilation.ok) throw new Error('the sample does not compile');
const { compiled } = compilation;
const none = () => undefined;

describe('trying a draft out', () => {
  test('asks for every quantity, those of state only if somebody likes', () => {
    const fields = tryOutFields(compiled, { typed: {}, rows: {} });
    expect(fields.map(({ symbol }) => symbol)).toEqual(
      gillilandSherwood.quantities.map(({ symbol }) => symbol),
    );
    expect(fields.find(({ symbol }) => symbol === 'T')?.optional).toBe(true);
  });

  test('gives what a worked check expects, from the numbers of the check', () => {
    const [check] = formOfDefinition(gillilandSherwood, '').checks;
    const tried = tryOut(compiled, none, inputOfCheck(check!, compiled));
    expect(tried).toMatchObject({ state: 'outcome' });
    const [first] = gillilandSherwood.checks;
    const [[symbol, given]] = Object.entries(first!.expected) as [[string, { value: number }]];
    if (tried.state !== 'outcome' || tried.outcome.outcome === 'refused') throw new Error('no numbers');
    const { groups, result } = tried.outcome;
    const found = groups[symbol] ?? (result.symbol === symbol ? result.value : Number.NaN);
    expect(Math.abs(found / given.value - 1)).toBeLessThan(first!.tolerancePercent / 100);
  });

  test('says what cannot be read and what is missing', () => {
    const of = (text: string) => tryOut(compiled, none, { typed: { d: { text, unit: 'mm' } }, rows: {} });
    expect(of('')).toEqual({ state: 'empty' });
    expect(of('1,5')).toEqual({ state: 'problems', messages: ['d: Do you mean 1.5?'] });
    expect(of('50')).toMatchObject({ state: 'problems' });
  });
});
