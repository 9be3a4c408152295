import { plugins } from '@citation-js/core';
import { describe, expect, it, vi } from 'vitest';
import { CitationFault } from './citation-fault.js';
import type { CitationFormat } from './citation-format.js';
import { readCitations } from './read-citations.js';

const first = (text: string, format?: CitationFormat) => readCitations(text, format).items[0];
const titleOf = (tex: string) => first(`@article{x, title = {${tex}}}`)?.title;

/** The fault that reading ends in; anything else that is thrown is a failure of the test. */
function faultOf(text: string, format?: CitationFormat): CitationFault {
  try {
    readCitations(text, format);
  } catch (error) {
    if (error instanceof CitationFault) return error;
    throw error;
  }
  throw new Error('It was read.');
}

describe('BibTeX', () => {
  it('reads an article with strings, months, quotation marks and joined pieces', () => {
    const text = String.raw`
      Some words, and somebody@office.example, stand between entries.
      @comment{ @article{not, title={Not this}} }
      @preamble{"\newcommand{\x}{y}"}
      @STRING( iec = "Industrial {\&} Engineering Chemistry" )
      @Article{GS34,
        author  = "Gilliland, E. R. and T. K. Sherwood", % a remark
        title   = {{Diffusion} of Vapors} # " into " # {Air Streams},
        JOURNAL = iec, year = 1934, month = may, volume = 26, number = {5},
        pages = {516--523}, doi = {https://doi.org/10.1021/ie50293a010},
        abstract = {Not kept.}, file = {C:/papers/paper.pdf},
      }`;
    expect(readCitations(text)).toEqual({
      format: 'bibtex',
      items: [
        {
          type: 'article-journal',
          title: 'Diffusion of Vapors into Air Streams',
          author: [
            { family: 'Gilliland', given: 'E. R.' },
            { family: 'Sherwood', given: 'T. K.' },
          ],
          issued: { 'date-parts': [[1934, 5]] },
          'container-title': 'Industrial & Engineering Chemistry',
          volume: '26',
          issue: '5',
          page: '516-523',
          DOI: '10.1021/ie50293a010',
        },
      ],
      problems: [],
    });
  });

  it.each([
    [String.raw`Schl{\"u}nder, {\AA}ngstr{\"{o}}m, S{\o}ren`, 'Schlünder, Ångström, Søren'],
    [String.raw`{\'E}cole, na\"\i ve, \c{c}a, \v{C}ech, \ss`, 'École, naïve, ça, Čech, ß'],
    [String.raw`$k_L a$ and CO$_2$ at 10$^{-3}$ m$^2$/s`, 'kL a and CO₂ at 10⁻³ m²/s'],
    [String.raw`\emph{Bed} \textbf{and} $\alpha$ --- ` + "``so''", 'Bed and α — “so”'],
    [String.raw`50\% \& more \_ \# \$1~000`, '50% & more _ # $1 000'],
    [String.raw`A\\B\,C \LaTeX{} \mbox{whole}`, 'A B C LaTeX whole'],
    ['<script>alert(1)</script> <b>bold</b> &lt;i&gt; &amp; &#x41;', 'alert(1) bold & A'],
    ['<scr<b>ipt>x</scr</b>ipt>', 'x'],
    ['Sc < 1 and Re > 10', 'Sc < 1 and Re > 10'],
    ['a\u202Etxt.exe\u200B b', 'atxt.exe b'],
  ])('decodes %s', (tex, text) => {
    expect(titleOf(tex)).toBe(text);
  });

  it('keeps particles with the family name and suffixes with the given names', () => {
    const text = `@book{x, title={T}, author={van 't Riet, K. and Bird, Jr., R. B. and de la Cruz, J. and {Smith and Sons, Inc.} and others}}`;
    const { items, problems } = readCitations(text);
    expect(items[0]?.author).toEqual([
      { family: "van 't Riet", given: 'K.' },
      { family: 'Bird', given: 'R. B. Jr.' },
      { family: 'de la Cruz', given: 'J.' },
      { family: 'Smith and Sons, Inc.' },
    ]);
    expect(problems).toEqual([{ field: 'items.0.author', message: 'Further authors are not named here.' }]);
  });

  it('tells what it changed or left out, at its field', () => {
    const text = String.raw`@article{x, title={A \foo{b} \constructor c}, doi={not one}, url={javascript:alert(1)}, year={c. 1949}}
      @odd{y, title={Another}, crossref={x}}
      @article{z, year=1950}`;
    const { items, problems } = readCitations(text);
    expect(items.map(({ title }) => title)).toEqual(['A b c', 'Another']);
    expect(items[0]).toEqual({ type: 'article-journal', title: 'A b c', issued: { 'date-parts': [[1949]] } });
    expect(problems).toEqual([
      { field: 'items.0', message: 'The command \\foo is not known and was taken out.' },
      { field: 'items.0', message: 'The command \\constructor is not known and was taken out.' },
      { field: 'items.0.issued', message: 'Of the date given only the year 1949 was read.' },
      { field: 'items.0.DOI', message: '"not one" is not a DOI and was left out.' },
      { field: 'items.0.URL', message: 'This is not an address of the web and was left out.' },
      { field: 'items.1', message: 'What this entry takes from another one is not filled in.' },
      { field: 'text', message: 'In the entry "z" of line 3: It names no work: a title is missing.' },
    ]);
  });

  it('takes nothing from one reading into the next', () => {
    readCitations('@string{mine = {Mine}} @article{x, title = mine}');
    expect(faultOf('@article{x, title = mine}').message).toBe('Line 1: The string "mine" is not defined.');
    readCitations('@string{jan = {Mine}} @article{x, title = {T}, month = jan}');
    expect(first('@article{x, title = {T}, year = 1950, month = jan}')?.issued).toEqual({
      'date-parts': [[1950, 1]],
    });
  });
});

