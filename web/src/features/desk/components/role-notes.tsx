import type { Role } from '../../../shared/api/types';
import { MarginNote } from '../../../shared/ui/margin-note';

const ROLES: Readonly<Record<Role, { title: string; does: string }>> = {
  engineer: {
    title: 'As an engineer',
    does: 'you evaluate with the register and put correlations forward for it.',
  },
  reviewer: {
    title: 'As a reviewer',
    does: 'you hold what others put forward against its source, and say what is wrong, field by field.',
  },
  authority: {
    title: 'As a technical authority',
    does: 'you decide what may be used for design, and take out of use what may not.',
  },
  auditor: {
    title: 'As an auditor',
    does: 'you read everything and change nothing; the journal can be verified at any time.',
  },
  administrator: {
    title: 'As an administrator',
    does: 'you look after people, mail and settings. Content is for others to decide.',
  },
};

/** What the person's roles mean here, in the margin. */
export function RoleNotes({ roles }: { roles: readonly Role[] }) {
  return roles.map((role) => (
    <MarginNote key={role} title={ROLES[role].title}>
      {ROLES[role].does}
    </MarginNote>
  ));
}
