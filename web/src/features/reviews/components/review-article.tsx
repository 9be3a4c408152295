import { compileCorrelation, definitionTex } from '@merestone/engine';
import { useMemo, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { Iteration, Review } from '../../../shared/api/types';
import { authorWords } from '../../../shared/format/author-words';
import { paths } from '../../../shared/paths';
import { RunningHead } from '../../../shared/ui/running-head';
import { SheetPage } from '../../../shared/ui/sheet-page';
import type { ReviewActs } from '../hooks/use-review-acts';
import { ApprovalForm } from './approval-form';
import { FieldRows } from './field-rows';
import { IterationList } from './iteration-list';
import { MachineReport } from './machine-report';
import { PutForwardForm } from './put-forward-form';
import { ReviewState } from './review-state';
import { sheetFields } from './sheet-fields';
import { StandingActs } from './standing-acts';
import { VerdictForm } from './verdict-form';
import { VerdictList } from './verdict-list';
import './review.css';

interface ReviewArticleProps {
  review: Review;
  acts: ReviewActs;
  /** Sets a worked check of the sheet by its place. */
  check: (place: number) => ReactNode;
  /** Sets what an iteration changed. */
  differences: (iteration: Iteration) => ReactNode;
}

/** The review of a revision as a page: how far it is, the machine's findings, every field, verdicts, decision. */
export function ReviewArticle({ review, acts, check, differences }: ReviewArticleProps) {
  const { definition, abilities, slug, revision } = review;
  const tex = useMemo(() => {
    const compilation = compileCorrelation(definition);
    return compilation.ok ? definitionTex(compilation.compiled) : null;
  }, [definition]);
  const groups = sheetFields({ definition, tex, check });
  const rows = groups.flatMap(({ fields }) => fields.map(({ path }) => path));
  const remarks = review.inspection?.remarks.filter(({ verdict }) => verdict !== 'passed') ?? [];
  const decides = abilities.approve || abilities.decline;
  return (
    <SheetPage
      title={`Review: ${review.title}`}
      heading={review.title}
      subtitle={`Review of revision ${revision}, iteration ${review.iteration}`}
      runningHead={
        <RunningHead
          geometry={
            <Link to={paths.geometry(definition.geometry)}>{definition.geometry.replaceAll('-', ' ')}</Link>
          }
          correlation={authorWords(definition.authors)}
          revision={revision}
          standing={review.standing}
          hash={review.hash}
        />
      }
    >
      <ReviewState review={review} groups={groups} onTake={acts.take} />
      <MachineReport inspection={review.inspection} rows={rows} />
      <FieldRows groups={groups} comments={review.comments} remarks={remarks} talk={acts.talk} />
      <IterationList iterations={review.iterations} rounds={review.rounds} differences={differences} />
      <VerdictList review={review} />
      {abilities.putForward ? <PutForwardForm review={review} onPutForward={acts.putForward} /> : null}
      {abilities.verdict ? (
        <VerdictForm review={review} onVerdict={acts.verdict} onReload={acts.reload} />
      ) : null}
      {decides ? (
        <section className="decision" aria-labelledby="decision">
          <h2 id="decision" tabIndex={-1}>
            Decision
          </h2>
          {abilities.approve ? (
            <ApprovalForm review={review} onApprove={acts.approve} onReload={acts.reload} />
          ) : null}
        </section>
      ) : null}
      <div className="act-line">
        <StandingActs revisionKey={{ slug, revision }} geometry={definition.geometry} abilities={abilities} />
      </div>
    </SheetPage>
  );
}