describe('hostile BibTeX', () => {
  const entry = (value: string) => `@article{x, title = ${value}}`;
  const doubling = Array.from({ length: 40 }, (_, i) => `@string{a${i + 1} = a${i} # a${i}}`).join('\n');

  it.each<[string, string, RegExp]>([
    ['braces without end', entry('{'.repeat(100_000)), /nested deeper than 12/],
    ['deep braces', entry(`{${'{'.repeat(20)}x${'}'.repeat(20)}}`), /nested deeper than 12/],
    ['an open brace', '@article{x, title = {A', /opened in line 1 is never closed/],
    ['an open quotation', '@article{x,\n title = "A', /opened in line 2 is never closed/],
    ['an entry that is not closed', '@article{x, title = {A}', /"}" is missing in the entry "x" of line 1/],
    ['a brace too many', '@article{x, title = "A } B"}', /closing brace too many/],
    ['the wrong bracket', '@article(x, title = {A}}', /"\)" is missing/],
    ['no equals sign', '@article{x, title {A}}', /"=" is missing/],
    ['no value', '@article{x, title = }', /must stand between braces/],
    ['\\input', entry(String.raw`{\input{/etc/passwd}}`), /\\input is not taken/],
    ['\\write18', entry(String.raw`{\immediate\write18{ls}}`), /\\immediate is not taken/],
    ['a definition', entry(String.raw`{\def\x{\x\x}\x}`), /\\def is not taken/],
    ['an environment', entry(String.raw`{\begin{verbatim}x\end{verbatim}}`), /\\begin is not taken/],
    ['\\csname', entry(String.raw`{\csname input\endcsname}`), /\\csname is not taken/],
    [
      'strings that double',
      `@string{a0 = "xxxxxxxxxx"}\n${doubling}\n${entry('a40')}`,
      /put together from others/,
    ],
    ['a string of itself', `@string{a = a}\n${entry('a')}`, /The string "a" is not defined/],
    ['a huge string many times', `@string{a = {${'x'.repeat(301)}}}`, /300 characters at most/],
    [
      'a string joined many times',
      `@string{a = {${'x'.repeat(300)}}}${entry(Array(13).fill('a').join(' # '))}`,
      /12 pieces/,
    ],
    [
      'many strings',
      Array.from({ length: 101 }, (_, i) => `@string{s${i} = {x}}`).join(''),
      /more than 100 @string/,
    ],
    ['a huge field', entry(`{${'x'.repeat(5000)}}`), /4000 characters at most/],
    [
      'many fields',
      `@article{x, ${Array.from({ length: 61 }, (_, i) => `f${i} = 1`).join(', ')}}`,
      /more than 60 fields/,
    ],
    ['many entries', '@article{x, title={A}}'.repeat(51), /more than 50 entries/],
    ['too much text', entry('{A}') + ' '.repeat(200_001), /larger than 200 kB/],
    ['too much text in bytes', entry('{A}') + '水'.repeat(70_000), /larger than 200 kB/],
    ['binary', '@article{x, title={A\u0001}}', /not text/],
    ['a broken encoding', '@article{x, title={A\uFFFD}}', /not text/],
    ['no title', '@article{x, author={A}}', /names no work/],
    ['an empty entry', '@article{}', /names no work/],
    ['nothing that is an entry', '@comment{x}', /no reference in this text/],
  ])('with %s is refused', (_, text, message) => {
    const fault = faultOf(text);
    expect(fault.field).toBe('text');
    expect(fault.message).toMatch(message);
  });

  it.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty', 'prototype'])(
    'cannot reach a prototype by the name %s',
    (name) => {
      const text = `@string{${name} = {mine}} @${name.replaceAll('_', 'x')}{${name}, ${name} = {x}, title = ${name}, month = ${name}, year = ${name}, crossref = {${name}}, author = {${name}, ${name}}}`;
      const { items } = readCitations(text);
      expect(items).toEqual([{ type: 'document', title: 'mine', author: [{ family: name, given: name }] }]);
      expect(({} as Record<string, unknown>).mine).toBeUndefined();
      expect(titleOf(`A \\${name} b`)).toMatch(/^A (__proto__ )?b$/);
    },
  );

  it('is read or refused in time, whatever fills the 200 kB', () => {
    const fillings = [
      '{',
      '}',
      '@',
      '@a{',
      '@article{x,',
      '@article{x, title={A}, ',
      '"',
      '\\',
      "\\'",
      '$',
      '$_',
      '%',
      '%\n',
      '#',
      ' and ',
      ', ',
      ' - ',
      '\n',
      'a = ',
      '<',
      '<a',
      '&#',
      '=',
      '~',
      'a.',
      '@string{a={b}}',
      '\\textit{',
      '- ',
    ];
    for (const filling of fillings) {
      for (const [before, after] of [
        ['', ''],
        ['@article{x, title={', '}}'],
        ['@article{x, author={', '}, title={A}}'],
      ] as const) {
        for (const length of [2000, 3900, 199_000]) {
          const text = `${before}${filling.repeat(length / filling.length)}${after}`;
          const started = performance.now();
          try {
            readCitations(text, 'bibtex');
          } catch (error) {
            expect(error, JSON.stringify(text.slice(0, 60))).toBeInstanceOf(CitationFault);
          }
          expect(performance.now() - started, JSON.stringify(text.slice(0, 60))).toBeLessThan(3000);
        }
      }
    }
  });
});

