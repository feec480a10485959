import { beforeAll, describe, expect, it } from 'vitest';
import { isHalfmarkError } from '@/lib/errors';
import { shelfFor } from '@/lib/queries/shelf';
import { templateForEditor } from '@/lib/queries/template-for-editor';
import { loadActor } from '@/lib/auth/load-actor';
import { createTemplate } from '@/lib/services/create-template';
import { publishTemplateVersion } from '@/lib/services/publish-template-version';
import { saveTemplateDraft } from '@/lib/services/save-template-draft';
import { draftOfContent } from '@/lib/templates/draft';
import { AuditEvent } from '@/models/audit-event';
import { TemplateVersion } from '@/models/template-version';
import { type User } from '@/models/user';
import { actingAs } from '../../factories/context';
import { buildCourseWithPeople, buildMember, type CourseWithPeople } from '../../factories/people';
import { buildItem, buildProblemSet } from '../../factories/problem-sets';
import { templateContent } from '../../factories/template-content';

let people: CourseWithPeople;
const whole = draftOfContent(templateContent());

beforeAll(async () => {
  people = await buildCourseWithPeople();
});

const asInstructor = <Result>(work: Parameters<typeof actingAs<Result>>[1]) => actingAs(people.instructor.user, work);

async function refusalOf(work: Promise<unknown>) {
  try {
    await work;
    return null;
  } catch (error) {
    if (!isHalfmarkError(error)) throw error;
    return { code: error.code, fields: error.fields };
  }
}

const make = (draft = whole) =>
  asInstructor((context) =>
    createTemplate(context, { departmentId: people.course.departmentId, name: draft.title || 'New', draft }),
  );

async function actorOf(user: User) {
  const actor = await loadActor(user.id);
  if (actor === null) throw new Error('The person is there.');
  return actor;
}

describe('writing a template', () => {
  it('begins as an empty draft that is kept at every save', async () => {
    const made = await asInstructor((context) =>
      createTemplate(context, { departmentId: people.course.departmentId, name: 'A tilted magnet' }),
    );
    const saved = await asInstructor((context) =>
      saveTemplateDraft(context, { ...made, draft: { ...whole, title: 'A magnet' }, topics: ['fields'] }),
    );
    expect(saved.revision).toBe(2);
    const template = await templateForEditor(await actorOf(people.instructor.user), made.templateId);
    expect(template).toMatchObject({ name: 'A magnet', topics: ['fields'], revision: 2, mayWrite: true });
    expect(template.draft.title).toBe('A magnet');
  });

  it('never overwrites what somebody else saved meanwhile', async () => {
    const made = await make();
    const save = (title: string) =>
      asInstructor((context) => saveTemplateDraft(context, { ...made, draft: { ...whole, title } }));
    const results = await Promise.all([refusalOf(save('One')), refusalOf(save('Two'))]);
    expect(results.filter((result) => result === null)).toHaveLength(1);
    expect(results.filter((result) => result?.code === 'conflict')).toHaveLength(1);
  });

  it('is for instructors of the department', async () => {
    const made = await make();
    const save = (user: User) => actingAs(user, (context) => saveTemplateDraft(context, { ...made, draft: whole }));
    expect(await refusalOf(save(people.headTa.user))).toMatchObject({ code: 'forbidden' });
    expect(await refusalOf(save(people.tas[0]!.user))).toMatchObject({ code: 'not-found' });
    expect(await refusalOf(save(people.students[0]!.user))).toMatchObject({ code: 'not-found' });
    const stranger = (await buildCourseWithPeople()).instructor.user;
    expect(await refusalOf(save(stranger))).toMatchObject({ code: 'not-found' });
    const elsewhere = actingAs(stranger, (context) =>
      createTemplate(context, { departmentId: people.course.departmentId, name: 'Not theirs' }),
    );
    expect(await refusalOf(elsewhere)).toMatchObject({ code: 'forbidden' });
  });
});

describe('publishing', () => {
  it('makes the next version of a whole draft and keeps it as it is', async () => {
    const made = await make();
    const first = await asInstructor((context) => publishTemplateVersion(context, made));
    expect(first.number).toBe(1);
    const changed = { ...whole, title: 'Another title' };
    const saved = await asInstructor((context) => saveTemplateDraft(context, { ...made, draft: changed }));
    const second = await asInstructor((context) => publishTemplateVersion(context, { ...made, ...saved }));
    expect(second.number).toBe(2);
    const versions = await TemplateVersion.findAll({
      where: { templateId: made.templateId },
      order: [['number', 'asc']],
    });
    expect(versions.map((version) => version.content.title)).toEqual([whole.title, 'Another title']);
    expect(versions[0]!.content).toEqual(templateContent());
    await expect(versions[0]!.update({ contentHash: '0'.repeat(64) })).rejects.toThrow();
    expect(await AuditEvent.count({ where: { subjectId: made.templateId, action: 'publish-template' } })).toBe(2);
  });

  it('refuses a draft with a mistake, at its place', async () => {
    const broken = structuredClone(whole);
    broken.parts[0]!.reference = 'commutator(A, S_q)';
    const made = await make(broken);
    const refusal = await refusalOf(asInstructor((context) => publishTemplateVersion(context, made)));
    expect(refusal).toMatchObject({
      code: 'invalid',
      fields: { 'parts.0.reference': expect.stringMatching(/\S/) as string },
    });
    expect(await TemplateVersion.count({ where: { templateId: made.templateId } })).toBe(0);
  });

  it('refuses what is published already, and a draft that was changed meanwhile', async () => {
    const made = await make();
    await asInstructor((context) => publishTemplateVersion(context, made));
    const again = asInstructor((context) => publishTemplateVersion(context, made));
    expect(await refusalOf(again)).toMatchObject({ code: 'wrong-state' });
    const late = asInstructor((context) => publishTemplateVersion(context, { ...made, revision: 7 }));
    expect(await refusalOf(late)).toMatchObject({ code: 'conflict' });
  });
});

describe('the shelf', () => {
  it('closes a template to who is a student where it is used, whatever they are elsewhere', async () => {
    const made = await make();
    const { versionId } = await asInstructor((context) => publishTemplateVersion(context, made));
    const version = await TemplateVersion.findByPk(versionId);
    const headTa = await actorOf(people.headTa.user);
    expect((await shelfFor(headTa)).map((template) => template.id)).toContain(made.templateId);
    const taught = await buildCourseWithPeople({ course: { departmentId: people.course.departmentId } });
    await buildItem(await buildProblemSet(taught.course), { templateVersion: version! });
    await buildMember(taught.course, 'student', { user: people.headTa.user });
    const torn = await actorOf(people.headTa.user);
    expect((await shelfFor(torn)).map((template) => template.id)).not.toContain(made.templateId);
    expect(await refusalOf(templateForEditor(torn, made.templateId))).toMatchObject({ code: 'forbidden' });
    const ta = await actorOf(taught.tas[0]!.user);
    const onShelf = (await shelfFor(ta)).find((template) => template.id === made.templateId);
    expect(onShelf).toMatchObject({ version: 1, versionId, sets: 1, kinds: ['operator', 'eigenvalues', 'scalar'] });
  });
});
