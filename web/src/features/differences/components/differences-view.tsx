import type { Sheet } from '../../../shared/api/types';
import { EmptyState } from '../../../shared/ui/empty-state';
import { ChoiceField } from '../../../shared/ui/fields/choice-field';
import { Loading } from '../../../shared/ui/loading';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useDifferences } from '../api/use-differences';
import type { ChosenRevisions } from '../model/chosen-revisions';
import { countWords } from '../model/sections';
import { DifferenceList } from './difference-list';

interface DifferencesViewProps {
  slug: string;
  revisions: Sheet['revisions'];
  chosen: ChosenRevisions;
  onChoose: (chosen: ChosenRevisions) => void;
}

/** Two revisions to choose, and what the later one changed. */
export function DifferencesView({ slug, revisions, chosen, onChoose }: DifferencesViewProps) {
  const { from, to } = chosen;
  const { answer, problem, retry } = useDifferences(slug, from, to);
  const choices = revisions.map(({ number, standing }) => ({
    value: String(number),
    label: `rev ${number}, ${standing}`,
  }));
  return (
    <>
      <div className="differences-choice">
        <ChoiceField
          label="From"
          value={String(from)}
          choices={choices}
          onChange={(number) => onChoose({ from: Number(number), to })}
        />
        <ChoiceField
          label="To"
          value={String(to)}
          choices={choices}
          onChange={(number) => onChoose({ from, to: Number(number) })}
        />
      </div>
      <p className="differences-count" role="status">
        {answer ? countWords(answer.differences) : ''}
      </p>
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!answer && !problem ? <Loading what="the differences" /> : null}
      {answer?.differences.length === 0 ? (
        <EmptyState title="The two say the same">
          <p>
            {from === to ? 'It is the same revision twice.' : 'Not one field differs.'} Choose another pair.
          </p>
        </EmptyState>
      ) : null}
      {answer ? <DifferenceList {...answer} /> : null}
    </>
  );
}