describe('RIS', () => {
  it('reads a record with a value over two lines, and CRLF', () => {
    const text = [
      'TY  - JOUR',
      'AU  - Ranz, W. E.',
      'AU  - Marshall, W. R., Jr.',
      'TI  - Evaporation',
      'from drops',
      'JO  - Chem. Eng. Prog.',
      'VL  - 48',
      'IS  - 3',
      'SP  - 141',
      'EP  - 146',
      'PY  - 1952/03//',
      'N2  - Not kept',
      'ER  - ',
      '',
    ].join('\r\n');
    expect(readCitations(text)).toEqual({
      format: 'ris',
      items: [
        {
          type: 'article-journal',
          title: 'Evaporation from drops',
          author: [
            { family: 'Ranz', given: 'W. E.' },
            { family: 'Marshall', given: 'W. R. Jr.' },
          ],
          issued: { 'date-parts': [[1952, 3]] },
          'container-title': 'Chem. Eng. Prog.',
          volume: '48',
          issue: '3',
          page: '141-146',
        },
      ],
      problems: [],
    });
  });

  it('reads a chapter and a report of the older version of the format', () => {
    const text =
      'TY  - CHAP\nT1  - A\nBT  - A handbook\nED  - Doe, J.\nER  -\nTY  - RPRT\nT1  - B\nIS  - TR 3\nDO  - wrong\n';
    const { items, problems } = readCitations(text);
    expect(items).toEqual([
      {
        type: 'chapter',
        title: 'A',
        'container-title': 'A handbook',
        editor: [{ family: 'Doe', given: 'J.' }],
      },
      expect.objectContaining({ type: 'report', title: 'B', number: 'TR 3' }),
    ]);
    expect(problems).toEqual([{ field: 'items.1.DOI', message: '"wrong" is not a DOI and was left out.' }]);
  });

  it.each<[string, string, RegExp]>([
    ['a tag outside', 'AU  - A\nTY  - JOUR\n', /Line 1: the tag AU stands outside/],
    ['many records', 'TY  - JOUR\nTI  - A\nER  - \n'.repeat(51), /more than 50 records/],
    ['a huge value', `TY  - JOUR\nTI  - ${'x'.repeat(4001)}\n`, /4000 characters/],
    ['a value over many lines', `TY  - JOUR\nTI  - x\n${'yyyyyyyyyy\n'.repeat(10_000)}`, /4000 characters/],
    ['many authors', `TY  - JOUR\n${'AU  - A\n'.repeat(101)}`, /more than 100 lines/],
    ['an unknown kind and no title', 'TY  - NONE\nER  - \n', /names no work|kind of work/],
  ])('with %s is refused', (_, text, message) => {
    expect(faultOf(text, 'ris').message).toMatch(message);
  });
});

