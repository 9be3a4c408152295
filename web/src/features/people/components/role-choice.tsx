import { Link } from 'react-router-dom';
import type { Role } from '../../../shared/api/types';
import { paths } from '../../../shared/paths';
import { CheckList } from '../../../shared/ui/fields/check-list';
import { excludedRoles } from '../model/person-errors';

const ROLES: readonly { value: Role; label: string; hint: string }[] = [
  { value: 'engineer', label: 'Engineer', hint: 'finds, evaluates, drafts and submits' },
  { value: 'reviewer', label: 'Reviewer', hint: 'checks what others submit against its source' },
  { value: 'authority', label: 'Technical authority', hint: 'approves, suspends and withdraws' },
  { value: 'auditor', label: 'Auditor', hint: 'reads everything and changes nothing' },
  { value: 'administrator', label: 'Administrator', hint: 'people, settings and mail; no say on content' },
];

interface RoleChoiceProps {
  id: string;
  roles: readonly Role[];
  /** Whether the person is a technical authority already: the role can be taken here, never given. */
  isAuthority: boolean;
  error: string | undefined;
  onChange: (roles: Role[]) => void;
}

/** Roles to tick, with the rule on them beside, and said at once where two exclude each other. */
export function RoleChoice({ id, roles, isAuthority, error, onChange }: RoleChoiceProps) {
  return (
    <CheckList
      id={id}
      legend="Roles"
      choices={ROLES.filter(({ value }) => value !== 'authority' || isAuthority)}
      chosen={roles}
      error={excludedRoles(roles) ?? error}
      onChange={onChange}
      hint={
        <>
          Administrator and technical authority exclude each other: who runs the office does not decide on
          content.{' '}
          {isAuthority ? (
            'Without the role, the appointment ends as well; it is given back by a new one.'
          ) : (
            <>
              A technical authority is appointed by two people:{' '}
              <Link to={paths.appointments}>propose an appointment</Link>.
            </>
          )}
        </>
      }
    />
  );
}
