import { Link } from 'react-router-dom';
import { paths } from '../../shared/paths';
import { SheetPage } from '../../shared/ui/sheet-page';

/** What somebody sees whose roles write no sheets. */
export function NoDrafting() {
  return (
    <SheetPage title="Sheets are written by engineers and reviewers">
      <p>
        Your role reads the register and does not write in it. What is wrong with a sheet can be told on the
        sheet itself.
      </p>
      <p>
        <Link to={paths.register}>Back to the register</Link>
      </p>
    </SheetPage>
  );
}
