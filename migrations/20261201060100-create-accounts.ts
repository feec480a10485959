import { type RunSql } from '@/lib/db/migration-step';

/** People, how they sign in, and the links that let them set a password. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table users (
      id uuid primary key default gen_random_uuid(),
      email text not null
        constraint users_email_unique unique
        constraint users_email_check check (email = lower(btrim(email)) and email like '_%@_%' and length(email) <= 254),
      name text not null constraint users_name_check check (length(btrim(name)) between 1 and 200),
      password_hash text,
      is_administrator boolean not null default false,
      password_changed_at timestamptz,
      deactivated_at timestamptz,
      erased_at timestamptz,
      created_at timestamptz not null default now(),
      constraint users_erased_check check (erased_at is null or (deactivated_at is not null and password_hash is null))
    )`);

  await run(`
    create table sessions (
      id text primary key constraint sessions_id_check check (id ~ '^[0-9a-f]{64}$'),
      user_id uuid not null references users on delete cascade,
      expires_at timestamptz not null,
      created_at timestamptz not null default now()
    )`);
  await run('create index sessions_user_id_index on sessions (user_id)');
  await run('create index sessions_expires_at_index on sessions (expires_at)');

  await run(`
    create table link_tokens (
      id uuid primary key default gen_random_uuid(),
      user_id uuid not null references users on delete cascade,
      purpose text not null constraint link_tokens_purpose_check check (purpose in ('invitation', 'reset')),
      expires_at timestamptz not null,
      used_at timestamptz,
      created_by uuid references users on delete restrict,
      created_at timestamptz not null default now()
    )`);
  await run('create index link_tokens_user_id_index on link_tokens (user_id)');

  // The shape that rate-limiter-flexible reads and writes.
  await run(`
    create table sign_in_failures (
      key varchar(255) primary key,
      points integer not null default 0,
      expire bigint
    )`);
  await run('create index sign_in_failures_expire_index on sign_in_failures (expire)');
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table sign_in_failures');
  await run('drop table link_tokens');
  await run('drop table sessions');
  await run('drop table users');
}
