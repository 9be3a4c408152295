import { Navigate, type RouteObject } from 'react-router-dom';
import { paths } from '../shared/paths';
import { useSession } from '../shared/session/use-session';

/** The office has no page of its own: it opens on the first one that somebody has something to do on. */
function OfficeStart() {
  const { may } = useSession();
  return <Navigate to={may('people.manage') ? paths.people : paths.appointments} replace />;
}

/** The pages of the office and of whoever is signed in. */
export const officeRoutes: RouteObject[] = [
  { path: '/office', element: <OfficeStart /> },
  {
    path: '/office/people',
    lazy: async () => ({ Component: (await import('./routes/office-people')).OfficePeopleRoute }),
  },
  {
    path: '/office/appointments',
    lazy: async () => ({ Component: (await import('./routes/office-appointments')).OfficeAppointmentsRoute }),
  },
  {
    path: '/office/settings',
    lazy: async () => ({ Component: (await import('./routes/office-settings')).OfficeSettingsRoute }),
  },
  {
    path: '/office/outbox',
    lazy: async () => ({ Component: (await import('./routes/office-outbox')).OfficeOutboxRoute }),
  },
  {
    path: '/office/outbox/:id',
    lazy: async () => ({ Component: (await import('./routes/office-letter')).OfficeLetterRoute }),
  },
  { path: '/account', lazy: async () => ({ Component: (await import('./routes/account')).AccountRoute }) },
  { path: '/notices', lazy: async () => ({ Component: (await import('./routes/notices')).NoticesRoute }) },
];

/** Pages that a link in a letter opens for somebody who cannot sign in yet, or not any more. */
export const lettersRoutes: RouteObject[] = [
  {
    path: '/invitation/:token',
    lazy: async () => ({ Component: (await import('./routes/invitation')).InvitationRoute }),
  },
  {
    path: '/password-reset',
    lazy: async () => ({ Component: (await import('./routes/password-reset')).PasswordResetRoute }),
  },
  {
    path: '/password-reset/:token',
    lazy: async () => ({ Component: (await import('./routes/new-password')).NewPasswordRoute }),
  },
];
