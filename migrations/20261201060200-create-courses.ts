import { type RunSql } from '@/lib/db/migration-step';

/** Departments, their courses, who is what in a course, and who may not mark whom. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table departments (
      id uuid primary key default gen_random_uuid(),
      name text not null
        constraint departments_name_unique unique
        constraint departments_name_check check (length(btrim(name)) between 1 and 200),
      created_at timestamptz not null default now()
    )`);

  await run(`
    create table courses (
      id uuid primary key default gen_random_uuid(),
      department_id uuid not null references departments on delete restrict,
      code text not null constraint courses_code_check check (length(btrim(code)) between 1 and 40),
      title text not null constraint courses_title_check check (length(btrim(title)) between 1 and 200),
      term text not null constraint courses_term_check check (length(btrim(term)) between 1 and 60),
      time_zone text not null default 'UTC' constraint courses_time_zone_check check (length(time_zone) between 1 and 64),
      tas_see_own_sections_only boolean not null default false,
      retention_months integer not null default 24
        constraint courses_retention_months_check check (retention_months between 1 and 1200),
      notice text not null default '' constraint courses_notice_check check (length(notice) <= 4000),
      created_at timestamptz not null default now(),
      constraint courses_code_term_unique unique (department_id, code, term)
    )`);

  await run(`
    create table sections (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      name text not null constraint sections_name_check check (length(btrim(name)) between 1 and 60),
      created_at timestamptz not null default now(),
      constraint sections_name_unique unique (course_id, name),
      constraint sections_id_course_unique unique (id, course_id)
    )`);

  // A student's section belongs to the same course: the pair is the foreign key.
  await run(`
    create table memberships (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      user_id uuid not null references users on delete restrict,
      role text not null
        constraint memberships_role_check check (role in ('student', 'ta', 'head-ta', 'instructor')),
      section_id uuid,
      left_at timestamptz,
      created_at timestamptz not null default now(),
      constraint memberships_course_user_unique unique (course_id, user_id),
      constraint memberships_id_course_unique unique (id, course_id),
      constraint memberships_section_check check (section_id is null or role = 'student'),
      constraint memberships_section_fkey foreign key (section_id, course_id)
        references sections (id, course_id) on delete restrict
    )`);
  await run('create index memberships_user_id_index on memberships (user_id)');
  await run('create index memberships_section_id_index on memberships (section_id)');

  await run(`
    create table section_graders (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      section_id uuid not null,
      membership_id uuid not null,
      created_at timestamptz not null default now(),
      constraint section_graders_section_membership_unique unique (section_id, membership_id),
      constraint section_graders_section_fkey foreign key (section_id, course_id)
        references sections (id, course_id) on delete cascade,
      constraint section_graders_membership_fkey foreign key (membership_id, course_id)
        references memberships (id, course_id) on delete cascade
    )`);
  await run('create index section_graders_membership_id_index on section_graders (membership_id)');

  await run(`
    create table conflicts_of_interest (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      grader_id uuid not null references users on delete restrict,
      student_id uuid not null references users on delete restrict,
      declared_by uuid not null references users on delete restrict,
      note text not null default '' constraint conflicts_of_interest_note_check check (length(note) <= 2000),
      created_at timestamptz not null default now(),
      constraint conflicts_of_interest_pair_unique unique (course_id, grader_id, student_id),
      constraint conflicts_of_interest_pair_check check (grader_id <> student_id)
    )`);
  await run('create index conflicts_of_interest_student_id_index on conflicts_of_interest (student_id)');

  await run(`
    create table api_tokens (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      name text not null constraint api_tokens_name_check check (length(btrim(name)) between 1 and 100),
      token_hash text not null
        constraint api_tokens_token_hash_unique unique
        constraint api_tokens_token_hash_check check (token_hash ~ '^[0-9a-f]{64}$'),
      scopes text[] not null constraint api_tokens_scopes_check check (cardinality(scopes) between 1 and 20),
      created_by uuid not null references users on delete restrict,
      expires_at timestamptz not null,
      revoked_at timestamptz,
      last_used_at timestamptz,
      created_at timestamptz not null default now()
    )`);
  await run('create index api_tokens_course_id_index on api_tokens (course_id)');
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table api_tokens');
  await run('drop table conflicts_of_interest');
  await run('drop table section_graders');
  await run('drop table memberships');
  await run('drop table sections');
  await run('drop table courses');
  await run('drop table departments');
}
