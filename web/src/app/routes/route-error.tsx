import { Button } from 'antd';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { SheetPage } from '../../shared/ui/sheet-page';
import { NotFound } from './not-found';

/** The page when another page failed to load or to draw itself. */
export function RouteError() {
  const error = useRouteError();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFound />;
  return (
    <SheetPage title="This page could not be shown" subtitle="The rest of Merestone is still there.">
      <p>
        Loading it again usually helps: a new version may have been installed since you opened it. If not,
        tell whoever looks after this server.
      </p>
      {error instanceof Error && error.message ? (
        <p style={{ color: 'var(--faded)' }}>{error.message}</p>
      ) : null}
      <p style={{ marginTop: '1rem' }}>
        <Button onClick={() => window.location.reload()}>Load again</Button>
      </p>
    </SheetPage>
  );
}
