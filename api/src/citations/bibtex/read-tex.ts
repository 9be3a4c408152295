import { CitationFault } from '../citation-fault.js';
import { KNOWN_COMMANDS } from '../citation-library.js';

/** Commands that would read, write, define or run something. A reference has no use for them. */
const ACTING = new Set(
  (
    'input include includeonly openin openout read readline write immediate closein closeout special directlua ' +
    'latelua luaexec write18 shellescape def edef gdef xdef let futurelet newcommand renewcommand providecommand ' +
    'DeclareRobustCommand newenvironment renewenvironment csname endcsname expandafter noexpand catcode lccode ' +
    'uccode escapechar endlinechar loop repeat usepackage RequirePackage documentclass begin end verb verbatiminput ' +
    'lstinputlisting includegraphics includepdf import subimport bibliography addbibresource scantokens everyjob'
  ).split(' '),
);

/** What these stand for, or nothing where they only set the type of what follows. */
const SIMPLE: ReadonlyMap<string, string> = new Map([
  ['AA', 'Å'],
  ['aa', 'å'],
  ['textdegree', '°'],
  ['textmu', 'µ'],
  ['textquoteright', '’'],
  ['textquoteleft', '‘'],
  ['LaTeX', 'LaTeX'],
  ['TeX', 'TeX'],
  ['mbox', ''],
  ['hbox', ''],
  ['text', ''],
  ['ensuremath', ''],
  ['mathit', ''],
  ['mathrm', ''],
  ['mathbf', ''],
  ['mathsf', ''],
  ['textnormal', ''],
  ['uppercase', ''],
  ['MakeUppercase', ''],
  ['protect', ''],
  ['relax', ''],
  ['noopsort', ''],
  ['newline', ' '],
  ['quad', ' '],
  ['qquad', ' '],
  ['space', ' '],
  ['par', ' '],
]);

const SPACES: ReadonlyMap<string, string> = new Map([
  [',', ' '],
  [';', ' '],
  [':', ' '],
  [' ', ' '],
  ['\\', ' '],
  ['!', ''],
  ['/', ''],
  ['-', ''],
  ['@', ''],
]);

/**
 * TeX of a field with only such commands left as the citation library decodes. Others are taken out, their
 * arguments kept, and told. Throws a fault at a command that would act.
 */
export function readableTex(tex: string, where: string, tell: (message: string) => void): string {
  return tex.replace(
    /\\(?:([A-Za-z]+)(\s*)|([\s\S]))/g,
    (whole, word?: string, space?: string, sign?: string) => {
      if (word === undefined) return (sign === undefined ? undefined : SPACES.get(sign)) ?? whole;
      if (ACTING.has(word))
        throw new CitationFault(`${where}: the command \\${word} is not taken in a reference.`);
      const simple = SIMPLE.get(word);
      // TeX takes the spaces after a command as its end.
      if (simple !== undefined) return simple;
      if (KNOWN_COMMANDS.has(word)) return whole;
      tell(`The command \\${word.slice(0, 40)} is not known and was taken out.`);
      return space ?? '';
    },
  );
}
