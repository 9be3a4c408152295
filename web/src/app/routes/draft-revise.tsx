import { useCallback, useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import useSWR from 'swr';
import { fetchRevisionOpening, type RevisionOpening } from '../../features/draft/api/fetch-opening';
import { DraftEditor } from '../../features/draft/components/draft-editor';
import { openRevise, reviseStoreName } from '../../features/draft/model/opening';
import { draftKey, readStoredDraft } from '../../features/draft/model/stored-draft';
import type { ApiProblem } from '../../shared/api/api-problem';
import type { PersonName, Sheet } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { NoDrafting } from './no-drafting';

/** The revision of a sheet that is being worked on, or the next one. */
export function DraftReviseRoute() {
  const { slug = '' } = useParams();
  const { session, may } = useSession();
  if (!session) return null;
  if (!may('correlation.draft')) return <NoDrafting />;
  return <RevisionLoaded key={slug} slug={slug} person={session.person} />;
}

function RevisionLoaded({ slug, person }: { slug: string; person: PersonName }) {
  // What the editor began with stays: it saves against that, and asks when the register has moved on.
  const { data, error, mutate, isValidating } = useSWR<RevisionOpening, ApiProblem>(
    ['draft-opening', slug],
    () => fetchRevisionOpening(slug),
    { revalidateOnMount: true, revalidateOnReconnect: false },
  );
  const [begun, setBegun] = useState<RevisionOpening | null>(null);
  if (begun === null && data && !isValidating) setBegun(data);
  if (begun?.open && !begun.open.abilities.edit) return <WorkedOnByOthers open={begun.open} />;
  if (begun) return <ReviseDraft opening={begun} person={person} />;
  return (
    <SheetPage title="Revise">
      {error ? (
        <ProblemNotice problem={error} {...(error.status === 404 ? {} : { onRetry: () => void mutate() })} />
      ) : (
        <Loading what="the sheet" />
      )}
    </SheetPage>
  );
}

function WorkedOnByOthers({ open }: { open: Sheet }) {
  return (
    <SheetPage title={open.title}>
      <p>
        Revision {open.revision} is {open.standing} in the hands of {open.originator.name}; only its
        originator edits it. A sheet has one revision at a time that is worked on.
      </p>
      <p>
        <Link to={paths.revision(open.slug, open.revision)}>See revision {open.revision}</Link>
      </p>
    </SheetPage>
  );
}

function ReviseDraft({ opening: begun, person }: { opening: RevisionOpening; person: PersonName }) {
  const navigate = useNavigate();
  const [opening] = useState(() =>
    openRevise(
      readStoredDraft(window.localStorage, draftKey(person.id, reviseStoreName(begun.sheet.slug))),
      begun,
    ),
  );
  const toSheet = useCallback(
    (sheet: Sheet) => void navigate(paths.revision(sheet.slug, sheet.revision)),
    [navigate],
  );
  return <DraftEditor opening={opening} person={person} onEntered={toSheet} onSubmitted={toSheet} />;
}
