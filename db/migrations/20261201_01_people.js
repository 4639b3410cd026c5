/** Teams, members, sessions, invitations and password resets. */
const roleCheck = `cardinality(roles) between 1 and 6 and roles <@ array[
  'layout-designer', 'thermal-reviewer', 'quality-engineer', 'hardware-lead', 'test-engineer', 'administrator']`;

/** @param {import('knex').Knex} knex */
export async function up(knex) {
  await knex.raw(`
    create table teams (
      id uuid primary key,
      name text not null check (name <> ''),
      created_at timestamptz not null default now()
    );

    create table members (
      id uuid primary key,
      team_id uuid not null references teams,
      name text not null check (name <> ''),
      email text not null check (email = lower(email) and email like '%_@_%'),
      password_hash text not null,
      roles text[] not null check (${roleCheck}),
      joined_at timestamptz not null default now(),
      removed_at timestamptz
    );
    create index members_team_id on members (team_id);
    -- An address signs one person in; a removed member's address may be invited again.
    create unique index members_email on members (email) where removed_at is null;

    create table sessions (
      id uuid primary key,
      member_id uuid not null references members,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      ended_at timestamptz,
      check (expires_at > created_at)
    );
    create index sessions_member_id on sessions (member_id);

    create table invitations (
      id uuid primary key,
      team_id uuid not null references teams,
      name text not null check (name <> ''),
      email text not null check (email = lower(email)),
      roles text[] not null check (${roleCheck}),
      token_hash text not null unique,
      invited_by uuid not null references members,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      accepted_at timestamptz,
      withdrawn_at timestamptz,
      check (accepted_at is null or withdrawn_at is null)
    );
    create index invitations_invited_by on invitations (invited_by);
    create index invitations_team_id on invitations (team_id);
    create unique index invitations_open on invitations (team_id, email)
      where accepted_at is null and withdrawn_at is null;

    create table password_resets (
      id uuid primary key,
      member_id uuid not null references members,
      token_hash text not null unique,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      used_at timestamptz
    );
    create index password_resets_member_id on password_resets (member_id);

    -- Failed tries within a running window, shared by every process.
    create table attempt_counters (
      key text primary key,
      window_started_at timestamptz not null default now(),
      count integer not null check (count >= 0)
    );
  `);
}

/** @param {import('knex').Knex} knex */
export async function down(knex) {
  await knex.raw(`
    drop table attempt_counters;
    drop table password_resets;
    drop table invitations;
    drop table sessions;
    drop table members;
    drop table teams;
  `);
}
