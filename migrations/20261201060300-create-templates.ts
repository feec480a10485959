import { type RunSql } from '@/lib/db/migration-step';

/** A department's shelf: templates with their draft, and published versions, which never change. */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create table templates (
      id uuid primary key default gen_random_uuid(),
      department_id uuid not null references departments on delete restrict,
      name text not null constraint templates_name_check check (length(btrim(name)) between 1 and 200),
      topics text[] not null default '{}' constraint templates_topics_check check (cardinality(topics) <= 30),
      draft jsonb not null constraint templates_draft_check check (jsonb_typeof(draft) = 'object'),
      draft_revision integer not null default 1
        constraint templates_draft_revision_check check (draft_revision >= 1),
      forked_from_version_id uuid,
      created_by uuid not null references users on delete restrict,
      archived_at timestamptz,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    )`);
  await run('create index templates_department_id_index on templates (department_id)');
  await run('create index templates_topics_index on templates using gin (topics)');

  await run(`
    create table template_versions (
      id uuid primary key default gen_random_uuid(),
      template_id uuid not null references templates on delete restrict,
      number integer not null constraint template_versions_number_check check (number >= 1),
      content jsonb not null constraint template_versions_content_check check (jsonb_typeof(content) = 'object'),
      content_hash text not null
        constraint template_versions_content_hash_check check (content_hash ~ '^[0-9a-f]{64}$'),
      published_by uuid not null references users on delete restrict,
      published_at timestamptz not null default now(),
      sweep jsonb,
      constraint template_versions_number_unique unique (template_id, number)
    )`);
  await run(`
    alter table templates
      add constraint templates_forked_from_version_id_fkey
      foreign key (forked_from_version_id) references template_versions on delete restrict`);

  await run(`
    create function keep_template_version() returns trigger language plpgsql as $$
    begin
      if old.sweep is null and new.sweep is not null and to_jsonb(new) - 'sweep' = to_jsonb(old) - 'sweep' then
        return new;
      end if;
      raise exception 'A published version is never changed; its sweep is filled in once.'
        using errcode = 'restrict_violation', table = tg_table_name, constraint = 'template_versions_append_only';
    end
    $$`);
  await run(`
    create trigger template_versions_keep before update on template_versions
      for each row execute function keep_template_version()`);
  await run(`
    create trigger template_versions_append_only before delete or truncate on template_versions
      for each statement execute function refuse_change()`);
}

export async function down(run: RunSql): Promise<void> {
  await run('alter table templates drop constraint templates_forked_from_version_id_fkey');
  await run('drop table template_versions');
  await run('drop function keep_template_version()');
  await run('drop table templates');
}
