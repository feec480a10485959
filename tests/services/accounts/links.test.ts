import { beforeEach, describe, expect, it, vi } from 'vitest';
import { hashPassword, verifyPassword } from '@/lib/auth/password';
import { signLink, type LinkPurpose } from '@/lib/auth/link-token';
import { readSession, startSession } from '@/lib/auth/session-store';
import { signInWithPassword } from '@/lib/auth/sign-in';
import { database } from '@/lib/db/connection';
import { environment } from '@/lib/env';
import { sendAccountMailBy } from '@/lib/jobs/send-account-mail';
import { type HandOffMail } from '@/lib/mail/transport';
import { linkState } from '@/lib/queries/link-state';
import { changeAccount } from '@/lib/services/change-account';
import { changeOwnPassword } from '@/lib/services/change-own-password';
import { inviteToCourse } from '@/lib/services/invite-to-course';
import { requestPasswordReset } from '@/lib/services/request-password-reset';
import { setPasswordByLink } from '@/lib/services/set-password-by-link';
import { AuditEvent } from '@/models/audit-event';
import { LinkToken } from '@/models/link-token';
import { User } from '@/models/user';
import { actingAs, actingAsSystem } from '../../factories/context';
import { buildAdministrator, buildCourseWithPeople, buildUser } from '../../factories/people';

const password = 'slow neutron, cold beam';
const now = new Date('2026-12-01T09:00:00Z');
const later = (hours: number) => new Date(now.getTime() + hours * 60 * 60 * 1000);

async function openLink(userId: string, purpose: LinkPurpose) {
  const link = await LinkToken.findOne({ where: { userId, purpose, usedAt: null }, rejectOnEmpty: true });
  return { link, token: signLink(purpose, link.id, environment().sessionSecret) };
}

const use = (purpose: LinkPurpose, token: string, at = now, chosen = password) =>
  actingAsSystem((context) => setPasswordByLink(context, { purpose, token, password: chosen }), at);

const waitingMails = async () => (await database().query('select 1 from graphile_worker.jobs'))[0].length;

async function invited() {
  const people = await buildCourseWithPeople();
  const email = `new-${people.course.id}@wrenfield.example`;
  const input = { courseId: people.course.id, email, name: 'Nia Brook', role: 'student' as const, sectionIds: [] };
  await actingAs(people.instructor.user, (context) => inviteToCourse(context, input), now);
  return { ...people, user: await User.findOne({ where: { email }, rejectOnEmpty: true }) };
}

describe('an invitation', () => {
  it('is mailed by the worker with a link that sets the password once', async () => {
    const { user, course } = await invited();
    const { link, token } = await openLink(user.id, 'invitation');
    const send = vi.fn<HandOffMail>(() => Promise.resolve({ outcome: 'accepted' }));
    await sendAccountMailBy(send, { linkTokenId: link.id }, now);
    const mail = send.mock.calls[0]?.[0];
    expect(mail?.to).toEqual({ name: 'Nia Brook', address: user.email });
    expect(mail?.text).toContain(`/invitation/${token}`);
    expect(mail?.html).toContain(`/invitation/${token}`);
    expect(mail?.subject).toContain(course.code);
    expect(await linkState('invitation', token, now)).toEqual({ name: 'Nia Brook', email: user.email });

    await use('invitation', token);
    await user.reload();
    expect(await verifyPassword(user.passwordHash, password)).toBe(true);
    expect((await signInWithPassword(user.email, password, '203.0.113.1')).kind).toBe('welcome');

    expect(await linkState('invitation', token, now)).toBeNull();
    await expect(use('invitation', token, now, 'another password, also long')).rejects.toMatchObject({
      code: 'wrong-state',
    });
    await user.reload();
    expect(await verifyPassword(user.passwordHash, password)).toBe(true);
    await sendAccountMailBy(send, { linkTokenId: link.id }, now);
    expect(send).toHaveBeenCalledTimes(1);
  });

  it('runs out, is good for its purpose only, and dies with the account', async () => {
    const { user } = await invited();
    const { link, token } = await openLink(user.id, 'invitation');
    await expect(use('invitation', token, later(14 * 24))).rejects.toMatchObject({ code: 'wrong-state' });
    const wrongPurpose = signLink('reset', link.id, environment().sessionSecret);
    await expect(use('reset', wrongPurpose)).rejects.toMatchObject({ code: 'wrong-state' });
    await expect(use('invitation', `${link.id}.forged`)).rejects.toMatchObject({ code: 'wrong-state' });
    await user.update({ deactivatedAt: now });
    await expect(use('invitation', token)).rejects.toMatchObject({ code: 'wrong-state' });
    expect((await User.findByPk(user.id))?.passwordHash).toBeNull();
  });

  it('fails as a job while the mail server refuses, so that it is tried again', async () => {
    const { user } = await invited();
    const { link } = await openLink(user.id, 'invitation');
    const refuse: HandOffMail = () => Promise.resolve({ outcome: 'refused', forNow: true, reason: 'try later' });
    await expect(sendAccountMailBy(refuse, { linkTokenId: link.id }, now)).rejects.toThrow('try later');
  });
});

