import { describe, expect, it } from 'vitest';
import { acceptsAnswers, mayPassTo as setMayPassTo } from '@/lib/domain/problem-set-state';
import { hasExpired, LEASE_MINUTES, leaseUntil, mayPassTo } from '@/lib/domain/queue-item-state';

const at = (time: string) => new Date(`2026-11-05T${time}:00Z`);

describe('problem set states', () => {
  it('go draft, open, closed, released; closed may open again, released is final', () => {
    expect(setMayPassTo('draft', 'open')).toBe(true);
    expect(setMayPassTo('draft', 'released')).toBe(false);
    expect(setMayPassTo('open', 'closed')).toBe(true);
    expect(setMayPassTo('closed', 'open')).toBe(true);
    expect(setMayPassTo('closed', 'released')).toBe(true);
    expect(setMayPassTo('released', 'open')).toBe(false);
  });

  it('accept answers from opening until closing, or until a student’s own extension', () => {
    const set = { state: 'open' as const, opensAt: at('10:00'), closesAt: at('18:00') };
    expect(acceptsAnswers(set, null, at('09:59'))).toBe(false);
    expect(acceptsAnswers(set, null, at('10:00'))).toBe(true);
    expect(acceptsAnswers(set, null, at('17:59'))).toBe(true);
    expect(acceptsAnswers(set, null, at('18:00'))).toBe(false);
    expect(acceptsAnswers(set, at('20:00'), at('19:00'))).toBe(true);
    expect(acceptsAnswers({ ...set, state: 'closed' }, null, at('17:00'))).toBe(false);
    expect(acceptsAnswers({ ...set, state: 'closed' }, at('20:00'), at('19:00'))).toBe(true);
    expect(acceptsAnswers({ ...set, state: 'draft' }, at('20:00'), at('19:00'))).toBe(false);
    expect(acceptsAnswers({ ...set, state: 'released' }, at('20:00'), at('19:00'))).toBe(false);
  });
});

describe('queue item states', () => {
  it('allow what the desk does and nothing else', () => {
    expect(mayPassTo('waiting', 'taken')).toBe(true);
    expect(mayPassTo('waiting', 'ruled')).toBe(true);
    expect(mayPassTo('ruled', 'to-settle')).toBe(true);
    expect(mayPassTo('ruled', 'taken')).toBe(false);
    expect(mayPassTo('withdrawn', 'waiting')).toBe(false);
    expect(mayPassTo('settled', 'ruled')).toBe(false);
  });

  it('hold an item for a lease that runs out', () => {
    const until = leaseUntil(at('10:00'));
    expect(until.getTime() - at('10:00').getTime()).toBe(LEASE_MINUTES * 60_000);
    expect(hasExpired(until, at('10:00'))).toBe(false);
    expect(hasExpired(until, until)).toBe(true);
  });
});
