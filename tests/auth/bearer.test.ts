import { describe, expect, it } from 'vitest';
import { actorFromBearer } from '@/lib/auth/bearer';
import { canUseToken } from '@/lib/policies/can-use-token';
import { createApiToken } from '@/lib/services/create-api-token';
import { revokeApiToken } from '@/lib/services/revoke-api-token';
import { ApiToken } from '@/models/api-token';
import { actingAs } from '../factories/context';
import { buildCourseWithPeople } from '../factories/people';

const withToken = (token: string) => ({ headers: new Headers({ authorization: `Bearer ${token}` }) });

async function courseWithToken() {
  const people = await buildCourseWithPeople();
  const courseId = people.course.id;
  const input = { courseId, name: 'marks to the office', scopes: ['export-marks' as const], days: 30 };
  const made = await actingAs(people.headTa.user, (context) => createApiToken(context, input));
  return { ...people, courseId, made };
}

describe('tokens for programs', () => {
  it('are good for their course and scopes, and stored as a hash', async () => {
    const { made, courseId } = await courseWithToken();
    const actor = await actorFromBearer(withToken(made.token));
    expect(actor).toEqual({ kind: 'token', tokenId: made.tokenId, courseId, scopes: ['export-marks'] });
    if (actor === null) return;
    expect(canUseToken(actor, 'export-marks', courseId).allowed).toBe(true);
    expect(canUseToken(actor, 'check-answers', courseId).allowed).toBe(false);
    expect(canUseToken(actor, 'export-marks', '00000000-0000-4000-8000-000000000000').allowed).toBe(false);
    const row = await ApiToken.findByPk(made.tokenId, { rejectOnEmpty: true });
    expect(JSON.stringify(row)).not.toContain(made.token);
    expect(row.lastUsedAt).not.toBeNull();
  });

  it('are refused when altered, expired or revoked', async () => {
    const { made, courseId, instructor } = await courseWithToken();
    const altered = made.token.slice(0, -1) + (made.token.endsWith('A') ? 'B' : 'A');
    expect(await actorFromBearer(withToken(altered))).toBeNull();
    expect(await actorFromBearer({ headers: new Headers() })).toBeNull();
    const after = new Date(made.expiresAt.getTime() + 1);
    expect(await actorFromBearer(withToken(made.token), after)).toBeNull();
    await actingAs(instructor.user, (context) => revokeApiToken(context, { courseId, tokenId: made.tokenId }));
    expect(await actorFromBearer(withToken(made.token))).toBeNull();
  });

  it('end with the standing of whoever made them', async () => {
    for (const fall of [
      (headTa: Awaited<ReturnType<typeof courseWithToken>>['headTa']) => headTa.membership.update({ role: 'ta' }),
      (headTa: Awaited<ReturnType<typeof courseWithToken>>['headTa']) =>
        headTa.membership.update({ leftAt: new Date() }),
      (headTa: Awaited<ReturnType<typeof courseWithToken>>['headTa']) =>
        headTa.user.update({ deactivatedAt: new Date() }),
    ]) {
      const { made, headTa } = await courseWithToken();
      expect(await actorFromBearer(withToken(made.token))).not.toBeNull();
      await fall(headTa);
      expect(await actorFromBearer(withToken(made.token))).toBeNull();
    }
  });

  it('are made and revoked by a head TA or instructor of that course alone', async () => {
    const { tas, students, made, courseId } = await courseWithToken();
    const stranger = await buildCourseWithPeople();
    const input = { courseId, name: 'mine', scopes: ['export-marks' as const], days: 1 };
    for (const member of [tas[0], students[0]]) {
      if (member === undefined) throw new Error('The course has TAs and students.');
      await expect(actingAs(member.user, (context) => createApiToken(context, input))).rejects.toMatchObject({
        code: 'forbidden',
      });
    }
    const revoke = { courseId, tokenId: made.tokenId };
    await expect(
      actingAs(stranger.instructor.user, (context) => revokeApiToken(context, revoke)),
    ).rejects.toMatchObject({ code: 'not-found' });
    const elsewhere = { courseId: stranger.course.id, tokenId: made.tokenId };
    await expect(
      actingAs(stranger.instructor.user, (context) => revokeApiToken(context, elsewhere)),
    ).rejects.toMatchObject({ code: 'not-found' });
    expect(await actorFromBearer(withToken(made.token))).not.toBeNull();
  });
});
