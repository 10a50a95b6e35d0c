import type { Migration } from './migration';

export const people: Migration = {
  name: '005-people',
  up: (run) =>
    run(`
create table users (
  id uuid primary key default gen_random_uuid(),
  email text not null unique check (email = lower(email) and email ~ '^[^@[:space:]]+@[^@[:space:]]+$'),
  name text not null check (name <> ''),
  password_hash text not null check (password_hash ~ '^\\$2[aby]\\$'),
  roles text[] not null
    check (roles <@ array['admin', 'lead', 'engineer', 'checker', 'developer']),
  disabled_at timestamptz,
  created_at timestamptz not null default now(),
  last_sign_in timestamptz
);

-- The shape that connect-pg-simple works with; person_id is ours, read out of the session.
create table sessions (
  sid text primary key,
  sess jsonb not null,
  expire timestamptz not null,
  person_id uuid generated always as ((sess ->> 'personId')::uuid) stored
);
create index sessions_expire on sessions (expire);
create index sessions_person on sessions (person_id);

-- Whoever takes a person out of use, or gives a new password, ends what was signed in by the old.
create function end_sessions() returns trigger language plpgsql as $$
begin
  delete from sessions where person_id = new.id;
  return null;
end $$;
create trigger users_end_sessions after update on users
  for each row when (
    (new.disabled_at is not null and old.disabled_at is null)
    or new.password_hash is distinct from old.password_hash)
  execute function end_sessions();

alter table usage_events add column person_id uuid;

create unique index clients_name on clients (lower(name));
`),
};
