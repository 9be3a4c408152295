import {
  checkStructure,
  compileCorrelation,
  inspectCorrelation,
  type CorrelationDefinition,
  type InspectionReport,
  type PropertyLibrary,
} from '@merestone/engine';
import type { DraftForm } from './draft-form';
import { definitionOfForm } from './definition-of-form';
import type { FormProblem } from './form-reading';
import { structuralWords } from './problem-words';
import { workingSheet, type WorkingSheet } from './working-sheet';

/** What the machine makes of the draft as it stands. */
export interface DraftVerdict {
  /** The sheet, once it is whole: only then can the register take it as a draft. */
  definition: CorrelationDefinition | null;
  /** The mathematics as far as they run. */
  working: WorkingSheet;
  /** Places where nothing stands so far. */
  empty: FormProblem[];
  /** What is wrong as it stands and keeps the sheet from being one. */
  wrong: FormProblem[];
  /** The machine's report, as a submission would get it; null while the sheet is not whole. */
  report: InspectionReport | null;
}

/** Reads and checks the draft. The report is what a submission will be held against, so it is made here as well. */
export function verdictOn(form: DraftForm, library: PropertyLibrary): DraftVerdict {
  const { value, problems } = definitionOfForm(form);
  const told = new Set(problems.map(({ field }) => field));
  const structure = checkStructure(value);
  const structural = structure.ok
    ? []
    : structure.problems
        .filter(({ field }) => !isTold(field, told))
        .map((problem) => ({ ...problem, message: structuralWords(problem) }));
  const faults = [...problems, ...structural];
  const working = workingSheet(value, library);
  if (!structure.ok || faults.length > 0) return unfinished(faults, working);
  const compilation = compileCorrelation(structure.definition);
  if (!compilation.ok) return unfinished(compilation.problems, working);
  const report = inspectCorrelation(structure.definition, library);
  return {
    definition: structure.definition,
    working,
    empty: [],
    wrong: [],
    report,
  };
}

/** Whether the form has said already what is wrong there or below: the schema then only repeats it. */
function isTold(field: string, told: ReadonlySet<string>): boolean {
  return [...told].some(
    (known) => known === field || known.startsWith(`${field}.`) || known.startsWith(`${field}[`),
  );
}

function unfinished(faults: readonly FormProblem[], working: WorkingSheet): DraftVerdict {
  return {
    definition: null,
    working,
    report: null,
    empty: faults.filter(({ code }) => code === 'empty'),
    wrong: faults.filter(({ code }) => code !== 'empty'),
  };
}
