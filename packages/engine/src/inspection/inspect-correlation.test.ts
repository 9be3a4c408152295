import { describe, expect, it } from 'vitest';
import { aSheet } from '../testing/a-sheet.js';
import type { CorrelationDefinition } from '../sheet/definition.js';
import { inspectCorrelation } from './inspect-correlation.js';
import type { Remark } from './remark.js';

const library = () => undefined;

/** Without property equations, which this library does not have. */
function bare(changes: Partial<CorrelationDefinition> = {}): CorrelationDefinition {
  const sheet = aSheet(changes);
  return { ...sheet, quantities: sheet.quantities.map((quantity) => ({ ...quantity, equations: [] })) };
}

function remarks(sheet: unknown, topic: Remark['topic']): string[] {
  return inspectCorrelation(sheet, library)
    .remarks.filter((remark) => remark.topic === topic)
    .map(({ verdict, message }) => `${verdict}: ${message}`);
}

const result = (
  pieces: { hi?: number; lo?: number; expression: string }[],
): CorrelationDefinition['parts'] => [
  {
    key: 'gas-side',
    title: 'Gas side',
    result: {
      symbol: 'Sh',
      kind: 'Sherwood',
      unit: '1',
      pieces: pieces.map(({ lo, hi, expression }) => ({
        when: [{ on: 'Re', ...(lo === undefined ? {} : { lo }), ...(hi === undefined ? {} : { hi }) }],
        expression,
      })),
    },
    coefficient: null,
  },
];

describe('inspectCorrelation', () => {
  it('passes a sound sheet and says what was looked at', () => {
    const report = inspectCorrelation(bare(), library);
    expect(report.passed).toBe(true);
    expect(report.remarks.map(({ topic }) => topic)).toEqual(
      expect.arrayContaining(['definition', 'checks', 'range', 'sources']),
    );
  });

  it('stops at what is no sheet at all, naming the field', () => {
    const report = inspectCorrelation({ ...bare(), parts: undefined }, library);
    expect(report.passed).toBe(false);
    expect(report.remarks[0]).toMatchObject({ verdict: 'error', field: 'parts' });
  });

  it('stops at a worked check that does not reproduce, with the deviation', () => {
    const [check] = bare().checks;
    const checks = check ? [{ ...check, expected: { Sh: { value: 40 } } }] : [];
    // 0.023 × 10 000^0.83 = 48.05; 48.05/40 − 1 = 20.1 %
    expect(remarks(bare({ checks }), 'checks').join()).toContain('Sh is off by 20.1 %');
    expect(inspectCorrelation(bare({ checks }), library).passed).toBe(false);
  });

  it('tells of a check outside the bounds without stopping there', () => {
    const [check] = bare().checks;
    const checks = check
      ? [
          {
            ...check,
            inputs: { Re: { value: 50_000 }, Sc: { value: 1 } },
            expected: { Sh: { value: 0.023 * 50_000 ** 0.83 } },
          },
        ]
      : [];
    expect(remarks(bare({ checks }), 'checks').join()).toContain('lies outside the bounds of Re');
    expect(inspectCorrelation(bare({ checks }), library).passed).toBe(true);
  });

  it('finds where there is no value inside the bounds: all over, or at a corner', () => {
    const withExpression = (expression: string) =>
      bare({ parts: bare().parts.map((part) => ({ ...part, result: { ...part.result, expression } })) });
    // ln of a negative number above Re = 15 000, a third of the logarithmic range
    expect(remarks(withExpression('ln(15000 - Re)*Sc'), 'range').join()).toMatch(
      /^error: Sh has no finite value at Re = 35\u2009000/,
    );
    // a pole at the upper bound, which the sample visits once
    expect(remarks(withExpression('-Re/ln(Re/35000)*Sc'), 'range').join()).toMatch(
      /^warning: Sh has no finite value at Re = 35\u2009000/,
    );
  });

  it('tells of values that are not positive', () => {
    const parts = bare().parts.map((part) => ({
      ...part,
      result: { ...part.result, expression: '0.023*Re^0.83*Sc - 100' },
    }));
    expect(
      remarks(
        bare({ parts, checks: bare().checks.map((c) => ({ ...c, expected: { Re: { value: 10000 } } })) }),
        'range',
      ).join(),
    ).toMatch(/warning: Sh is not positive at Re = 2000/);
  });

  it('reports the jump at a seam in per cent', () => {
    const parts = result([
      { hi: 10_000, expression: '0.02*Re*Sc' },
      { lo: 10_000, expression: '0.022*Re*Sc' },
    ]);
    const checks = bare().checks.map((c) => ({ ...c, expected: { Sh: { value: 220 } } }));
    // 0.022/0.02 − 1 = 10 %
    expect(remarks(bare({ parts, checks }), 'seams')).toEqual([
      'warning: Sh jumps by 10 % at most at the seam Re = 10\u2009000.',
    ]);
  });

  it('names a gap between pieces', () => {
    const parts = result([
      { hi: 5_000, expression: '0.02*Re*Sc' },
      { lo: 8_000, expression: '0.02*Re*Sc' },
    ]);
    const checks = bare().checks.map((c) => ({ ...c, expected: { Sh: { value: 200 } } }));
    expect(remarks(bare({ parts, checks }), 'seams').join()).toContain(
      'No piece covers Re between 5000 and 8000',
    );
  });

  it('asks for what a source lacks and refuses what is no DOI', () => {
    const sources = [
      {
        csl: { type: 'book', title: 'A book', DOI: 'http://somewhere' },
        place: 'p. 1',
        read: 'seen' as const,
      },
    ];
    const found = remarks(bare({ sources }), 'sources').join('\n');
    expect(found).toContain('lacks an author and a year');
    expect(found).toContain('error: "http://somewhere" is not a DOI');
  });

  it('stops where a listed property equation is not in use', () => {
    expect(inspectCorrelation(aSheet(), library).passed).toBe(false);
  });
});
