import { useCallback, useMemo } from 'react';
import type { PersonName, Sheet } from '../../../shared/api/types';
import { ErrorSummary } from '../../../shared/ui/error-summary';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { SheetPage } from '../../../shared/ui/sheet-page';
import { useDraft } from '../hooks/use-draft';
import type { Opening } from '../model/opening';
import { BoundsSection } from './bounds-section';
import { ChecksSection } from './checks-section';
import { ConflictNotice, SetAsideNotice } from './conflict-notice';
import { DraftContext, type DraftTools } from './draft-context';
import { DraftHeading } from './draft-heading';
import { EquationSection } from './equation-section';
import { GroupsSection } from './groups-section';
import { HeadSection } from './head-section';
import { LiveMargin } from './live-margin';
import { SaveBar } from './save-bar';
import { SectionIndex } from './section-index';
import { SourcesSection } from './sources-section';
import { StepsSection } from './steps-section';
import { SubmitSection } from './submit-section';
import { summaryOf } from '../model/summary-of';
import { SymbolsSection } from './symbols-section';
import { TrustSection } from './trust-section';
import { VerificationSection } from './verification-section';
import './draft.css';

interface DraftEditorProps {
  opening: Opening;
  person: PersonName;
  /** The sheet is in the register now, under this name. */
  onEntered: (sheet: Sheet) => void;
  onSubmitted: (sheet: Sheet) => void;
}

/** The form for a sheet, from what it is to how it was verified, with what follows from it in the margin. */
export function DraftEditor({ opening, person, onEntered, onSubmitted }: DraftEditorProps) {
  const draft = useDraft(opening, person.id);
  const { form, live, choices, problems, change } = draft;
  const tools = useMemo((): DraftTools => {
    const first = new Map(problems.toReversed().map((problem) => [problem.field, problem]));
    return {
      change,
      problemAt: (path) => first.get(path),
      live,
      geometries: choices.geometries,
      equations: choices.equations,
    };
  }, [problems, change, live, choices.geometries, choices.equations]);
  const tables = useMemo(() => form.tables.map(({ name }) => name).filter(Boolean), [form.tables]);

  const enter = useCallback(async () => {
    const sheet = await draft.enter();
    if (sheet && opening.kind === 'new') onEntered(sheet);
  }, [draft, onEntered, opening.kind]);
  const submit = useCallback(
    async (reviewers: string[]) => {
      const sheet = await draft.submit(reviewers);
      if (sheet) onSubmitted(sheet);
    },
    [draft, onSubmitted],
  );

  return (
    <DraftContext value={tools}>
      <SheetPage
        title={opening.kind === 'new' ? 'Submit a correlation' : `Revise: ${form.head.title}`}
        heading={<DraftHeading draft={draft} />}
        subtitle="Typed here, it stays in this browser; entered in the register, it is saved as you go on."
        margin={<LiveMargin live={live} />}
      >
        <SaveBar draft={draft} onEnter={() => void enter()} />
        <ConflictNotice draft={draft} />
        <SetAsideNotice draft={draft} />
        {draft.refusal ? <ProblemNotice problem={draft.refusal} /> : null}
        {choices.problem ? <ProblemNotice problem={choices.problem} onRetry={choices.retry} /> : null}
        {draft.stopped ? (
          <ErrorSummary
            title={
              draft.stopped.act === 'enter' ? 'The register cannot take it yet' : 'It cannot be submitted yet'
            }
            errors={summaryOf(draft.stopped.problems, form)}
          />
        ) : null}
        <SectionIndex live={live} />
        <form noValidate aria-label="Sheet" onSubmit={(event) => event.preventDefault()}>
          <HeadSection head={form.head} slug={form.slug} settled={opening.kind === 'revision'} />
          <SymbolsSection rows={form.quantities} tables={tables} />
          <GroupsSection rows={form.groups} quantities={form.quantities} />
          <StepsSection rows={form.intermediates} tables={form.tables} quantities={form.quantities} />
          <EquationSection rows={form.parts} />
          <BoundsSection rows={form.bounds} symbols={live.symbols} />
          <TrustSection accuracy={form.accuracy} restrictions={form.restrictions} cautions={form.cautions} />
          <SourcesSection rows={form.sources} />
          <ChecksSection
            rows={form.checks}
            symbols={live.symbols}
            tables={form.tables}
            reports={live.verdict.working.checks}
          />
          <VerificationSection verification={form.verification} />
          <SubmitSection draft={draft} personId={person.id} onSubmit={(ids) => void submit(ids)} />
        </form>
        <p className="draft-caution">
          An approval speaks for this office and the stated use only. Whoever uses a correlation for design
          answers for it, under local codes and with the licence that they ask for.
        </p>
      </SheetPage>
    </DraftContext>
  );
}
