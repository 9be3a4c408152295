import { useCallback } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { SubmitLink } from '../../features/draft/components/draft-links';
import { RegisterView } from '../../features/register/components/register-view';
import {
  readFilters,
  writeFilters,
  type RegisterFilters,
} from '../../features/register/model/register-filters';
import { paths } from '../../shared/paths';
import { MarginNote } from '../../shared/ui/margin-note';
import { SheetPage } from '../../shared/ui/sheet-page';

export function RegisterRoute() {
  const [search, setSearch] = useSearchParams();
  const change = useCallback(
    (filters: RegisterFilters) => setSearch(writeFilters(filters), { replace: true }),
    [setSearch],
  );
  return (
    <SheetPage
      title="Register"
      wide
      subtitle="The published correlations of this office, and where each one holds."
      margin={<RegisterNotes />}
    >
      <SubmitLink />
      <RegisterView filters={readFilters(search)} onChange={change} />
    </SheetPage>
  );
}

function RegisterNotes() {
  return (
    <>
      <MarginNote title="How to read the strips">
        Stones mark the bounds of the Reynolds number, all on one scale. Dotted ground: no bound is stated on
        that side. Each correlation has its own characteristic length, so its Reynolds number is its own too.
      </MarginNote>
      <MarginNote title="Standing">
        Approved means: by this office, for the stated use. The others may be read; their sheets say why they
        are not approved.
      </MarginNote>
      <MarginNote title="Looking for a shape?">
        <Link to={paths.geometries}>The geometries</Link>, each with its sketch, its length and its velocity.
      </MarginNote>
    </>
  );
}
