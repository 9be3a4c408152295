import type { JournalEntry } from '../../../shared/api/types';
import { paths } from '../../../shared/paths';

/** What was acted on, in words, and the page it has; null where the sentence already says it. */
export function subjectOf({ act, subject }: Pick<JournalEntry, 'act' | 'subject'>) {
  const [kind = '', name = '', , number] = subject.split('/');
  if (kind === '' || kind === 'office' || (act.startsWith('session.') && kind === 'people')) return null;
  const revision = number !== undefined && /^\d+$/.test(number) ? Number(number) : null;
  if (kind === 'correlations' && name !== '')
    return revision === null
      ? { words: name, to: paths.sheet(name) }
      : { words: `${name}, rev ${revision}`, to: paths.revision(name, revision) };
  if (kind === 'property-equations' && name !== '') return { words: name, to: paths.propertyEquation(name) };
  return { words: subject, to: null };
}
