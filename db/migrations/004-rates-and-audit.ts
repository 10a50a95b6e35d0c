import type { Migration } from './migration';

export const ratesAndAudit: Migration = {
  name: '004-rates-and-audit',
  up: (run) =>
    run(`
create unlogged table rate_counts (
  policy text not null,
  subject text not null,
  window_start timestamptz not null,
  hits integer not null,
  primary key (policy, subject, window_start)
);
create index rate_counts_window on rate_counts (window_start);

create table audit_events (
  id bigint generated always as identity primary key,
  at timestamptz not null default now(),
  actor text not null,
  action text not null,
  subject text not null,
  detail jsonb not null default '{}'
);
create index audit_events_subject on audit_events (subject, id);
`),
};
