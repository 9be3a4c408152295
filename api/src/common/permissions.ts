import type { Role } from './roles.js';

/**
 * The one permission table. A route asks for a permission, never for a role; which object may be touched is then
 * decided by the policy of the feature. The administrator keeps the office running and has no say on content.
 */
const ROLES_BY_PERMISSION = {
  'register.read': ['engineer', 'reviewer', 'authority', 'auditor', 'administrator'],
  'register.read-unapproved': ['reviewer', 'authority', 'auditor'],
  'correlation.evaluate': ['engineer', 'reviewer', 'authority'],
  'evaluation.read-all': ['authority', 'auditor'],
  'correlation.draft': ['engineer', 'reviewer'],
  'correlation.submit': ['engineer', 'reviewer'],
  'correlation.comment': ['engineer', 'reviewer', 'authority'],
  'attachment.add': ['engineer', 'reviewer', 'authority'],
  'correlation.review': ['reviewer'],
  'correlation.approve': ['authority'],
  'correlation.suspend': ['authority'],
  'correlation.withdraw': ['authority'],
  'problem-report.file': ['engineer', 'reviewer', 'authority', 'auditor', 'administrator'],
  'problem-report.answer': ['authority'],
  'register.export': ['authority', 'auditor'],
  'register.import': ['administrator'],
  'people.list': ['engineer', 'reviewer', 'authority', 'administrator'],
  'people.manage': ['administrator'],
  'appointment.read': ['engineer', 'reviewer', 'authority', 'auditor', 'administrator'],
  'appointment.propose': ['administrator'],
  'appointment.end': ['authority', 'administrator'],
  'settings.read': ['engineer', 'reviewer', 'authority', 'auditor', 'administrator'],
  'settings.change': ['administrator'],
  'journal.read': ['authority', 'auditor', 'administrator'],
  'journal.verify': ['authority', 'auditor', 'administrator'],
  'mail.read': ['administrator'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof ROLES_BY_PERMISSION;

export const PERMISSIONS = Object.keys(ROLES_BY_PERMISSION) as readonly Permission[];

export function rolesWith(permission: Permission): readonly Role[] {
  return ROLES_BY_PERMISSION[permission];
}

export function hasPermission(roles: readonly Role[], permission: Permission): boolean {
  return roles.some((role) => rolesWith(permission).includes(role));
}

/** Everything these roles may do, in the order of the table. */
export function permissionsOf(roles: readonly Role[]): Permission[] {
  return PERMISSIONS.filter((permission) => hasPermission(roles, permission));
}
