import { describe, expect, it } from 'vitest';
import { auditEvents } from '@/lib/queries/audit-events';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { createCourse, createCourseSchema } from '@/lib/services/create-course';
import { editCourse } from '@/lib/services/edit-course';
import { recordAuditEvent } from '@/lib/services/record-audit-event';
import { loadActor } from '@/lib/auth/load-actor';
import { actingAs, actingAsSystem } from '../../factories/context';
import { buildAdministrator, buildCourse, buildCourseWithPeople } from '../../factories/people';

const form = {
  code: 'PHY 342',
  title: 'Two-level systems',
  term: 'Autumn 2026',
  timeZone: 'Europe/London',
  tasSeeOwnSectionsOnly: 'on',
  notice: '',
  department: 'Physics, Wrenfield Institute',
};

describe('courses', () => {
  it('are made by administrators alone, once for a code and term', async () => {
    const administrator = await buildAdministrator();
    const { instructor } = await buildCourseWithPeople();
    const input = createCourseSchema.parse(form);
    await expect(actingAs(instructor.user, (context) => createCourse(context, input))).rejects.toMatchObject({
      code: 'forbidden',
    });
    const { courseId } = await actingAs(administrator, (context) => createCourse(context, input));
    const actor = await loadActor(administrator.id);
    if (actor === null) throw new Error('There is an administrator.');
    expect(await courseForActor(actor, courseId)).toMatchObject({ code: 'PHY 342', tasSeeOwnSectionsOnly: true });
    await expect(actingAs(administrator, (context) => createCourse(context, input))).rejects.toMatchObject({
      code: 'conflict',
      fields: { code: expect.any(String) as string },
    });
  });

  it.each([
    ['timeZone', 'Mars/Olympus'],
    ['code', '   '],
    ['title', 'x'.repeat(201)],
  ])('refuse %s %j', (field, value) => {
    const result = createCourseSchema.safeParse({ ...form, [field]: value });
    expect(result.error?.issues.map((issue) => issue.path.join('.'))).toEqual([field]);
  });

  it('keep in the log what an edit changed, and nothing else', async () => {
    const administrator = await buildAdministrator();
    const course = await buildCourse({ title: 'Old title' });
    const { code, term, timeZone, tasSeeOwnSectionsOnly, notice, retentionMonths } = course;
    const same = { code, term, timeZone, tasSeeOwnSectionsOnly, notice, retentionMonths };
    const edit = (title: string) =>
      actingAs(administrator, (context) => editCourse(context, { courseId: course.id, ...same, title }));
    await edit('New title');
    await edit('New title');
    const { lines, total } = await auditEvents({ courseId: course.id, timeZone: 'UTC', page: 1 });
    expect(total).toBe(1);
    expect(lines[0]).toMatchObject({
      action: 'edit-course',
      who: administrator.name,
      details: { title: { from: 'Old title', to: 'New title' } },
    });
  });

  it('are not there for people of another course, and for an id of nothing', async () => {
    const { instructor } = await buildCourseWithPeople();
    const other = await buildCourse();
    const actor = await loadActor(instructor.user.id);
    if (actor === null) throw new Error('There is an instructor.');
    for (const id of [other.id, '00000000-0000-4000-8000-000000000000']) {
      await expect(courseForActor(actor, id)).rejects.toMatchObject({ code: 'not-found' });
    }
  });
});

describe('the audit log', () => {
  it('is narrowed by course, deed, person and whole days of the zone', async () => {
    const { course, instructor, headTa } = await buildCourseWithPeople();
    const record = (at: string, action: string, by = instructor.user) =>
      actingAs(by, (context) => recordAuditEvent(context, { action, courseId: course.id }), new Date(at));
    await record('2026-11-30T22:30:00Z', 'open-set');
    await record('2026-11-30T23:30:00Z', 'close-set', headTa.user);
    await record('2026-12-01T12:00:00Z', 'open-set');
    await actingAsSystem(
      (context) => recordAuditEvent(context, { action: 'open-set' }),
      new Date('2026-12-01T12:00:00Z'),
    );
    const find = async (filter: Partial<Parameters<typeof auditEvents>[0]>) =>
      (await auditEvents({ courseId: course.id, timeZone: 'Europe/Oslo', page: 1, ...filter })).lines.map(
        (line) => line.action,
      );
    expect(await find({})).toEqual(['open-set', 'close-set', 'open-set']);
    expect(await find({ action: 'close-set' })).toEqual(['close-set']);
    expect(await find({ who: headTa.user.name.toUpperCase() })).toEqual(['close-set']);
    // In Oslo 23:30 UTC is the next day.
    expect(await find({ until: '2026-11-30' })).toEqual(['open-set']);
    expect(await find({ from: '2026-12-01' })).toEqual(['open-set', 'close-set']);
    const whole = await auditEvents({
      courseId: null,
      timeZone: 'UTC',
      page: 1,
      from: '2026-12-01',
      until: '2026-12-01',
    });
    expect(whole.lines.map((line) => line.who)).toContain('Halfmark, test');
  });

  it('is written with the deed or not at all', async () => {
    const { course, instructor } = await buildCourseWithPeople();
    await expect(
      actingAs(instructor.user, async (context) => {
        await recordAuditEvent(context, { action: 'open-set', courseId: course.id });
        throw new Error('the deed failed');
      }),
    ).rejects.toThrow('the deed failed');
    expect((await auditEvents({ courseId: course.id, timeZone: 'UTC', page: 1 })).total).toBe(0);
  });
});
