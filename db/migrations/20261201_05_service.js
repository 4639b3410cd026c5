/** Mail that waits, answers that may be asked for twice, the part library and signs of life. */

/** @param {import('knex').Knex} knex */
export async function up(knex) {
  await knex.raw(`
    create table mail_outbox (
      id uuid primary key,
      team_id uuid not null references teams,
      -- Fixed before the first try, so that a copy sent twice is recognised as one message.
      message_id text not null unique,
      recipient text not null,
      subject text not null check (subject !~ '[\\r\\n]'),
      text text not null,
      -- Holds a link that lets its reader in: the text is emptied once it was sent.
      holds_token boolean not null default false,
      created_at timestamptz not null default now(),
      next_try_at timestamptz not null default now(),
      tries integer not null default 0 check (tries >= 0),
      claimed_until timestamptz,
      sent_at timestamptz,
      failed_at timestamptz,
      last_error text,
      check (sent_at is null or failed_at is null)
    );
    create index mail_outbox_team_id on mail_outbox (team_id);
    create index mail_outbox_waiting on mail_outbox (next_try_at) where sent_at is null and failed_at is null;

    create table idempotency_keys (
      member_id uuid not null references members,
      key text not null,
      endpoint text not null,
      request_hash text not null,
      status integer,
      answer jsonb,
      created_at timestamptz not null default now(),
      primary key (member_id, key)
    );
    create index idempotency_keys_created_at on idempotency_keys (created_at);

    create table library_items (
      team_id uuid not null references teams,
      kind text not null check (kind in ('package', 'part')),
      key text not null check (key <> ''),
      document jsonb not null check (jsonb_typeof(document) = 'object'),
      created_at timestamptz not null default now(),
      primary key (team_id, kind, key)
    );

    create table worker_heartbeats (
      worker_id uuid primary key,
      started_at timestamptz not null default now(),
      seen_at timestamptz not null default now()
    );
  `);
}

/** @param {import('knex').Knex} knex */
export async function down(knex) {
  await knex.raw(`
    drop table worker_heartbeats;
    drop table library_items;
    drop table idempotency_keys;
    drop table mail_outbox;
  `);
}
