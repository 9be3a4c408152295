import { describe, expect, it } from 'vitest';
import { canonicalText, journalEntry } from './entry.js';

describe('canonical text', () => {
  // RFC 8785, section 3.2.2.
  it('writes numbers, strings and literals as the RFC shows', () => {
    const value: unknown = JSON.parse(
      String.raw`{"numbers":[333333333.33333329,1E30,4.50,2e-3,0.000000000000000000000000001],` +
        String.raw`"string":"\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/","literals":[null,true,false]}`,
    );
    expect(canonicalText(value)).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],` +
        String.raw`"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
  });

  // RFC 8785, section 3.2.3: names are sorted by UTF-16 code units.
  it('sorts names as the RFC shows', () => {
    const names = ['\u20ac', '\r', '\ufb33', '1', '\u{1f600}', '\u0080', '\u00f6'];
    const text = canonicalText(Object.fromEntries(names.map((name) => [name, 0])));
    const sorted = ['\r', '1', '\u0080', '\u00f6', '\u20ac', '\u{1f600}', '\ufb33'];
    expect(Object.keys(JSON.parse(text) as object)).toEqual(['1', ...sorted.filter((name) => name !== '1')]);
    expect(sorted.map((name) => text.indexOf(JSON.stringify(name)))).toEqual(
      sorted.map((name) => text.indexOf(JSON.stringify(name))).toSorted((a, b) => a - b),
    );
  });

  it('refuses what JSON cannot say', () => {
    expect(() => canonicalText({ value: Number.NaN })).toThrow();
    expect(() => canonicalText({ value: Number.POSITIVE_INFINITY })).toThrow();
    expect(() => canonicalText(undefined)).toThrow(TypeError);
  });
});

describe('a journal entry', () => {
  // The form is fixed: an entry written today must be read and hashed alike in ten years.
  it('has exactly this text', () => {
    const actor = { id: 'p1', name: 'Anna Öz', roles: ['engineer'] as const };
    const at = '2026-01-02T03:04:05.678Z';
    const entry = journalEntry(7, at, actor, 'revision.approved', 'correlations/x/revisions/2', {
      note: undefined,
      b: 1,
    });

    expect(canonicalText(entry)).toBe(
      '{"act":"revision.approved","actor":{"id":"p1","name":"Anna Öz"},"at":"2026-01-02T03:04:05.678Z",' +
        '"detail":{"b":1},"format":1,"index":7,"subject":"correlations/x/revisions/2"}',
    );
  });
});
