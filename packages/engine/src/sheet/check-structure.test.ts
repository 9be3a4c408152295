import { describe, expect, test } from 'vitest';
import { checkPropertyStructure, checkStructure } from './check-structure.js';
import { aSheet, idealDensity } from '../testing/a-sheet.js';

/** A copy with one member changed, by path; `undefined` takes it away. */
function changed(path: (string | number)[], value: unknown, base: object = aSheet()): unknown {
  const copy: unknown = structuredClone(base);
  let at = copy as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) at = at[key] as Record<string | number, unknown>;
  const last = path.at(-1) ?? '';
  if (value === undefined) Reflect.deleteProperty(at, last);
  else at[last] = value;
  return copy;
}

function fieldsOf(value: unknown): string[] {
  const result = checkStructure(value);
  return result.ok ? [] : result.problems.map(({ field }) => field);
}

describe('the form of a sheet', () => {
  test('a sheet passes and comes back as it is', () => {
    const sheet = aSheet();
    expect(checkStructure(sheet)).toEqual({ ok: true, definition: sheet });
    expect(checkPropertyStructure(idealDensity()).ok).toBe(true);
  });

  test.each([
    ['another format', ['format'], 'merestone-sheet/2', 'format'],
    ['no title', ['title'], undefined, 'title'],
    ['an empty title', ['title'], '', 'title'],
    ['a title too long', ['title'], 'x'.repeat(301), 'title'],
    ['a number as title', ['title'], 3, 'title'],
    ['no authors', ['authors'], [], 'authors'],
    ['a year before print', ['year'], 1500, 'year'],
    ['a year with a fraction', ['year'], 1934.5, 'year'],
    ['a geometry that is no slug', ['geometry'], 'Wetted wall', 'geometry'],
    ['an unknown phase', ['phase'], 'plasma', 'phase'],
    ['no quantity', ['quantities'], [], 'quantities'],
    ['a symbol with a point', ['quantities', 0, 'symbol'], 'a.b', 'quantities[0].symbol'],
    [
      'a symbol of an inherited name with underscores',
      ['quantities', 0, 'symbol'],
      '__proto__',
      'quantities[0].symbol',
    ],
    ['a symbol that is not ASCII', ['quantities', 0, 'symbol'], 'ρ', 'quantities[0].symbol'],
    ['a symbol too long', ['quantities', 0, 'symbol'], 'x'.repeat(25), 'quantities[0].symbol'],
    ['an unknown property', ['quantities', 0, 'colour'], 'red', 'quantities[0].colour'],
    ['an unknown property at the top', ['approved'], true, 'approved'],
    ['an expression that is no text', ['groups', 0, 'expression'], 5, 'groups[0].expression'],
    ['an expression too long', ['groups', 0, 'expression'], 'x'.repeat(2001), 'groups[0].expression'],
    [
      'a limit that is no number',
      ['bounds', 0, 'stretches', 0, 'lo', 'value'],
      '2000',
      'bounds[0].stretches[0].lo.value',
    ],
    [
      'a limit that is not finite',
      ['bounds', 0, 'stretches', 0, 'hi', 'value'],
      Infinity,
      'bounds[0].stretches[0].hi.value',
    ],
    [
      'a limit that is no number at all',
      ['bounds', 0, 'stretches', 0, 'hi', 'value'],
      NaN,
      'bounds[0].stretches[0].hi.value',
    ],
    ['a reach of one', ['bounds', 0, 'stretches', 0, 'hi', 'reach'], 1, 'bounds[0].stretches[0].hi.reach'],
    [
      'an unknown nature',
      ['bounds', 0, 'stretches', 0, 'hi', 'nature'],
      'soft',
      'bounds[0].stretches[0].hi.nature',
    ],
    ['an unknown rate form', ['parts', 0, 'coefficient', 'rateForm'], 'any', 'parts[0].coefficient'],
    ['no part', ['parts'], [], 'parts'],
    ['no check', ['checks'], [], 'checks'],
    ['no source', ['sources'], [], 'sources'],
    ['a tolerance of nothing', ['checks', 0, 'tolerancePercent'], 0, 'checks[0].tolerancePercent'],
    ['a null in place of a list', ['groups'], null, 'groups'],
  ])('%s is refused at its field', (_what, path, value, field) => {
    const result = checkStructure(changed(path, value));
    expect(result.ok).toBe(false);
    if (result.ok) return;
    expect(result.problems.map((problem) => problem.field)).toContain(field);
    for (const { code, message } of result.problems) {
      expect(code).toBe('malformed');
      expect(message).toMatch(/\.$/);
    }
  });

  test.each([['a string'], [42], [null], [[]], [undefined]])('%o is no sheet', (value) => {
    expect(checkStructure(value).ok).toBe(false);
  });

  test('a member called __proto__ is unknown like any other', () => {
    const text = JSON.stringify(aSheet()).replace('{', '{"__proto__": {"polluted": 1},');
    const hostile: unknown = JSON.parse(text);
    expect(fieldsOf(hostile)).toContain('__proto__');
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
  });

  test('a flood of faults is cut off', () => {
    const quantities = Array.from({ length: 60 }, () => ({ colour: 'red' }));
    expect(fieldsOf({ ...aSheet(), quantities })).toHaveLength(40);
  });

  test('members of a citation that we do not know are kept', () => {
    const sheet = changed(['sources', 0, 'csl', 'number-of-pages'], '12');
    expect(checkStructure(sheet)).toMatchObject({
      ok: true,
      definition: { sources: [{ csl: { 'number-of-pages': '12' } }] },
    });
  });
});
