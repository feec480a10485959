import { type RunSql } from '@/lib/db/migration-step';

/** Score reports, their one e-mail each, and appeals. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table score_reports (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete restrict,
      user_id uuid not null references users on delete restrict,
      revision integer not null constraint score_reports_revision_check check (revision >= 1),
      content jsonb not null constraint score_reports_content_check check (jsonb_typeof(content) = 'object'),
      reason text not null constraint score_reports_reason_check check (length(reason) between 1 and 2000),
      created_at timestamptz not null default now(),
      constraint score_reports_revision_unique unique (problem_set_id, user_id, revision)
    )`);
  await run('create index score_reports_user_id_index on score_reports (user_id)');

  await run(`
    create table deliveries (
      id uuid primary key default gen_random_uuid(),
      score_report_id uuid not null
        constraint deliveries_score_report_unique unique
        references score_reports on delete restrict,
      state text not null default 'waiting' constraint deliveries_state_check check (
        state in ('waiting', 'sending', 'sent', 'unconfirmed', 'failed')),
      message_id text not null
        constraint deliveries_message_id_unique unique
        constraint deliveries_message_id_check check (length(message_id) between 3 and 250),
      attempts integer not null default 0 constraint deliveries_attempts_check check (attempts >= 0),
      last_error text,
      sending_at timestamptz,
      sent_at timestamptz,
      created_at timestamptz not null default now(),
      constraint deliveries_sending_check check (
        state not in ('sending', 'sent', 'unconfirmed') or sending_at is not null),
      constraint deliveries_sent_check check ((state = 'sent') = (sent_at is not null))
    )`);
  await run('create index deliveries_state_index on deliveries (state, created_at)');

  await run(`
    create table appeals (
      id uuid primary key default gen_random_uuid(),
      set_release_id uuid not null references set_releases on delete restrict,
      problem_set_id uuid not null references problem_sets on delete restrict,
      answer_id uuid not null references answers on delete restrict,
      draw_id uuid not null,
      part_key text not null,
      user_id uuid not null,
      reason text not null constraint appeals_reason_check check (length(btrim(reason)) between 1 and 4000),
      state text not null default 'open' constraint appeals_state_check check (state in ('open', 'answered')),
      outcome text constraint appeals_outcome_check check (outcome in ('upheld', 'kept', 'lowered')),
      reply text constraint appeals_reply_check check (length(btrim(reply)) between 1 and 8000),
      answered_by uuid references users on delete restrict,
      answered_at timestamptz,
      ruling_id uuid references rulings on delete restrict,
      same_grader_noted boolean not null default false,
      created_at timestamptz not null default now(),
      constraint appeals_part_unique unique (draw_id, part_key, set_release_id),
      constraint appeals_answered_check check (
        num_nonnulls(outcome, reply, answered_by, answered_at) = case when state = 'answered' then 4 else 0 end),
      constraint appeals_draw_fkey foreign key (draw_id, user_id) references draws (id, user_id) on delete restrict
    )`);
  await run('create index appeals_set_state_index on appeals (problem_set_id, state)');
  await run('create index appeals_user_id_index on appeals (user_id)');
  await run('create index appeals_answer_id_index on appeals (answer_id)');
  await run(`
    alter table queue_items
      add constraint queue_items_appeal_id_fkey foreign key (appeal_id) references appeals on delete restrict`);
  await run(`
    create unique index queue_items_appeal_unique on queue_items (appeal_id) where appeal_id is not null`);
}

export async function down(run: RunSql): Promise<void> {
  await run('drop index queue_items_appeal_unique');
  await run('alter table queue_items drop constraint queue_items_appeal_id_fkey');
  await run('drop table appeals');
  await run('drop table deliveries');
  await run('drop table score_reports');
}
