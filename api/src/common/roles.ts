/** The five roles of an office. A person may hold several, but never administrator together with authority. */
export const ROLES = ['engineer', 'reviewer', 'authority', 'auditor', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

export function isRole(value: unknown): value is Role {
  return ROLES.some((role) => role === value);
}

/** Says why these roles cannot be on one person; undefined when they can. */
export function roleConflict(roles: readonly Role[]): string | undefined {
  if (roles.includes('administrator') && roles.includes('authority')) {
    return 'An administrator has no say on technical content and cannot also be a technical authority.';
  }
  return undefined;
}
