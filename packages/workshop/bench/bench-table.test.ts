import { describe, expect, it } from 'vitest';
import { tableText } from './bench-table.mjs';

describe('tableText', () => {
  it('aligns the columns and says whether an aim was met', () => {
    const text = tableText({
      title: 'Weights',
      rows: [
        { what: 'page', value: 181.4, unit: 'kB', aim: '≤ 200', met: true },
        { what: 'longer page', value: 4012, unit: 'kB', aim: '≤ 400', met: false },
        { what: 'ratio', value: 1.2345, unit: '×' },
      ],
      notes: ['As weighed.'],
    });
    expect(text.split('\n')).toEqual([
      'Weights',
      '  page          181 kB  aim ≤ 200, met',
      '  longer page  4012 kB  aim ≤ 400, MISSED',
      '  ratio        1.23 ×',
      '  As weighed.',
    ]);
  });
});
