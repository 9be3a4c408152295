import { useCallback, useState } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import useSWR from 'swr';
import { fetchSheet } from '../../features/draft/api/draft-sheets';
import { DraftEditor } from '../../features/draft/components/draft-editor';
import { newStoreName, openNew } from '../../features/draft/model/opening';
import { draftKey, readStoredDraft } from '../../features/draft/model/stored-draft';
import type { ApiProblem } from '../../shared/api/api-problem';
import type { PersonName, Sheet } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { NoDrafting } from './no-drafting';

/** A new correlation, from nothing or after the pattern of a sheet (`?pattern=<slug>`). */
export function DraftNewRoute() {
  const [search] = useSearchParams();
  const { session, may } = useSession();
  const pattern = search.get('pattern');
  if (!session) return null;
  if (!may('correlation.draft')) return <NoDrafting />;
  return <PatternLoaded key={pattern ?? ''} slug={pattern} person={session.person} />;
}

function PatternLoaded({ slug, person }: { slug: string | null; person: PersonName }) {
  const { data, error } = useSWR<Sheet, ApiProblem>(
    slug === null ? null : ['draft-pattern', slug],
    () => fetchSheet(slug ?? ''),
    { revalidateIfStale: false, revalidateOnReconnect: false },
  );
  if (slug === null) return <NewDraft pattern={null} person={person} />;
  if (data) return <NewDraft pattern={data} person={person} />;
  return (
    <SheetPage title="Submit a correlation">
      {error ? <ProblemNotice problem={error} /> : <Loading what="the pattern" />}
      {error ? <Link to={paths.draftNew()}>Begin without a pattern</Link> : null}
    </SheetPage>
  );
}

function NewDraft({ pattern, person }: { pattern: Sheet | null; person: PersonName }) {
  const navigate = useNavigate();
  const [opening] = useState(() =>
    openNew(
      readStoredDraft(window.localStorage, draftKey(person.id, newStoreName(pattern?.slug ?? null))),
      pattern,
    ),
  );
  const toRevise = useCallback(
    (sheet: Sheet) => void navigate(paths.revise(sheet.slug), { replace: true }),
    [navigate],
  );
  const toSheet = useCallback(
    (sheet: Sheet) => void navigate(paths.revision(sheet.slug, sheet.revision)),
    [navigate],
  );
  return <DraftEditor opening={opening} person={person} onEntered={toRevise} onSubmitted={toSheet} />;
}
