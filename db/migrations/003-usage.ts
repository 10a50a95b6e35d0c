import type { Migration } from './migration';

export const usage: Migration = {
  name: '003-usage',
  up: (run) =>
    run(`
-- No foreign keys: a call is logged whatever became of its key, and rows are written in bulk.
create table usage_events (
  id char(26) collate "C" not null,
  at timestamptz not null,
  phase text not null default 'whole' check (phase in ('whole', 'start', 'end')),
  client_id uuid,
  key_id uuid,
  key_selector text,
  method text not null,
  route text not null,
  check_id text,
  profile text,
  profile_revision integer,
  http_status smallint,
  code text,
  answer text,
  utilisation double precision,
  governing text,
  items integer,
  duration_us integer,
  address inet,
  origin text,
  caller_request_id text,
  repeats integer not null default 1 check (repeats > 0),
  primary key (id, at)
) partition by range (at);
create index usage_events_client on usage_events (client_id, id);
create index usage_events_at on usage_events using brin (at);
create table usage_events_default partition of usage_events default;

create table usage_hourly (
  hour timestamptz not null,
  client_id uuid,
  route text not null,
  http_status smallint,
  answer text,
  calls integer not null,
  duration_us_sum bigint not null
);
create unique index usage_hourly_group on usage_hourly (
  hour, route, coalesce(client_id, '00000000-0000-0000-0000-000000000000'),
  coalesce(http_status, 0), coalesce(answer, ''));
create index usage_hourly_client on usage_hourly (client_id, hour);

-- How far a piece of background work has come.
create table work_marks (
  work text primary key,
  reached timestamptz not null
);
`),
};
