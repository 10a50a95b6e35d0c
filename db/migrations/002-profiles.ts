import type { Migration } from './migration';

export const profiles: Migration = {
  name: '002-profiles',
  up: (run) =>
    run(`
create table factor_profiles (
  slug text primary key check (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
  title text not null,
  owner text not null,
  created_at timestamptz not null default now()
);

create table profile_revisions (
  slug text not null references factor_profiles (slug),
  revision integer not null check (revision > 0),
  status text not null check (status in ('draft', 'proposed', 'approved', 'withdrawn')),
  tree jsonb not null check (jsonb_typeof(tree) = 'object'),
  departures jsonb not null check (jsonb_typeof(departures) = 'array'),
  sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
  effective_from timestamptz not null default now(),
  expires_at timestamptz,
  approved_at timestamptz,
  approved_by text,
  withdrawn_at timestamptz,
  withdrawn_by text,
  created_at timestamptz not null default now(),
  primary key (slug, revision),
  check (status <> 'approved' or (approved_at is not null and approved_by is not null)),
  check (status <> 'withdrawn' or (withdrawn_at is not null and withdrawn_by is not null)),
  check (expires_at > effective_from)
);

alter table clients
  add foreign key (default_profile) references factor_profiles (slug);

-- Whoever asks, the owner included: results already given stand on what was approved.
create function guard_approved_revision() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    if old.approved_at is null then return old; end if;
    raise exception 'revision %@% was approved and cannot be deleted', old.slug, old.revision
      using errcode = 'HT001';
  end if;
  if old.approved_at is null then return new; end if;
  if (old.slug, old.revision, old.tree, old.departures, old.sha256, old.effective_from,
      old.expires_at, old.approved_at, old.approved_by, old.created_at)
    is distinct from
     (new.slug, new.revision, new.tree, new.departures, new.sha256, new.effective_from,
      new.expires_at, new.approved_at, new.approved_by, new.created_at)
  then
    raise exception 'revision %@% was approved and cannot be changed', old.slug, old.revision
      using errcode = 'HT001';
  end if;
  if old.status = 'withdrawn' and (old.status, old.withdrawn_at, old.withdrawn_by)
    is distinct from (new.status, new.withdrawn_at, new.withdrawn_by)
    or new.status not in ('approved', 'withdrawn')
  then
    raise exception 'revision %@% was approved: it can only be withdrawn, once', old.slug,
      old.revision using errcode = 'HT001';
  end if;
  return new;
end $$;

create trigger profile_revisions_guard before update or delete on profile_revisions
  for each row execute function guard_approved_revision();

create function refuse_truncate() returns trigger language plpgsql as $$
begin
  raise exception 'table % is never emptied', tg_table_name using errcode = 'HT001';
end $$;
create trigger profile_revisions_keep before truncate on profile_revisions
  for each statement execute function refuse_truncate();

create trigger factor_profiles_notify after insert or delete on factor_profiles
  for each row execute function notify_headtree_changes('profiles');
create trigger factor_profiles_notify_update after update on factor_profiles
  for each row when (old is distinct from new)
  execute function notify_headtree_changes('profiles');
create trigger profile_revisions_notify after insert or delete on profile_revisions
  for each row execute function notify_headtree_changes('profiles');
create trigger profile_revisions_notify_update after update on profile_revisions
  for each row when (old is distinct from new)
  execute function notify_headtree_changes('profiles');
`),
};
