import type { RunSql } from './migrations/migration';

/** What the application role may do, table by table; whatever is not named it may not. */
const GRANTS: readonly (readonly [rights: string, table: string])[] = [
  ['select, insert, update (name, default_profile, pins, disabled_at)', 'clients'],
  [
    'select, insert, update (label, origins, profiles, rate_limit, expires_at, revoked_at, last_used_on)',
    'api_keys',
  ],
  ['select, insert, update (title)', 'factor_profiles'],
  [
    'select, insert, update (status, approved_at, approved_by, withdrawn_at, withdrawn_by)',
    'profile_revisions',
  ],
  ['select, insert', 'usage_events'],
  // Only to tell whether rows fell outside the months there are.
  ['select', 'usage_events_default'],
  ['select', 'usage_hourly'],
  ['select, insert, update, delete', 'rate_counts'],
  ['select, insert', 'audit_events'],
  ['select, update (last_sign_in)', 'users'],
  ['select, insert, update, delete', 'sessions'],
  ['select', 'schema_migrations'],
];

/** Gives the application role exactly these rights; run after every migration. */
export async function grantApplication(run: RunSql, role: string): Promise<void> {
  const name = `"${role.replaceAll('"', '""')}"`;
  await run(`
revoke all on all tables in schema public from ${name};
revoke all on all sequences in schema public from ${name};
grant usage on schema public to ${name};
${GRANTS.map(([rights, table]) => `grant ${rights} on ${table} to ${name};`).join('\n')}
`);
}
