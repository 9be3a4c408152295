import type { CorrelationDefinition } from '@merestone/engine';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import type { Standing } from '../common/standing.js';
import { canonicalText } from '../journal/entry.js';
import { contentOf } from '../revisions/content.js';
import { readCorrelation, readPropertyEquation } from '../revisions/definition-check.js';
import { namedIn } from './register-file.mapper.js';
import type { ExchangedRegister, ExchangedRevision } from './register-format.js';

const MOST_FAULTS = 40;

/** What standings follow each other. */
const NEXT: Readonly<Record<Standing, readonly Standing[]>> = {
  draft: ['in review'],
  'in review': ['draft', 'approved', 'declined'],
  approved: ['superseded', 'suspended', 'withdrawn'],
  superseded: ['suspended', 'withdrawn'],
  suspended: ['approved', 'superseded', 'withdrawn'],
  withdrawn: [],
  declined: [],
};

/**
 * What does not hold in a register that has the right form: texts that are not what their hashes are of, definitions
 * that do not compile, lives that no revision can have had, signatures without four eyes, names that are missing.
 */
export function registerFaults(register: ExchangedRegister): FieldProblem[] {
  const faults: FieldProblem[] = [];
  const say = (field: string, message: string): void => {
    if (faults.length < MOST_FAULTS) faults.push({ field, code: 'malformed', message });
  };
  const { geometries, correlations, propertyEquations, people } = register;
  unique(
    geometries.map(({ slug }) => slug),
    'geometries',
    say,
  );
  unique(
    correlations.map(({ slug }) => slug),
    'correlations',
    say,
  );
  unique(
    propertyEquations.map(({ slug }) => slug),
    'propertyEquations',
    say,
  );
  unique(
    people.map(({ id }) => id),
    'people',
    say,
  );
  const known = new Set([...people.map(({ id }) => id), 'system']);
  for (const id of namedIn(register))
    if (!known.has(id)) say('people', `Somebody with the id ${id} is not named.`);

  const places = new Set(geometries.map(({ slug }) => slug));
  for (const [i, { geometry, revisions }] of correlations.entries()) {
    const path = `correlations.${i}`;
    if (!places.has(geometry)) say(`${path}.geometry`, `There is no geometry "${geometry}" in the file.`);
    subjectFaults(revisions, path, say, (text) => {
      if (definitionOf(text).geometry !== geometry) throw new RangeError('The geometry is another one.');
    });
  }
  for (const [i, { slug, revisions }] of propertyEquations.entries()) {
    subjectFaults(revisions, `propertyEquations.${i}`, say, (text) => {
      readPropertyEquation(slug, JSON.parse(text));
    });
  }
  return faults;
}

/** The definition in a content's text; throws where it holds none. */
export function definitionOf(text: string): CorrelationDefinition {
  return readCorrelation(JSON.parse(text)).definition;
}

type Say = (field: string, message: string) => void;

function subjectFaults(
  revisions: readonly ExchangedRevision[],
  path: string,
  say: Say,
  assertDefinition: (text: string) => void,
): void {
  for (const [i, one] of revisions.entries()) {
    const here = `${path}.revisions.${i}`;
    if (one.number !== i + 1) say(`${here}.number`, 'Revisions are numbered from 1 on, without a gap.');
    contentFaults(one, here, say, assertDefinition);
    lifeFaults(one, here, say);
    signatureFaults(one, here, say);
    for (const [j, { problemReport }] of one.standings.entries()) {
      if (problemReport === null) continue;
      const reports = revisions[problemReport.revision - 1]?.problemReports ?? [];
      if (reports[problemReport.place] === undefined)
        say(`${here}.standings.${j}.problemReport`, 'There is no such report in the file.');
    }
  }
}

function contentFaults(
  { contents }: ExchangedRevision,
  path: string,
  say: Say,
  assertDefinition: (text: string) => void,
): void {
  for (const [i, { iteration, format, text, hash }] of contents.entries()) {
    const here = `${path}.contents.${i}`;
    if (iteration !== i + 1) say(`${here}.iteration`, 'Iterations are numbered from 1 on, without a gap.');
    try {
      const content = contentOf(JSON.parse(text) as { format: string });
      if (content.text !== text) say(`${here}.text`, 'The text is not in the canonical form of RFC 8785.');
      else if (content.hash !== hash) say(`${here}.hash`, 'The text is not the one that this hash is of.');
      else if (content.format !== format) say(`${here}.format`, 'The text is of another format.');
      else assertDefinition(text);
    } catch (error) {
      say(
        `${here}.text`,
        error instanceof ApiProblem ? error.detail : 'The text holds no definition of a sheet.',
      );
    }
  }
}

function lifeFaults(one: ExchangedRevision, path: string, say: Say): void {
  const hashes = new Set(one.contents.map(({ hash }) => hash));
  const spoken = [
    ...one.standings.map((row, i) => [`standings.${i}`, row] as const),
    ...one.submissions.map((row, i) => [`submissions.${i}`, row] as const),
    ...one.reviews.map((row, i) => [`reviews.${i}`, row] as const),
    ...one.comments.map((row, i) => [`comments.${i}`, row] as const),
    ...one.problemReports.map((row, i) => [`problemReports.${i}`, row] as const),
  ];
  for (const [place, { hash }] of spoken)
    if (!hashes.has(hash)) say(`${path}.${place}.hash`, 'No content of this revision has this hash.');
  for (const [place, row] of spoken) {
    if (!('iteration' in row)) continue;
    if (one.contents[row.iteration - 1]?.hash !== row.hash)
      say(`${path}.${place}.iteration`, 'This iteration has another content.');
  }
  for (const [i, { standing }] of one.standings.entries()) {
    const before = one.standings[i - 1]?.standing;
    const follows = before === undefined ? standing === 'draft' : NEXT[before].includes(standing);
    if (!follows) say(`${path}.standings.${i}.standing`, `A revision cannot become ${standing} here.`);
  }
}

function signatureFaults(one: ExchangedRevision, path: string, say: Say): void {
  const { approval, originator, reviews, contents, standings } = one;
  const wasApproved = standings.some(({ standing }) => standing === 'approved');
  if (approval === null) {
    if (wasApproved) say(`${path}.approval`, 'An approved revision carries a signature.');
    return;
  }
  if (!wasApproved) say(`${path}.approval`, 'A revision that was never approved carries no signature.');
  if (approval.hash !== contents.at(-1)?.hash)
    say(`${path}.approval.hash`, 'The signature is not on the content of this revision.');
  if (approval.by === originator || reviews.some(({ by }) => by === approval.by))
    say(`${path}.approval.by`, 'Nobody approves what they originated or reviewed.');
  if (reviews.some(({ by }) => by === originator))
    say(`${path}.reviews`, 'Nobody reviews what they originated.');
}

function unique(names: readonly string[], field: string, say: Say): void {
  const seen = new Set<string>();
  for (const [i, name] of names.entries()) {
    if (seen.has(name)) say(`${field}.${i}`, `"${name}" stands in the file twice.`);
    seen.add(name);
  }
}

/** Whether a text is the canonical form of some JSON value. */
export function isCanonical(text: string): boolean {
  try {
    return canonicalText(JSON.parse(text)) === text;
  } catch {
    return false;
  }
}
