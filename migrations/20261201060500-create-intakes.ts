import { type RunSql } from '@/lib/db/migration-step';

/** Stored files and the bulk uploads made from them; their rows come with the answers they turn into. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table stored_files (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      content_hash text not null
        constraint stored_files_content_hash_check check (content_hash ~ '^[0-9a-f]{64}$'),
      byte_size integer not null constraint stored_files_byte_size_check check (byte_size >= 0),
      media_type text not null constraint stored_files_media_type_check check (length(media_type) between 3 and 127),
      original_name text not null
        constraint stored_files_original_name_check check (length(original_name) between 1 and 255),
      uploaded_by uuid not null references users on delete restrict,
      created_at timestamptz not null default now()
    )`);
  await run('create index stored_files_content_hash_index on stored_files (content_hash)');
  await run('create index stored_files_course_id_index on stored_files (course_id)');

  await run(`
    create table intakes (
      id uuid primary key default gen_random_uuid(),
      course_id uuid not null references courses on delete restrict,
      problem_set_id uuid not null references problem_sets on delete restrict,
      uploaded_by uuid not null references users on delete restrict,
      stored_file_id uuid not null references stored_files on delete restrict,
      content_hash text not null constraint intakes_content_hash_check check (content_hash ~ '^[0-9a-f]{64}$'),
      state text not null default 'uploaded' constraint intakes_state_check check (
        state in ('uploaded', 'reading', 'previewed', 'committing', 'checking', 'done', 'cancelled', 'failed')),
      encoding text,
      mapping jsonb,
      rows_total integer not null default 0,
      rows_accepted integer not null default 0,
      rows_refused integer not null default 0,
      rows_committed integer not null default 0,
      rows_checked integer not null default 0,
      failure text,
      committed_at timestamptz,
      finished_at timestamptz,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      constraint intakes_counts_check check (
        rows_accepted >= 0 and rows_refused >= 0 and rows_accepted + rows_refused <= rows_total
        and rows_committed between 0 and rows_accepted and rows_checked between 0 and rows_committed),
      constraint intakes_failure_check check ((state = 'failed') = (failure is not null)),
      constraint intakes_committed_at_check check (
        state not in ('committing', 'checking', 'done') or committed_at is not null)
    )`);
  // The same file is committed to a set once, however often it is uploaded.
  await run(`
    create unique index intakes_committed_content_unique on intakes (problem_set_id, content_hash)
      where state in ('committing', 'checking', 'done')`);
  await run('create index intakes_course_id_index on intakes (course_id, created_at)');
  await run('create index intakes_stored_file_id_index on intakes (stored_file_id)');
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table intakes');
  await run('drop table stored_files');
}
