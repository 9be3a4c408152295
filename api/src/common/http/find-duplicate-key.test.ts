import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findDuplicateKey } from './find-duplicate-key.js';

describe('a name given twice', () => {
  it.each([
    ['{"a":1,"a":2}', 'a'],
    ['{"a":{"x":[{"k":1},{"k":1,"k":2}]}}', 'a.x.1.k'],
    [String.raw`{"é":1,"\u00e9":2}`, 'é'],
    [String.raw`{"q\"":1,"q\"":2}`, 'q"'],
    ['{ "a" : [1, 2, {"b":0}] , "c":{}, "a":0 }', 'a'],
    ['{"":1,"":2}', ''],
  ])('is found in %s', (text, path) => {
    expect(findDuplicateKey(text)).toBe(path);
  });

  it.each([
    '{"a":"a","b":["a","a"],"c":{"a":1}}',
    '{"a":{"b":1},"c":{"b":1}}',
    '[]',
    String.raw`{"a":"\",\"a\":"}`,
  ])('is not found in %s', (text) => {
    expect(findDuplicateKey(text)).toBeUndefined();
  });

  it('is never found in what JSON.stringify wrote, and always when one is put in', () => {
    fc.assert(
      fc.property(
        fc.dictionary(fc.string(), fc.jsonValue(), { minKeys: 1 }),
        fc.boolean(),
        (value, pretty) => {
          const text = JSON.stringify(value, null, pretty ? 2 : 0);
          expect(findDuplicateKey(text)).toBeUndefined();
          const key = Object.keys(value)[0] ?? '';
          expect(findDuplicateKey(`{${JSON.stringify(key)}:0,${text.slice(1)}`)).toBe(key);
        },
      ),
    );
  });
});
