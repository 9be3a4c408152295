import { Parser } from 'expr-eval';

/** A token of expr-eval's postfix form. */
export interface RawToken {
  type: string;
  value: unknown;
}

/** The members of the parser that its published types leave out. */
interface OpenParser {
  unaryOps: Record<string, unknown>;
  binaryOps: Record<string, unknown>;
  ternaryOps: Record<string, unknown>;
  consts: Record<string, unknown>;
  functions: Record<string, unknown>;
  parse(text: string): { tokens: RawToken[] };
}

const never = (): number => Number.NaN;

function bareTable(names: readonly string[]): Record<string, unknown> {
  return Object.assign(
    Object.create(null) as Record<string, unknown>,
    Object.fromEntries(names.map((name) => [name, never])),
  );
}

/**
 * expr-eval is used as a parser only. Its tables of operators, constants and functions are replaced
 * by bare ones, so that no name reaches code of its own; its evaluator is never called.
 */
function openParser(): OpenParser {
  const parser = new Parser({
    operators: {
      assignment: false,
      fndef: false,
      array: false,
      in: false,
      factorial: false,
      remainder: false,
      concatenate: false,
      comparison: false,
      conditional: false,
      logical: false,
    },
    allowMemberAccess: false,
  } as ConstructorParameters<typeof Parser>[0]) as unknown as OpenParser;
  parser.unaryOps = bareTable(['-', '+']);
  parser.binaryOps = bareTable(['+', '-', '*', '/', '^']);
  parser.ternaryOps = bareTable([]);
  parser.consts = bareTable([]);
  parser.functions = bareTable([]);
  return parser;
}

const PARSER = openParser();

/** Postfix tokens of a text. Throws what expr-eval throws on a text it cannot read. */
export function tokensOf(text: string): RawToken[] {
  return PARSER.parse(text).tokens;
}
