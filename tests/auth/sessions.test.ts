import { describe, expect, it } from 'vitest';
import { loadActor } from '@/lib/auth/load-actor';
import { hashOpaqueToken } from '@/lib/auth/opaque-token';
import { endSession, endSessionsOf, readSession, sessionLifetime, startSession } from '@/lib/auth/session-store';
import { inTransaction } from '@/lib/db/transaction';
import { Session } from '@/models/session';
import { buildCourse, buildMember, buildSection, buildSectionGrader, buildUser } from '../factories/people';

const start = new Date('2026-12-01T09:00:00Z');
const later = (milliseconds: number) => new Date(start.getTime() + milliseconds);
const hour = 60 * 60 * 1000;
const day = 24 * hour;

describe('sessions', () => {
  it('keep only the hash of their token', async () => {
    const user = await buildUser();
    const token = await startSession(user.id, start);
    const row = await Session.findOne({ where: { userId: user.id }, rejectOnEmpty: true });
    expect(row.id).toBe(hashOpaqueToken(token));
    expect(JSON.stringify(row)).not.toContain(token);
    expect(await readSession(row.id, start)).toBeNull();
  });

  it('end when not used for a week', async () => {
    const token = await startSession((await buildUser()).id, start);
    expect(await readSession(token, later(sessionLifetime.idle - 1000))).not.toBeNull();
    const unused = await startSession((await buildUser()).id, start);
    expect(await readSession(unused, later(sessionLifetime.idle))).toBeNull();
  });

  it('are prolonged by use, but never past thirty days', async () => {
    const token = await startSession((await buildUser()).id, start);
    for (let days = 5; days < 30; days += 5) expect(await readSession(token, later(days * day))).not.toBeNull();
    expect((await readSession(token, later(29 * day)))?.expiresAt).toEqual(later(30 * day));
    expect(await readSession(token, later(30 * day))).toBeNull();
  });

  it('end by signing out, one by one or all at once', async () => {
    const user = await buildUser();
    const [one, two, three] = [
      await startSession(user.id, start),
      await startSession(user.id, start),
      await startSession(user.id, start),
    ];
    await endSession(one);
    expect(await readSession(one, start)).toBeNull();
    await inTransaction((transaction) => endSessionsOf(user.id, { except: hashOpaqueToken(two), transaction }));
    expect(await readSession(two, start)).not.toBeNull();
    expect(await readSession(three, start)).toBeNull();
  });
});

describe('the actor behind a session', () => {
  it('has the roles and sections of this moment', async () => {
    const course = await buildCourse();
    const [a, b] = [await buildSection(course), await buildSection(course)];
    const { user, membership } = await buildMember(course, 'ta', { section: a });
    const other = await buildCourse();
    await buildMember(other, 'student', { user });
    expect((await loadActor(user.id))?.memberships.get(course.id)).toEqual({
      membershipId: membership.id,
      role: 'ta',
      sectionIds: [a.id],
    });
    await buildSectionGrader(b, membership);
    expect((await loadActor(user.id))?.memberships.get(course.id)?.sectionIds.toSorted()).toEqual(
      [a.id, b.id].toSorted(),
    );
    await membership.update({ role: 'instructor' });
    expect((await loadActor(user.id))?.memberships.get(course.id)?.role).toBe('instructor');
    await membership.update({ leftAt: new Date() });
    const actor = await loadActor(user.id);
    expect([...(actor?.memberships.keys() ?? [])]).toEqual([other.id]);
  });

  it('is nobody once the account is deactivated', async () => {
    const user = await buildUser();
    expect(await loadActor(user.id)).not.toBeNull();
    await user.update({ deactivatedAt: new Date() });
    expect(await loadActor(user.id)).toBeNull();
  });
});
