import { NavLink } from 'react-router-dom';
import type { Permission } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import './office-nav.css';

const PAGES: readonly { to: string; noun: string; permission: Permission }[] = [
  { to: paths.people, noun: 'People', permission: 'people.manage' },
  { to: paths.appointments, noun: 'Appointments', permission: 'appointment.read' },
  { to: paths.settings, noun: 'Settings', permission: 'settings.read' },
  { to: paths.outbox, noun: 'Outbox', permission: 'mail.read' },
];

/** The pages of the office that somebody may see, on top of each of them. */
export function OfficeNav() {
  const { may } = useSession();
  return (
    <nav aria-label="Office" className="office-nav">
      <ul>
        {PAGES.filter(({ permission }) => may(permission)).map(({ to, noun }) => (
          <li key={to}>
            <NavLink to={to}>{noun}</NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
