import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inspectJson } from './inspect-json.js';

const fieldsOf = (text: string): string[] => inspectJson(JSON.parse(text)).map(({ field }) => field);

describe('what no JSON may hold', () => {
  it.each([
    ['{"a":1e400,"b":[{"c":-1e999}]}', ['a', 'b.0.c']],
    ['{"__proto__":{},"a":{"constructor":1,"prototype":2}}', ['__proto__', 'a.constructor', 'a.prototype']],
    [String.raw`{"a":"\u0000","b\u0000":1}`, ['a', 'b\0']],
    [String.raw`{"a":"\udc00 \ud800"}`, ['a']],
  ])('is named by its path in %s', (text, fields) => {
    expect(fieldsOf(text)).toEqual(fields);
  });

  it('is nesting beyond 64 levels', () => {
    const nested = (levels: number): unknown => JSON.parse(`${'['.repeat(levels)}${']'.repeat(levels)}`);
    expect(inspectJson(nested(64))).toEqual([]);
    expect(inspectJson(nested(65))).toHaveLength(1);
    expect(inspectJson(nested(100_000))).toHaveLength(1);
  });

  it('is named a hundred times at most', () => {
    expect(inspectJson(Array.from({ length: 5000 }, () => Number.POSITIVE_INFINITY))).toHaveLength(100);
  });

  it('is not found in ordinary values', () => {
    expect(fieldsOf('{"a":[1,"é😀",null,true,{"b":-0,"c":1e308}]}')).toEqual([]);
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 5 }), (value) => {
        const text = JSON.stringify(value);
        fc.pre(!/\\u0000|\\ud[89a-f]|__proto__|constructor|prototype/.test(text));
        expect(inspectJson(JSON.parse(text))).toEqual([]);
      }),
    );
  });
});
