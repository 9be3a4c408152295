import { Link } from 'react-router-dom';
import { paths } from '../../shared/paths';
import { SheetPage } from '../../shared/ui/sheet-page';

export function NotFound() {
  return (
    <SheetPage title="No page here" subtitle="Nothing of this office is kept under that address.">
      <p>
        It may have been mistyped, or the link is older than the page.{' '}
        <Link to={paths.register}>Search the register</Link> for what you were after.
      </p>
    </SheetPage>
  );
}
