import { SheetPage } from '../../shared/ui/sheet-page';

export function RegisterRoute() {
  return <SheetPage title="Register">{null}</SheetPage>;
}
