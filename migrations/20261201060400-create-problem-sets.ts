import { type RunSql } from '@/lib/db/migration-step';

/** Problem sets, what is in them, who has longer, and whose scores are out. Points are thousandths of a mark. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table problem_sets (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      number integer not null constraint problem_sets_number_check check (number between 1 and 999),
      title text not null constraint problem_sets_title_check check (length(btrim(title)) between 1 and 200),
      state text not null default 'draft'
        constraint problem_sets_state_check check (state in ('draft', 'open', 'closed', 'released')),
      opens_at timestamptz,
      closes_at timestamptz,
      appeals_until timestamptz,
      attempts_allowed integer not null default 3
        constraint problem_sets_attempts_allowed_check check (attempts_allowed between 1 and 100),
      policy jsonb not null default '{}'
        constraint problem_sets_policy_check check (jsonb_typeof(policy) = 'object'),
      revision integer not null default 1 constraint problem_sets_revision_check check (revision >= 1),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      constraint problem_sets_number_unique unique (course_id, number),
      constraint problem_sets_times_check check (opens_at < closes_at and closes_at <= appeals_until),
      constraint problem_sets_dated_check check (state = 'draft' or (opens_at is not null and closes_at is not null))
    )`);

  await run(`
    create table problem_set_items (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete cascade,
      position integer not null constraint problem_set_items_position_check check (position between 1 and 999),
      template_version_id uuid not null references template_versions on delete restrict,
      points integer not null constraint problem_set_items_points_check check (points between 1 and 1000000000),
      created_at timestamptz not null default now(),
      constraint problem_set_items_position_unique unique (problem_set_id, position) deferrable initially immediate
    )`);
  await run('create index problem_set_items_template_version_id_index on problem_set_items (template_version_id)');

  await run(`
    create table extensions (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete cascade,
      user_id uuid references users on delete restrict,
      section_id uuid references sections on delete cascade,
      closes_at timestamptz not null,
      reason text not null default '' constraint extensions_reason_check check (length(reason) <= 2000),
      granted_by uuid not null references users on delete restrict,
      created_at timestamptz not null default now(),
      constraint extensions_user_unique unique (problem_set_id, user_id),
      constraint extensions_section_unique unique (problem_set_id, section_id),
      constraint extensions_whom_check check (num_nonnulls(user_id, section_id) = 1)
    )`);
  await run('create index extensions_user_id_index on extensions (user_id)');
  await run('create index extensions_section_id_index on extensions (section_id)');

  await run(`
    create table set_releases (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete restrict,
      user_id uuid not null references users on delete restrict,
      released_at timestamptz not null,
      released_by uuid not null references users on delete restrict,
      constraint set_releases_set_user_unique unique (problem_set_id, user_id)
    )`);
  await run('create index set_releases_user_id_index on set_releases (user_id)');
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table set_releases');
  await run('drop table extensions');
  await run('drop table problem_set_items');
  await run('drop table problem_sets');
}
