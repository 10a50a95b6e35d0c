/** What the service lets a person do, by the service's own names. */
export type Permission =
  | 'checks:run'
  | 'profiles:read'
  | 'clients:read'
  | 'clients:write'
  | 'keys:read'
  | 'keys:write'
  | 'usage:read';

const roleWords: Readonly<Record<string, string>> = {
  lead: 'lead engineer',
  checker: 'independent checker',
};

/** `lead engineer, admin` */
export const rolesInWords = (roles: readonly string[]): string =>
  roles.map((role) => roleWords[role] ?? role).join(', ');
