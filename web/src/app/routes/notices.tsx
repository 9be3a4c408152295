import { Link } from 'react-router-dom';
import { NoticesView } from '../../features/notices/components/notices-view';
import { paths } from '../../shared/paths';
import { MarginNote } from '../../shared/ui/margin-note';
import { SheetPage } from '../../shared/ui/sheet-page';

export function NoticesRoute() {
  return (
    <SheetPage
      title="Notices"
      subtitle="What you were told, the latest first."
      margin={
        <MarginNote title="By mail, too?">
          Which kinds come by mail is yours to choose, <Link to={paths.account}>on your own page</Link>.
        </MarginNote>
      }
    >
      <NoticesView />
    </SheetPage>
  );
}
