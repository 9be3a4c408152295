/**
 * @typedef {object} BenchRow
 * @property {string} what was measured
 * @property {number} value
 * @property {string} unit
 * @property {string} [aim] in words, such as `≤ 400`
 * @property {boolean} [met] whether the aim was reached
 */

/**
 * What a file `bench/<name>.bench.mjs` exports as `run`: an asynchronous function without arguments that gives this.
 * @typedef {object} BenchTable
 * @property {string} title
 * @property {BenchRow[]} rows
 * @property {string[]} [notes] how it was measured
 */

/** @param {number} value */
const shown = (value) => (Math.abs(value) >= 100 ? value.toFixed(0) : String(Number(value.toPrecision(3))));

/**
 * @param {BenchTable} table
 * @returns {string} plain text, columns aligned
 */
export const tableText = ({ title, rows, notes = [] }) => {
  const cells = rows.map(({ what, value, unit, aim, met }) => {
    const verdict = met === undefined ? '' : met ? ', met' : ', MISSED';
    return [what, shown(value), unit, aim === undefined ? '' : `aim ${aim}${verdict}`];
  });
  const widths = [0, 1, 2].map((column) => Math.max(0, ...cells.map((row) => (row[column] ?? '').length)));
  const lines = cells.map(([what = '', value = '', unit = '', aim = '']) =>
    `  ${what.padEnd(widths[0] ?? 0)}  ${value.padStart(widths[1] ?? 0)} ${unit.padEnd(widths[2] ?? 0)}  ${aim}`.trimEnd(),
  );
  return [title, ...lines, ...notes.map((note) => `  ${note}`)].join('\n');
};