describe('asking for a new password', () => {
  beforeEach(() => database().query('delete from graphile_worker._private_jobs'));

  const ask = (email: string, address = '203.0.113.7') =>
    actingAsSystem((context) => requestPasswordReset(context, { email, address }), now);

  it('mails a link to an account, and says and does nothing for an unknown or closed one', async () => {
    const user = await buildUser({ passwordHash: await hashPassword('an old one of twelve') });
    const closed = await buildUser({ deactivatedAt: now });
    expect(await ask('nobody@wrenfield.example')).toBeUndefined();
    expect(await ask(closed.email)).toBeUndefined();
    expect(await waitingMails()).toBe(0);
    expect(await ask(user.email)).toBeUndefined();
    expect(await waitingMails()).toBe(1);
  });

  it('replaces the earlier link, and mails one account three times at most', async () => {
    const user = await buildUser();
    await ask(user.email);
    const first = await openLink(user.id, 'reset');
    await ask(user.email);
    await expect(use('reset', first.token)).rejects.toMatchObject({ code: 'wrong-state' });
    await ask(user.email);
    await ask(user.email);
    expect(await LinkToken.count({ where: { userId: user.id } })).toBe(3);
  });

  it('ends every session and forgets failed sign-ins once the new password is set', async () => {
    const user = await buildUser({ passwordHash: await hashPassword('an old one of twelve') });
    for (let tries = 0; tries < 11; tries += 1)
      await signInWithPassword(user.email, 'wrong wrong wrong', '203.0.113.8');
    const session = await startSession(user.id, now);
    await ask(user.email);
    await use('reset', (await openLink(user.id, 'reset')).token);
    expect(await readSession(session, now)).toBeNull();
    expect((await signInWithPassword(user.email, password, '203.0.113.8')).kind).toBe('welcome');
  });
});

describe('changing one’s own password', () => {
  it('needs the present one, and signs out everywhere else', async () => {
    const user = await buildUser({ passwordHash: await hashPassword(password) });
    const [here, there] = [await startSession(user.id, now), await startSession(user.id, now)];
    const sessionId = (await readSession(here, now))?.id ?? '';
    const change = (currentPassword: string) =>
      actingAs(user, (context) =>
        changeOwnPassword(context, { currentPassword, newPassword: 'fast neutron, hot beam', sessionId }),
      );
    await expect(change('wrong wrong wrong')).rejects.toMatchObject({ code: 'invalid' });
    expect(await readSession(there, now)).not.toBeNull();
    expect(await change(password)).toEqual({ endedSessions: 1 });
    expect(await readSession(here, now)).not.toBeNull();
    expect(await readSession(there, now)).toBeNull();
  });
});

describe('closing an account', () => {
  it('ends its sessions at once; the log says who did it', async () => {
    const [administrator, user] = [await buildAdministrator(), await buildUser()];
    const session = await startSession(user.id, now);
    await actingAs(administrator, (context) => changeAccount(context, { userId: user.id, change: 'deactivate' }));
    expect(await readSession(session, now)).toBeNull();
    const event = await AuditEvent.findOne({ where: { action: 'deactivate-account' }, rejectOnEmpty: true });
    expect(event).toMatchObject({ actorKind: 'user', actorId: administrator.id, subjectId: user.id });
  });

  it('is for administrators, and not for one’s own', async () => {
    const [administrator, user] = [await buildAdministrator(), await buildUser()];
    for (const change of ['deactivate', 'unmake-administrator'] as const) {
      await expect(
        actingAs(administrator, (context) => changeAccount(context, { userId: administrator.id, change })),
      ).rejects.toMatchObject({ code: 'forbidden' });
      await expect(
        actingAs(user, (context) => changeAccount(context, { userId: administrator.id, change })),
      ).rejects.toMatchObject({ code: 'forbidden' });
    }
  });
});
