import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { paths } from '../shared/paths';
import { PageFrame } from './layout/page-frame';
import { FirstLoading } from './layout/first-loading';
import { lettersRoutes, officeRoutes } from './office-routes';
import { NotFound } from './routes/not-found';
import { RouteError } from './routes/route-error';

/** Each page is its own chunk: the shell stays light. */
const signedInRoutes: RouteObject[] = [
  { path: '/', lazy: async () => ({ Component: (await import('./routes/desk')).DeskRoute }) },
  { path: '/register', lazy: async () => ({ Component: (await import('./routes/register')).RegisterRoute }) },
  {
    path: '/register/new',
    lazy: async () => ({ Component: (await import('./routes/draft-new')).DraftNewRoute }),
  },
  {
    path: '/register/:slug/revise',
    lazy: async () => ({ Component: (await import('./routes/draft-revise')).DraftReviseRoute }),
  },
  { path: '/register/:slug', lazy: async () => ({ Component: (await import('./routes/sheet')).SheetRoute }) },
  {
    path: '/register/:slug/revisions/:n',
    lazy: async () => ({ Component: (await import('./routes/sheet')).SheetRoute }),
  },
  {
    path: '/register/:slug/revisions/:n/review',
    lazy: async () => ({ Component: (await import('./routes/review')).ReviewRoute }),
  },
  {
    path: '/register/:slug/differences',
    lazy: async () => ({ Component: (await import('./routes/differences')).DifferencesRoute }),
  },
  { path: '/reviews', lazy: async () => ({ Component: (await import('./routes/reviews')).ReviewsRoute }) },
  {
    path: '/geometries',
    lazy: async () => ({ Component: (await import('./routes/geometries')).GeometriesRoute }),
  },
  {
    path: '/geometries/:slug',
    lazy: async () => ({ Component: (await import('./routes/geometry')).GeometryRoute }),
  },
  {
    path: '/property-equations',
    lazy: async () => ({ Component: (await import('./routes/property-equations')).PropertyEquationsRoute }),
  },
  {
    path: '/property-equations/:slug',
    lazy: async () => ({ Component: (await import('./routes/property-equation')).PropertyEquationRoute }),
  },
  { path: '/journal', lazy: async () => ({ Component: (await import('./routes/journal')).JournalRoute }) },
  ...officeRoutes,
];

export const routes: RouteObject[] = [
  {
    element: <PageFrame />,
    hydrateFallbackElement: <FirstLoading />,
    errorElement: <RouteError />,
    children: [
      {
        errorElement: <RouteError />,
        children: [
          {
            path: paths.signIn,
            lazy: async () => ({ Component: (await import('./routes/sign-in')).SignInRoute }),
          },
          ...lettersRoutes,
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
