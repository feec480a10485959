import { type RunSql } from '@/lib/db/migration-step';

/**
 * What students were given and what they answered. Pairs such as (draw, user) are foreign keys, so that an answer can
 * only belong to a submission of the same draw, and a submission only to the student whose draw it is.
 */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table draws (
      id uuid primary key default gen_random_uuid(),
      item_id uuid not null references problem_set_items on delete restrict,
      user_id uuid not null references users on delete restrict,
      template_version_id uuid not null references template_versions on delete restrict,
      seed text not null constraint draws_seed_check check (length(seed) between 1 and 200),
      drawn_values jsonb not null constraint draws_drawn_values_check check (jsonb_typeof(drawn_values) = 'object'),
      created_at timestamptz not null default now(),
      constraint draws_item_user_unique unique (item_id, user_id),
      constraint draws_id_user_unique unique (id, user_id)
    )`);
  await run('create index draws_user_id_index on draws (user_id)');
  await run('create index draws_template_version_id_index on draws (template_version_id)');

  await run(`
    create table saved_answers (
      id uuid primary key default gen_random_uuid(),
      draw_id uuid not null references draws on delete cascade,
      part_key text not null constraint saved_answers_part_key_check check (length(part_key) between 1 and 40),
      text text not null constraint saved_answers_text_check check (length(text) <= 20000),
      revision integer not null default 1 constraint saved_answers_revision_check check (revision >= 1),
      saved_at timestamptz not null default now(),
      constraint saved_answers_part_unique unique (draw_id, part_key)
    )`);

  await run(`
    create table submissions (
      id uuid primary key default gen_random_uuid(),
      draw_id uuid not null,
      user_id uuid not null,
      source text not null constraint submissions_source_check check (source in ('typed', 'intake')),
      submitted_at timestamptz not null,
      receipt text not null
        constraint submissions_receipt_unique unique
        constraint submissions_receipt_check check (length(receipt) between 6 and 40),
      client_key text
        constraint submissions_client_key_unique unique
        constraint submissions_client_key_check check (length(client_key) between 1 and 100),
      intake_id uuid references intakes on delete restrict,
      late boolean not null default false,
      created_at timestamptz not null default now(),
      constraint submissions_id_draw_unique unique (id, draw_id),
      constraint submissions_intake_check check ((source = 'intake') = (intake_id is not null)),
      constraint submissions_draw_fkey foreign key (draw_id, user_id) references draws (id, user_id) on delete restrict
    )`);
  await run('create index submissions_draw_id_index on submissions (draw_id)');
  await run('create index submissions_user_id_index on submissions (user_id, submitted_at)');
  await run('create index submissions_intake_id_index on submissions (intake_id)');

  await run(`
    create table answers (
      id uuid primary key default gen_random_uuid(),
      submission_id uuid not null,
      draw_id uuid not null,
      part_key text not null constraint answers_part_key_check check (length(part_key) between 1 and 40),
      attempt integer not null constraint answers_attempt_check check (attempt between 1 and 1000),
      text text not null constraint answers_text_check check (length(text) <= 20000),
      superseded_at timestamptz,
      check_state text not null default 'waiting'
        constraint answers_check_state_check check (check_state in ('waiting', 'checked', 'failed')),
      current_check_id uuid,
      current_credit_entry_id uuid,
      created_at timestamptz not null default now(),
      constraint answers_attempt_unique unique (draw_id, part_key, attempt),
      constraint answers_submission_part_unique unique (submission_id, part_key),
      constraint answers_checked_check check (check_state <> 'checked' or current_check_id is not null),
      constraint answers_submission_fkey foreign key (submission_id, draw_id)
        references submissions (id, draw_id) on delete restrict
    )`);
  // Of one part of a draw, one answer stands at a time.
  await run(`
    create unique index answers_standing_unique on answers (draw_id, part_key) where superseded_at is null`);
  await run(`create index answers_waiting_index on answers (created_at) where check_state = 'waiting'`);

  // follow_through_basis names the earlier answers that a follow-through was worked out from; empty without one.
  await run(`
    create table answer_checks (
      id uuid primary key default gen_random_uuid(),
      answer_id uuid not null references answers on delete restrict,
      checker_version text not null
        constraint answer_checks_checker_version_check check (length(checker_version) between 1 and 60),
      template_version_id uuid not null references template_versions on delete restrict,
      follow_through_basis text not null default ''
        constraint answer_checks_follow_through_basis_check check (length(follow_through_basis) <= 200),
      verdict text not null constraint answer_checks_verdict_check check (
        verdict in ('agrees', 'differs', 'undecided', 'unreadable')),
      slip text,
      slips jsonb not null default '[]' constraint answer_checks_slips_check check (jsonb_typeof(slips) = 'array'),
      kin_key text,
      reading_latex text not null default '',
      reading_plain text not null default '',
      reference_latex text not null default '',
      message text not null,
      form text constraint answer_checks_form_check check (form in ('evaluated', 'not evaluated')),
      evidence jsonb not null constraint answer_checks_evidence_check check (jsonb_typeof(evidence) = 'object'),
      follow_through jsonb,
      milliseconds double precision not null
        constraint answer_checks_milliseconds_check check (milliseconds >= 0),
      created_at timestamptz not null default now(),
      constraint answer_checks_once_unique
        unique (answer_id, checker_version, template_version_id, follow_through_basis),
      constraint answer_checks_id_answer_unique unique (id, answer_id),
      constraint answer_checks_slip_check check (slip is null or verdict = 'differs')
    )`);
  await run(`
    create index answer_checks_kin_key_index on answer_checks (template_version_id, kin_key)
      where kin_key is not null`);

  // The history of an answer's credit is a chain: one first entry, and each later one follows one that nothing else follows.
  await run(`
    create table credit_entries (
      id uuid primary key default gen_random_uuid(),
      answer_id uuid not null references answers on delete restrict,
      credit integer not null,
      out_of integer not null,
      source text not null constraint credit_entries_source_check check (source in (
        'no-answer', 'automatic', 'rule', 'ruling', 'kin-ruling', 'settlement', 'appeal', 'recheck', 'reversal')),
      ruling_id uuid,
      actor_id uuid references users on delete restrict,
      reason text not null default '' constraint credit_entries_reason_check check (length(reason) <= 4000),
      previous_entry_id uuid,
      created_at timestamptz not null default now(),
      constraint credit_entries_previous_unique unique (previous_entry_id),
      constraint credit_entries_id_answer_unique unique (id, answer_id),
      constraint credit_entries_credit_check check (credit between 0 and out_of),
      constraint credit_entries_ruled_check check (
        source not in ('ruling', 'kin-ruling', 'settlement', 'appeal') or ruling_id is not null),
      constraint credit_entries_previous_fkey foreign key (previous_entry_id, answer_id)
        references credit_entries (id, answer_id) on delete restrict
    )`);
  await run(`
    create unique index credit_entries_first_unique on credit_entries (answer_id) where previous_entry_id is null`);
  await run('create index credit_entries_answer_id_index on credit_entries (answer_id, created_at)');
  await run('create index credit_entries_ruling_id_index on credit_entries (ruling_id)');
  await run(`
    create trigger credit_entries_append_only before update or delete or truncate on credit_entries
      for each statement execute function refuse_change()`);

  await run(`
    alter table answers
      add constraint answers_current_check_fkey foreign key (current_check_id, id)
        references answer_checks (id, answer_id) on delete restrict deferrable initially deferred,
      add constraint answers_current_credit_entry_fkey foreign key (current_credit_entry_id, id)
        references credit_entries (id, answer_id) on delete restrict deferrable initially deferred`);

  await run(`
    create table intake_rows (
      id uuid primary key default gen_random_uuid(),
      intake_id uuid not null references intakes on delete cascade,
      line integer not null constraint intake_rows_line_check check (line >= 1),
      cell integer not null default 0 constraint intake_rows_cell_check check (cell >= 0),
      fields jsonb not null constraint intake_rows_fields_check check (jsonb_typeof(fields) in ('object', 'array')),
      state text not null constraint intake_rows_state_check check (state in ('accepted', 'refused')),
      reason_code text,
      message text,
      user_id uuid references users on delete restrict,
      item_id uuid references problem_set_items on delete restrict,
      part_key text,
      text text,
      answer_id uuid
        constraint intake_rows_answer_unique unique
        references answers on delete restrict,
      constraint intake_rows_line_unique unique (intake_id, line, cell),
      constraint intake_rows_reason_check check ((state = 'refused') = (reason_code is not null)),
      constraint intake_rows_matched_check check (
        state = 'refused'
        or (user_id is not null and item_id is not null and part_key is not null and text is not null)),
      constraint intake_rows_answer_check check (answer_id is null or state = 'accepted')
    )`);
  await run('create index intake_rows_state_index on intake_rows (intake_id, state)');
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table intake_rows');
  await run(`
    alter table answers
      drop constraint answers_current_check_fkey, drop constraint answers_current_credit_entry_fkey`);
  await run('drop table credit_entries');
  await run('drop table answer_checks');
  await run('drop table answers');
  await run('drop table submissions');
  await run('drop table saved_answers');
  await run('drop table draws');
}
