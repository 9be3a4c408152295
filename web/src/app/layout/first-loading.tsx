import { Loading } from '../../shared/ui/loading';

/** Before the first page's own code has come. */
export function FirstLoading() {
  return (
    <main className="first-loading">
      <Loading what="the page" />
    </main>
  );
}
