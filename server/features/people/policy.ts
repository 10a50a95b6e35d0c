/** What a person is to the firm; one person may be several things. */
export const roles = ['admin', 'lead', 'engineer', 'checker', 'developer'] as const;
export type Role = (typeof roles)[number];

/** Who may do what. A permission that is not in this table is nobody's. */
export const policy = {
  'catalogue:read': roles,
  'checks:run': roles,
  'profiles:read': roles,
  'clients:read': ['admin', 'lead', 'developer'],
  'clients:write': ['admin'],
  'keys:read': ['admin', 'developer'],
  'keys:write': ['admin'],
  'usage:read': ['admin', 'lead', 'developer'],
} as const satisfies Readonly<Record<string, readonly Role[]>>;

export type Permission = keyof typeof policy;

export const permissions = Object.keys(policy) as Permission[];

/** All that the roles allow together, in the order of the table. */
export const permissionsOf = (held: readonly Role[]): Permission[] =>
  permissions.filter((permission) => {
    const allowed: readonly Role[] = policy[permission];
    return held.some((role) => allowed.includes(role));
  });

export const isRole = (text: string): text is Role => (roles as readonly string[]).includes(text);
