/** Reasons, comments, signatures and the audit trail. */

/** @param {import('knex').Knex} knex */
export async function up(knex) {
  await knex.raw(`
    create table finding_reasons (
      id uuid primary key,
      revision_id uuid not null references revisions,
      rule text not null,
      ref text,
      condition text,
      reason text not null check (reason <> ''),
      given_at timestamptz not null default now(),
      given_by uuid not null references members,
      unique nulls not distinct (revision_id, rule, ref, condition)
    );
    create index finding_reasons_given_by on finding_reasons (given_by);

    create table comments (
      id uuid primary key,
      revision_id uuid not null references revisions,
      author_id uuid not null references members,
      text text not null check (text <> ''),
      place_kind text,
      place_id text,
      created_at timestamptz not null default now(),
      resolved_at timestamptz,
      resolved_by uuid references members,
      check ((place_kind is null) = (place_id is null)),
      check ((resolved_at is null) = (resolved_by is null))
    );
    create index comments_revision_id on comments (revision_id, created_at);
    create index comments_author_id on comments (author_id);
    create index comments_resolved_by on comments (resolved_by);

    create table signatures (
      id uuid primary key,
      revision_id uuid not null references revisions,
      member_id uuid not null references members,
      -- As it was when signed; a later change of name does not alter a signature.
      name text not null,
      meaning text not null check (meaning in ('authored', 'reviewed', 'released')),
      sketch_version integer not null,
      signed_at timestamptz not null default now(),
      foreign key (revision_id, sketch_version) references sketch_versions (revision_id, version)
    );
    create index signatures_revision_id on signatures (revision_id, sketch_version);
    create index signatures_member_id on signatures (member_id);

    create table audit_events (
      sequence bigint generated always as identity primary key,
      team_id uuid not null references teams,
      at timestamptz not null default now(),
      actor_id uuid references members,
      actor text not null,
      kind text not null,
      subject text not null,
      revision_id uuid references revisions,
      facts jsonb not null default '{}'
    );
    create index audit_events_team_id on audit_events (team_id, sequence desc);
    create index audit_events_revision_id on audit_events (revision_id, sequence desc);
    create index audit_events_kind on audit_events (team_id, kind, sequence desc);
    create index audit_events_actor_id on audit_events (actor_id);
  `);
}

/** @param {import('knex').Knex} knex */
export async function down(knex) {
  await knex.raw(`
    drop table audit_events;
    drop table signatures;
    drop table comments;
    drop table finding_reasons;
  `);
}
