import { SheetPage } from '../../shared/ui/sheet-page';

export function SignInRoute() {
  return <SheetPage title="Sign in">{null}</SheetPage>;
}
