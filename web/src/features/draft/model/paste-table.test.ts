import { describe, expect, test } from 'vitest';
import { pasteTable } from './paste-table';

const SYMBOLS = ['a_t', 'd_p', 'eps'];

describe('rows pasted from a spreadsheet', () => {
  test('tabs, with a heading that names label and symbols, with their units behind', () => {
    const { rows, symbols, problems } = pasteTable(
      'Label\ta_t (1/m)\td_p [m]\nRaschig ring, 25 mm\t190\t0.025\nPall ring, 50 mm\t102\t0.05\n',
      SYMBOLS,
      [],
    );
    expect(problems).toEqual([]);
    expect(symbols).toEqual(['a_t', 'd_p']);
    expect(rows).toMatchObject([
      {
        key: 'raschig-ring-25-mm',
        label: 'Raschig ring, 25 mm',
        values: [
          { symbol: 'a_t', text: '190' },
          { symbol: 'd_p', text: '0.025' },
        ],
      },
      { key: 'pall-ring-50-mm' },
    ]);
  });

  test('semicolons, quotes, keys of one name told apart, empty cells left empty', () => {
    const { rows, problems } = pasteTable(
      'key;label;eps;note\nring;"One; two";;"He said ""so"""\n;Ring;0.7;',
      SYMBOLS,
      ['ring'],
    );
    expect(problems).toEqual([]);
    expect(rows).toMatchObject([
      { key: 'ring-2', label: 'One; two', note: 'He said "so"', values: [{ symbol: 'eps', text: '' }] },
      { key: 'ring-3', label: 'Ring', values: [{ symbol: 'eps', text: '0.7' }] },
    ]);
  });

  test('a decimal comma is kept as typed and told, not turned into something', () => {
    const { rows, problems } = pasteTable('label\teps\nRing\t0,71', SYMBOLS, []);
    expect(rows[0]?.values).toEqual([{ symbol: 'eps', text: '0,71' }]);
    expect(problems).toEqual(['Ring, eps: “0,71” is not read as a number.']);
  });

  test('columns that name nothing of the sheet are told; without any nothing is taken', () => {
    expect(pasteTable('label\teps\tcolour\nRing\t0.7\tred', SYMBOLS, []).problems).toEqual([
      'Column 3, “colour”, is no symbol of the sheet and was left out.',
    ]);
    const none = pasteTable('Ring\t0.7\nSaddle\t0.8', SYMBOLS, []);
    expect(none.rows).toEqual([]);
    expect(none.problems[0]).toMatch(/first line has to name the columns/);
    expect(pasteTable('', [], []).rows).toEqual([]);
  });

  test('a flood is cut off and told', () => {
    const { rows, problems } = pasteTable(`eps\n${'0.5\n'.repeat(500)}`, SYMBOLS, []);
    expect(rows).toHaveLength(400);
    expect(problems).toEqual(['Only the first 400 rows were taken.']);
  });
});
