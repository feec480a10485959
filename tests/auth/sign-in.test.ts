import { describe, expect, it } from 'vitest';
import { attemptLimits, countAttempt } from '@/lib/auth/attempt-limits';
import { hashPassword } from '@/lib/auth/password';
import { signInWithPassword } from '@/lib/auth/sign-in';
import { buildUser } from '../factories/people';

const password = 'slow neutron, cold beam';
const passwordHash = await hashPassword(password);
let addresses = 0;
const newAddress = () => `198.51.100.${(addresses += 1)}`;

describe('signing in', () => {
  it('lets the right person in, however the e-mail is written', async () => {
    const user = await buildUser({ email: 'ada.pell@wrenfield.example', passwordHash });
    const outcome = await signInWithPassword(' Ada.Pell@Wrenfield.example ', password, newAddress());
    expect(outcome).toEqual({ kind: 'welcome', userId: user.id, name: user.name });
  });

  it('gives one answer for a wrong password, an unknown e-mail, no password yet, and a closed account', async () => {
    const open = await buildUser({ passwordHash });
    const invited = await buildUser();
    const closed = await buildUser({ passwordHash, deactivatedAt: new Date() });
    const outcomes = [
      await signInWithPassword(open.email, 'wrong wrong wrong', newAddress()),
      await signInWithPassword('nobody@wrenfield.example', password, newAddress()),
      await signInWithPassword(invited.email, password, newAddress()),
      await signInWithPassword(closed.email, password, newAddress()),
    ];
    expect(outcomes).toEqual(Array.from({ length: 4 }, () => ({ kind: 'refused' })));
  });

  it('stops an account after ten failures from anywhere, the right password too', async () => {
    const user = await buildUser({ passwordHash });
    for (let tries = 0; tries < attemptLimits['sign-in-account']; tries += 1) {
      expect((await signInWithPassword(user.email, 'wrong wrong wrong', newAddress())).kind).toBe('refused');
    }
    const stopped = await signInWithPassword(user.email, password, newAddress());
    expect(stopped.kind).toBe('too-many');
    if (stopped.kind === 'too-many') expect(stopped.retryAfterSeconds).toBeGreaterThan(14 * 60);
    const neighbour = await buildUser({ passwordHash });
    expect((await signInWithPassword(neighbour.email, password, newAddress())).kind).toBe('welcome');
  });

  it('counts tries that come all at once', async () => {
    const user = await buildUser({ passwordHash });
    const outcomes = await Promise.all(
      Array.from({ length: 25 }, () => signInWithPassword(user.email, 'wrong wrong wrong', newAddress())),
    );
    expect(outcomes.filter((outcome) => outcome.kind === 'refused')).toHaveLength(attemptLimits['sign-in-account']);
  });

  it('does not count successes, however many one campus has', async () => {
    const user = await buildUser({ passwordHash });
    const campus = newAddress();
    for (let tries = 0; tries < attemptLimits['sign-in-account'] + 5; tries += 1) {
      expect((await signInWithPassword(user.email, password, campus)).kind).toBe('welcome');
    }
  });

  it('stops an address after 300 failures, and not before', async () => {
    const address = newAddress();
    // The limit is in the count; most of it is counted here without the work of a hash each.
    for (let tries = 0; tries < attemptLimits['sign-in-address'] - 2; tries += 1) {
      expect((await countAttempt('sign-in-address', address)).allowed).toBe(true);
    }
    for (const guess of ['guess-1@wrenfield.example', 'guess-2@wrenfield.example']) {
      expect((await signInWithPassword(guess, 'wrong wrong wrong', address)).kind).toBe('refused');
    }
    const user = await buildUser({ passwordHash });
    expect((await signInWithPassword(user.email, password, address)).kind).toBe('too-many');
    expect((await signInWithPassword(user.email, password, newAddress())).kind).toBe('welcome');
  });

  it('does not let tries on a stopped account use up the address of a whole campus', async () => {
    const campus = newAddress();
    const user = await buildUser({ passwordHash });
    for (let tries = 0; tries < 320; tries += 1) await signInWithPassword(user.email, 'wrong wrong wrong', campus);
    const neighbour = await buildUser({ passwordHash });
    expect((await signInWithPassword(neighbour.email, password, campus)).kind).toBe('welcome');
  });
});