describe('CSL-JSON', () => {
  it('keeps what a sheet keeps', () => {
    const item = {
      id: 'x',
      type: 'book',
      title: ['<i>A</i>'],
      volume: 3,
      edition: 2,
      abstract: 'Not kept',
      author: [{ family: 'B', given: 'C', ORCID: 'x' }, 7, null],
      issued: { 'date-parts': [['1950', 13]] },
      URL: 'https://doi.org/10.1021/i160017a002',
    };
    expect(first(JSON.stringify(item))).toEqual({
      type: 'book',
      title: 'A',
      volume: 3,
      edition: 2,
      author: [{ family: 'B', given: 'C' }],
      issued: { 'date-parts': [[1950]] },
      DOI: '10.1021/i160017a002',
    });
  });

  it.each<[string, string, RegExp]>([
    ['what is no JSON', '{"type":', /not valid JSON/],
    ['a prototype', '[{"type":"book","title":"A","__proto__":{"x":1}}]', /cannot be used for a field/],
    ['nesting without end', '['.repeat(5000) + ']'.repeat(5000), /nested deeper|not valid/],
    ['a number without bounds', '[{"type":"book","title":"A","volume":1e999}]', /too large/],
    ['many items', JSON.stringify(Array(51).fill({ title: 'A' })), /more than 50 items/],
    ['things that are no items', '[1, "a", null, [], {}]', /names no work|kind of work/],
    ['nothing', '[]', /no reference/],
  ])('with %s is refused', (_, text, message) => {
    expect(faultOf(text, 'csl-json').message).toMatch(message);
  });
});

describe('formats', () => {
  it('asks for a name where the text tells none', () => {
    expect(faultOf('Gilliland and Sherwood (1934)')).toMatchObject({ field: 'format' });
    expect(faultOf('')).toMatchObject({ field: 'format' });
  });

  it('does not go by what is written where the format is named', () => {
    expect(faultOf('@article{x, title={A}}', 'csl-json').message).toMatch(/not valid JSON/);
    expect(faultOf('@article{x, title={A}}', 'ris').message).toMatch(/no reference/);
  });

  it('never fetches anything', () => {
    const fetched = vi.spyOn(globalThis, 'fetch');
    expect(plugins.input.list().filter((type) => type.startsWith('@else/'))).toEqual([]);
    for (const type of ['@else/url', '@else/html', '@else/json']) {
      expect(plugins.input.hasDataParser(type, false)).toBeFalsy();
      expect(plugins.input.hasDataParser(type, true)).toBeFalsy();
    }
    expect(() => readCitations('https://example.org/references.bib')).toThrow(CitationFault);
    readCitations('@article{x, title={https://example.org/a}, url={https://example.org/a}}');
    expect(fetched).not.toHaveBeenCalled();
  });
});
