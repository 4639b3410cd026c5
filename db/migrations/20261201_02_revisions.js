/** Assemblies, revisions, sketch versions, results and the jobs that make them. */

/** @param {import('knex').Knex} knex */
export async function up(knex) {
  await knex.raw(`
    create table assemblies (
      id uuid primary key,
      team_id uuid not null references teams,
      number text not null check (number <> ''),
      title text not null check (title <> ''),
      created_at timestamptz not null default now(),
      created_by uuid not null references members,
      unique (team_id, number)
    );
    create index assemblies_created_by on assemblies (created_by);

    create table results (
      id uuid primary key,
      team_id uuid not null references teams,
      input_hash text not null,
      method text not null,
      verdict text not null check (verdict in ('within', 'close', 'over', 'not evaluated')),
      result jsonb not null,
      solved_at timestamptz not null default now(),
      unique (team_id, input_hash, method)
    );

    create table heat_fields (
      result_id uuid not null references results on delete cascade,
      condition text not null,
      field bytea not null,
      primary key (result_id, condition)
    );

    create table revisions (
      id uuid primary key,
      team_id uuid not null references teams,
      assembly_id uuid not null references assemblies,
      letter text not null check (letter ~ '^[A-Z]+$'),
      ordinal integer not null check (ordinal >= 1),
      state text not null check (state in
        ('sketch', 'in review', 'sent back', 'cleared', 'issued', 'superseded', 'withdrawn')),
      version integer not null default 1 check (version >= 1),
      state_reason text,
      sketch_version integer not null default 1,
      sketch_hash text not null,
      -- The result that was signed; later methods do not change what was cleared.
      result_id uuid references results,
      -- Names and papers as they were at the issue, so that the record prints alike for ever.
      issued_facts jsonb,
      created_at timestamptz not null default now(),
      created_by uuid not null references members,
      changed_at timestamptz not null default now(),
      changed_by uuid not null references members,
      unique (assembly_id, letter),
      unique (assembly_id, ordinal),
      check (sketch_version <= version),
      check (state not in ('cleared', 'issued', 'superseded') or result_id is not null)
    );
    create index revisions_team_id on revisions (team_id);
    create index revisions_result_id on revisions (result_id);
    create index revisions_sketch_version on revisions (id, sketch_version);
    create index revisions_created_by on revisions (created_by);
    create index revisions_changed_by on revisions (changed_by);

    create table sketch_versions (
      revision_id uuid not null references revisions,
      version integer not null check (version >= 1),
      board jsonb not null check (jsonb_typeof(board) = 'object'),
      board_hash text not null,
      saved_at timestamptz not null default now(),
      saved_by uuid not null references members,
      primary key (revision_id, version)
    );
    create index sketch_versions_saved_by on sketch_versions (saved_by);
    alter table revisions add constraint revisions_present_sketch
      foreign key (id, sketch_version) references sketch_versions (revision_id, version)
      deferrable initially deferred;

    create table solve_jobs (
      id uuid primary key,
      team_id uuid not null references teams,
      revision_id uuid not null references revisions,
      sketch_version integer not null,
      input_hash text not null,
      method text not null,
      state text not null check (state in ('waiting', 'running', 'done', 'failed', 'cancelled')),
      done integer not null default 0 check (done >= 0),
      total integer not null default 0 check (total >= 0),
      message text,
      attempts integer not null default 0 check (attempts >= 0),
      lease_until timestamptz,
      requested_by uuid not null references members,
      created_at timestamptz not null default now(),
      ended_at timestamptz,
      foreign key (revision_id, sketch_version) references sketch_versions (revision_id, version),
      check ((state in ('done', 'failed', 'cancelled')) = (ended_at is not null))
    );
    create index solve_jobs_team_id on solve_jobs (team_id);
    create index solve_jobs_requested_by on solve_jobs (requested_by);
    create index solve_jobs_revision_id on solve_jobs (revision_id, sketch_version);
    create unique index solve_jobs_open on solve_jobs (revision_id, input_hash, method)
      where state in ('waiting', 'running');
    create index solve_jobs_lease on solve_jobs (lease_until) where state in ('waiting', 'running');
  `);
}

/** @param {import('knex').Knex} knex */
export async function down(knex) {
  await knex.raw(`
    drop table solve_jobs;
    alter table revisions drop constraint revisions_present_sketch;
    drop table sketch_versions;
    drop table revisions;
    drop table heat_fields;
    drop table results;
    drop table assemblies;
  `);
}
