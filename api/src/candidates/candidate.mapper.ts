import type { CompiledCorrelation, Evaluation, Finding, PropertyLibrary } from '@merestone/engine';
import type { RevisionRecord } from '../revisions/revision-record.js';
import type { Candidate, CandidateOutcome } from './dto/candidates-response.dto.js';

const ORDER: readonly CandidateOutcome[] = ['within', 'unchecked', 'refused', 'incomplete'];

/** How a sheet answers a duty. */
export function candidate(
  record: RevisionRecord,
  compiled: CompiledCorrelation,
  evaluation: Evaluation,
  equations: Readonly<Record<string, string>>,
  library: PropertyLibrary,
): Candidate {
  const head = {
    slug: record.slug,
    title: compiled.definition.title,
    revision: record.number,
    standing: record.standing,
    inUse: record.inForce,
  };
  const none = { result: null, coefficient: null, farthest: null };
  if (!evaluation.ok) {
    const missing = evaluation.problems.filter(({ code }) => code === 'missing');
    const others = evaluation.problems.filter(({ code }) => code !== 'missing');
    return {
      ...head,
      ...none,
      outcome: 'incomplete',
      findings: [],
      missing: [...new Set(missing.map(({ field }) => nameOf(field, compiled, equations, library)))],
      problems: others.map(({ message }) => message),
    };
  }
  const { outcome } = evaluation;
  if (outcome.outcome === 'refused') {
    const { findings } = outcome;
    return {
      ...head,
      ...none,
      outcome: 'refused',
      farthest: farthestOf(findings),
      findings,
      missing: [],
      problems: [],
    };
  }
  return {
    ...head,
    outcome: outcome.outcome === 'within' ? 'within' : 'unchecked',
    result: outcome.result,
    coefficient: outcome.coefficient,
    findings: outcome.findings,
    farthest: null,
    missing: [],
    problems: [],
  };
}

/** Those that hold first, each kind by how well: away from a bound before near it, little out before far out. */
export function ranked(candidates: readonly Candidate[]): Candidate[] {
  return candidates.toSorted((a, b) => {
    const [left, right] = [rankOf(a), rankOf(b)];
    const place = left.findIndex((value, i) => value !== right[i]);
    return place === -1 ? a.title.localeCompare(b.title, 'en') : (left[place] ?? 0) - (right[place] ?? 0);
  });
}

function rankOf({ outcome, inUse, findings, farthest, missing, problems }: Candidate): number[] {
  return [
    ORDER.indexOf(outcome),
    inUse ? 0 : 1,
    findings.filter(({ kind }) => kind === 'near').length,
    outcome === 'refused' ? (farthest ?? Number.POSITIVE_INFINITY) : 0,
    missing.length + problems.length,
  ];
}

function farthestOf(findings: readonly Finding[]): number | null {
  const ratios = findings
    .filter(({ kind }) => kind === 'outside' || kind === 'past-reach')
    .flatMap(({ ratio }) => (ratio === null ? [] : [ratio]));
  return ratios.length === 0 ? null : Math.max(...ratios);
}

/** `inputs.rho` as the dictionary's name of rho; of `inputs.rho.T` that of T on the equation that fills rho. */
function nameOf(
  field: string,
  { definition }: CompiledCorrelation,
  equations: Readonly<Record<string, string>>,
  library: PropertyLibrary,
): string {
  const [symbol = '', inner] = field.replace(/^inputs\./, '').split('.');
  const slug = equations[symbol];
  const quantities =
    inner === undefined || slug === undefined ? definition.quantities : library(slug)?.definition.quantities;
  return quantities?.find((one) => one.symbol === (inner ?? symbol))?.is ?? symbol;
}
