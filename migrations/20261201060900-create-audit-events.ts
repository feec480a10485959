import { type RunSql } from '@/lib/db/migration-step';

/** Who did what: appended to, never changed. Actors and subjects are bare ids, since they outlive what they name. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table audit_events (
      id bigint generated always as identity primary key,
      at timestamptz not null default now(),
      actor_kind text not null
        constraint audit_events_actor_kind_check check (actor_kind in ('user', 'system', 'token')),
      actor_id uuid,
      course_id uuid references courses on delete restrict,
      action text not null constraint audit_events_action_check check (action ~ '^[a-z][a-z0-9-]{1,59}$'),
      subject_kind text,
      subject_id text,
      details jsonb not null default '{}'
        constraint audit_events_details_check check (jsonb_typeof(details) = 'object'),
      constraint audit_events_actor_check check ((actor_kind = 'system') = (actor_id is null)),
      constraint audit_events_subject_check check ((subject_kind is null) = (subject_id is null))
    )`);
  await run('create index audit_events_course_index on audit_events (course_id, at)');
  await run('create index audit_events_at_index on audit_events (at)');
  await run('create index audit_events_actor_index on audit_events (actor_id, at)');
  await run('create index audit_events_subject_index on audit_events (subject_kind, subject_id)');
  await run(`
    create trigger audit_events_append_only before update or delete or truncate on audit_events
      for each statement execute function refuse_change()`);
}

export async function down(run: RunSql): Promise<void> {
  await run('drop table audit_events');
}
