import type { Migration } from './migration';

export const clientsAndKeys: Migration = {
  name: '001-clients-and-keys',
  up: (run) =>
    run(`
create table clients (
  id uuid primary key default gen_random_uuid(),
  name text not null check (name <> ''),
  default_profile text,
  pins jsonb not null default '{}' check (jsonb_typeof(pins) = 'object'),
  created_at timestamptz not null default now(),
  disabled_at timestamptz
);

create table api_keys (
  id uuid primary key default gen_random_uuid(),
  client_id uuid not null references clients (id),
  kind text not null check (kind in ('secret', 'page', 'cell')),
  selector text not null unique,
  secret_sha256 bytea not null check (octet_length(secret_sha256) = 32),
  label text not null,
  scopes text[] not null,
  origins text[] not null default '{}',
  profiles text[],
  rate_limit integer check (rate_limit > 0),
  created_at timestamptz not null default now(),
  expires_at timestamptz,
  revoked_at timestamptz,
  last_used_on date,
  check (kind = 'page' or origins = '{}'),
  check (kind <> 'cell' or expires_at <= created_at + interval '90 days')
);
create index api_keys_client on api_keys (client_id);

create function notify_headtree_changes() returns trigger language plpgsql as $$
begin
  perform pg_notify('headtree_changes', tg_argv[0]);
  return null;
end $$;

create trigger clients_notify after insert or delete on clients
  for each row execute function notify_headtree_changes('keys');
create trigger clients_notify_update after update on clients
  for each row when (old is distinct from new)
  execute function notify_headtree_changes('keys');

create trigger api_keys_notify after insert or delete on api_keys
  for each row execute function notify_headtree_changes('keys');
-- last_used_on is left out: calls change it, and a call must never notify.
create trigger api_keys_notify_update after update on api_keys
  for each row when (
    (old.client_id, old.kind, old.selector, old.secret_sha256, old.label, old.scopes, old.origins,
     old.profiles, old.rate_limit, old.expires_at, old.revoked_at)
    is distinct from
    (new.client_id, new.kind, new.selector, new.secret_sha256, new.label, new.scopes, new.origins,
     new.profiles, new.rate_limit, new.expires_at, new.revoked_at))
  execute function notify_headtree_changes('keys');
`),
};
