import { type RunSql } from '@/lib/db/migration-step';

/** The queue of answers that need a person, what people decided, and the second look at those decisions. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table queue_items (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete restrict,
      item_id uuid not null references problem_set_items on delete restrict,
      answer_id uuid not null references answers on delete restrict,
      part_key text not null,
      kind text not null constraint queue_items_kind_check check (kind in ('review', 'appeal')),
      state text not null default 'waiting' constraint queue_items_state_check check (
        state in ('waiting', 'taken', 'ruled', 'to-settle', 'settled', 'escalated', 'withdrawn')),
      reasons text[] not null constraint queue_items_reasons_check check (cardinality(reasons) between 1 and 20),
      kin_key text,
      suggested_credit integer constraint queue_items_suggested_credit_check check (suggested_credit >= 0),
      suggested_rule text,
      held_by uuid references users on delete restrict,
      held_until timestamptz,
      question text constraint queue_items_question_check check (length(question) <= 4000),
      appeal_id uuid,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      constraint queue_items_id_answer_unique unique (id, answer_id),
      constraint queue_items_held_check check (
        (state = 'taken') = (held_by is not null) and (state = 'taken') = (held_until is not null)),
      constraint queue_items_appeal_check check ((kind = 'appeal') = (appeal_id is not null)),
      constraint queue_items_question_asked_check check (state <> 'escalated' or question is not null)
    )`);
  // An answer waits for one person at a time.
  await run(`
    create unique index queue_items_live_unique on queue_items (answer_id)
      where state in ('waiting', 'taken', 'escalated')`);
  await run('create index queue_items_state_index on queue_items (problem_set_id, state, created_at)');
  await run('create index queue_items_part_index on queue_items (item_id, part_key, state, kin_key)');
  await run(`create index queue_items_held_index on queue_items (held_until) where state = 'taken'`);
  await run(`create index queue_items_held_by_index on queue_items (held_by) where state = 'taken'`);
  await run('create index queue_items_answer_id_index on queue_items (answer_id)');

  // sequence counts the rulings on one item, so that two at the same instant collide.
  await run(`
    create table rulings (
      id uuid primary key default gen_random_uuid(),
      queue_item_id uuid not null,
      answer_id uuid not null,
      sequence integer not null default 1 constraint rulings_sequence_check check (sequence >= 1),
      grader_id uuid not null references users on delete restrict,
      kind text not null
        constraint rulings_kind_check check (kind in ('single', 'kin', 'settlement', 'appeal')),
      credit integer not null,
      out_of integer not null,
      comment text not null default '' constraint rulings_comment_check check (length(comment) <= 8000),
      reasons text[] not null default '{}' constraint rulings_reasons_check check (cardinality(reasons) <= 20),
      covering_ruling_id uuid references rulings on delete restrict,
      milliseconds_spent integer
        constraint rulings_milliseconds_spent_check check (milliseconds_spent >= 0),
      created_at timestamptz not null default now(),
      constraint rulings_sequence_unique unique (queue_item_id, sequence),
      constraint rulings_id_answer_unique unique (id, answer_id),
      constraint rulings_id_grader_unique unique (id, grader_id),
      constraint rulings_credit_check check (credit between 0 and out_of),
      constraint rulings_covering_check check (
        covering_ruling_id is null or (kind = 'kin' and covering_ruling_id <> id)),
      constraint rulings_queue_item_fkey foreign key (queue_item_id, answer_id)
        references queue_items (id, answer_id) on delete restrict
    )`);
  await run('create index rulings_answer_id_index on rulings (answer_id)');
  await run('create index rulings_grader_id_index on rulings (grader_id, created_at)');
  await run('create index rulings_covering_ruling_id_index on rulings (covering_ruling_id)');
  await run(`
    create trigger rulings_append_only before update or delete or truncate on rulings
      for each statement execute function refuse_change()`);

  await run(`
    create table ruling_reversals (
      id uuid primary key default gen_random_uuid(),
      ruling_id uuid not null
        constraint ruling_reversals_ruling_unique unique
        references rulings on delete restrict,
      reversed_by uuid not null references users on delete restrict,
      reason text not null default '' constraint ruling_reversals_reason_check check (length(reason) <= 4000),
      created_at timestamptz not null default now()
    )`);
  await run(`
    create trigger ruling_reversals_append_only before update or delete or truncate on ruling_reversals
      for each statement execute function refuse_change()`);

  await run(`
    alter table credit_entries
      add constraint credit_entries_ruling_fkey foreign key (ruling_id, answer_id)
        references rulings (id, answer_id) on delete restrict`);

  // first_grader_id repeats the ruling's grader (the pair is the foreign key), so that nobody marks their own again.
  await run(`
    create table second_markings (
      id uuid primary key default gen_random_uuid(),
      ruling_id uuid not null constraint second_markings_ruling_unique unique,
      first_grader_id uuid not null,
      problem_set_id uuid not null references problem_sets on delete restrict,
      answer_id uuid not null,
      grader_id uuid not null references users on delete restrict,
      state text not null default 'assigned' constraint second_markings_state_check check (
        state in ('assigned', 'taken', 'marked', 'to-settle', 'settled', 'cancelled')),
      held_until timestamptz,
      credit integer constraint second_markings_credit_check check (credit >= 0),
      comment text not null default '' constraint second_markings_comment_check check (length(comment) <= 8000),
      milliseconds_spent integer
        constraint second_markings_milliseconds_spent_check check (milliseconds_spent >= 0),
      marked_at timestamptz,
      settled_by uuid references users on delete restrict,
      settled_credit integer constraint second_markings_settled_credit_check check (settled_credit >= 0),
      settled_at timestamptz,
      created_at timestamptz not null default now(),
      constraint second_markings_blind_check check (grader_id <> first_grader_id),
      constraint second_markings_held_check check ((state = 'taken') = (held_until is not null)),
      constraint second_markings_marked_check check (
        case
          when state in ('assigned', 'taken') then credit is null and marked_at is null
          when state in ('marked', 'to-settle', 'settled') then credit is not null and marked_at is not null
          else (credit is null) = (marked_at is null)
        end),
      constraint second_markings_settled_check check (
        num_nonnulls(settled_by, settled_credit, settled_at) = case when state = 'settled' then 3 else 0 end),
      constraint second_markings_first_fkey foreign key (ruling_id, first_grader_id)
        references rulings (id, grader_id) on delete restrict,
      constraint second_markings_answer_fkey foreign key (ruling_id, answer_id)
        references rulings (id, answer_id) on delete restrict
    )`);
  await run('create index second_markings_set_state_index on second_markings (problem_set_id, state)');
  await run('create index second_markings_grader_state_index on second_markings (grader_id, state)');
  await run('create index second_markings_answer_id_index on second_markings (answer_id)');

  await run(`
    create table credit_rules (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete restrict,
      item_id uuid not null references problem_set_items on delete restrict,
      part_key text not null,
      slip text not null constraint credit_rules_slip_check check (length(slip) between 1 and 60),
      credit integer not null constraint credit_rules_credit_check check (credit between 0 and 1000000000),
      from_ruling_id uuid references rulings on delete restrict,
      created_by uuid not null references users on delete restrict,
      created_at timestamptz not null default now(),
      retired_at timestamptz
    )`);
  await run(`
    create unique index credit_rules_standing_unique on credit_rules (item_id, part_key, slip)
      where retired_at is null`);
  await run('create index credit_rules_problem_set_id_index on credit_rules (problem_set_id)');

  await run(`
    create table comment_snippets (
      id uuid primary key default gen_random_uuid(),
      problem_set_id uuid not null references problem_sets on delete cascade,
      text text not null constraint comment_snippets_text_check check (length(btrim(text)) between 1 and 4000),
      created_by uuid not null references users on delete restrict,
      created_at timestamptz not null default now(),
      constraint comment_snippets_text_unique unique (problem_set_id, text)
    )`);
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table comment_snippets');
  await run('drop table credit_rules');
  await run('drop table second_markings');
  await run('alter table credit_entries drop constraint credit_entries_ruling_fkey');
  await run('drop table ruling_reversals');
  await run('drop table rulings');
  await run('drop table queue_items');
}
