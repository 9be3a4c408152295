import {
  compileCorrelation,
  definitionTex,
  type CorrelationDefinition,
  type DefinitionTex,
  type Difference,
  type LineTex,
} from '@merestone/engine';

/** An equation or group that reads differently; null where there is none on that side. */
export interface LineChange {
  id: string;
  title: string;
  before: LineTex | null;
  after: LineTex | null;
}

export interface SplitLines {
  lines: LineChange[];
  /** What typesetting does not show. */
  rest: Difference[];
}

const LINE = /^(?:(groups|intermediates)\[([^\]]+)\]|parts\[([^\]]+)\](?:\.(result|coefficient)(?=$|\.)|$))/;
/** Members that are seen in the equation as it is set. */
const TYPESET = /^(\.(expression|pieces|symbol|tex|unit)(?=$|[.[]).*)?$/;

/** Parts the differences of equations into those that are shown typeset, side by side, and the rest. */
export function lineChanges(
  differences: readonly Difference[],
  before: CorrelationDefinition | null,
  after: CorrelationDefinition,
): SplitLines {
  const [old, now] = [before && texOf(before), texOf(after)];
  const lines = new Map<string, LineChange>();
  const rest: Difference[] = [];
  for (const difference of differences) {
    const seen = old && now ? typesetIds(difference.path).flatMap((id) => changeAt(old, now, id)) : [];
    if (seen.length === 0) rest.push(difference);
    for (const change of seen) lines.set(change.id, change);
  }
  return { lines: [...lines.values()], rest };
}

/** The lines that a path changes the look of: one, for a whole part both of its own, or none. */
function typesetIds(path: string): string[] {
  const found = LINE.exec(path);
  if (!found || !TYPESET.test(path.slice(found[0].length))) return [];
  const [, list, symbol, part, role] = found;
  if (list !== undefined) return [`${list}/${symbol ?? ''}`];
  return (role === undefined ? ['result', 'coefficient'] : [role]).map((one) => `${one}/${part ?? ''}`);
}

/** None where the equation is set the same, though it is written otherwise (`0.0230` for `0.023`). */
function changeAt(old: DefinitionTex, now: DefinitionTex, id: string): LineChange[] {
  const [before, after] = [lineAt(old, id), lineAt(now, id)];
  const title = after?.name ?? before?.name;
  if (title === undefined || looksOf(before) === looksOf(after)) return [];
  return [{ id, title, before, after }];
}

function looksOf(line: LineTex | null): string {
  return JSON.stringify(line && [line.symbolTex, line.unit, line.formulas]);
}

function lineAt(tex: DefinitionTex, id: string): LineTex | null {
  const [list = '', ...rest] = id.split('/');
  const name = rest.join('/');
  if (list === 'groups' || list === 'intermediates')
    return tex[list].find(({ symbol }) => symbol === name) ?? null;
  const part = tex.parts.find(({ key }) => key === name);
  if (!part) return null;
  const line = list === 'result' ? part.result : part.coefficient;
  return line && { ...line, name: `${part.title}: ${list}` };
}

function texOf(definition: CorrelationDefinition): DefinitionTex | null {
  const compilation = compileCorrelation(definition);
  return compilation.ok ? definitionTex(compilation.compiled) : null;
}
