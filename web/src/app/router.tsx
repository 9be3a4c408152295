import { Navigate, createBrowserRouter, type RouteObject } from 'react-router-dom';
import { paths } from '../shared/paths';
import { Loading } from '../shared/ui/loading';
import { PageFrame } from './layout/page-frame';
import { NotFound } from './routes/not-found';
import { RouteError } from './routes/route-error';

/** Each page is its own chunk: the shell stays light. */
const signedInRoutes: RouteObject[] = [
  { path: '/', element: <Navigate to={paths.start} replace /> },
  { path: '/register', lazy: async () => ({ Component: (await import('./routes/register')).RegisterRoute }) },
  { path: '/register/:slug', lazy: async () => ({ Component: (await import('./routes/sheet')).SheetRoute }) },
  {
    path: '/register/:slug/revisions/:n',
    lazy: async () => ({ Component: (await import('./routes/sheet')).SheetRoute }),
  },
];

export const routes: RouteObject[] = [
  {
    element: <PageFrame />,
    hydrateFallbackElement: <Loading what="the page" />,
    errorElement: <RouteError />,
    children: [
      {
        errorElement: <RouteError />,
        children: [
          {
            path: paths.signIn,
            lazy: async () => ({ Component: (await import('./routes/sign-in')).SignInRoute }),
          },
          {
            lazy: async () => ({ Component: (await import('./layout/signed-in-area')).SignedInArea }),
            children: signedInRoutes,
          },
          { path: '*', element: <NotFound /> },
        ],
      },
    ],
  },
];

export function createRouter() {
  return createBrowserRouter(routes);
}
