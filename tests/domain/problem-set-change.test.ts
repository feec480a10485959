import { describe, expect, it } from 'vitest';
import { faultsOfChange, faultsOfPlan, hasBegun, type SetPlan } from '@/lib/domain/problem-set-change';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';
import { defaultSetPolicy } from '@/lib/domain/set-policy';

const day = (number: number) => new Date(Date.UTC(2026, 11, number));
const now = day(10);

function plan(overrides: Partial<SetPlan> = {}): SetPlan {
  return {
    title: 'Set 4',
    opensAt: day(8),
    closesAt: day(15),
    appealsUntil: day(22),
    attemptsAllowed: 3,
    policy: defaultSetPolicy,
    ...overrides,
  };
}

const change = (state: ProblemSetState, next: Partial<SetPlan>, before: Partial<SetPlan> = {}) =>
  faultsOfChange({ ...plan(before), state }, plan({ ...before, ...next }), now);

describe('hasBegun', () => {
  it('is so once the set is open and its time has come', () => {
    expect(hasBegun({ state: 'draft', opensAt: day(1) }, now)).toBe(false);
    expect(hasBegun({ state: 'open', opensAt: day(11) }, now)).toBe(false);
    expect(hasBegun({ state: 'open', opensAt: now }, now)).toBe(true);
    expect(hasBegun({ state: 'closed', opensAt: day(1) }, now)).toBe(true);
  });
});

describe('faultsOfPlan', () => {
  it('asks for times in order', () => {
    expect(faultsOfPlan(plan())).toEqual({});
    expect(faultsOfPlan(plan({ closesAt: day(8) }))).toHaveProperty('closesAt');
    expect(faultsOfPlan(plan({ appealsUntil: day(14) }))).toHaveProperty('appealsUntil');
    expect(faultsOfPlan(plan({ closesAt: null }))).toHaveProperty('closesAt');
    expect(faultsOfPlan(plan({ opensAt: null, closesAt: null, appealsUntil: null }))).toEqual({});
  });
});

describe('faultsOfChange', () => {
  it('lets a draft become anything in order', () => {
    const next = { opensAt: day(1), closesAt: day(2), appealsUntil: null, attemptsAllowed: 1 };
    expect(change('draft', next)).toEqual({});
  });

  it('lets an open set give more time and attempts, never less', () => {
    expect(change('open', { closesAt: day(16), attemptsAllowed: 5, appealsUntil: day(23) })).toEqual({});
    expect(Object.keys(change('open', { closesAt: day(14) }))).toEqual(['closesAt']);
    expect(Object.keys(change('open', { attemptsAllowed: 2 }))).toEqual(['attemptsAllowed']);
    expect(Object.keys(change('open', { opensAt: day(9) }))).toEqual(['opensAt']);
    expect(Object.keys(change('open', { appealsUntil: null }))).toEqual(['appealsUntil']);
  });

  it('keeps the promise that an appeal cannot lower a mark', () => {
    const lower = { ...defaultSetPolicy, appealMayLower: true };
    expect(Object.keys(change('open', { policy: lower }))).toEqual(['appealMayLower']);
    expect(change('draft', { policy: lower })).toEqual({});
    expect(change('open', { policy: defaultSetPolicy }, { policy: lower })).toEqual({});
  });

  it('keeps the closing time of a closed set, and lets appeals last longer', () => {
    const closed = { closesAt: day(9), appealsUntil: day(20) };
    expect(Object.keys(change('closed', { closesAt: day(12) }, closed))).toEqual(['closesAt']);
    expect(change('closed', { appealsUntil: day(25) }, closed)).toEqual({});
  });

  it('lets a set that opens by itself later be changed freely, but keeps both times', () => {
    const coming = { opensAt: day(12) };
    expect(change('open', { closesAt: day(14), attemptsAllowed: 1, opensAt: day(13) }, coming)).toEqual({});
    expect(change('open', { opensAt: null }, coming)).toHaveProperty('opensAt');
    expect(change('open', { closesAt: null, appealsUntil: null }, coming)).toHaveProperty('closesAt');
  });
});
