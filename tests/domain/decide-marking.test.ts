import { describe, expect, it } from 'vitest';
import { decideMarking, type CheckOutcome } from '@/lib/domain/decide-marking';
import { defaultSetPolicy } from '@/lib/domain/set-policy';

const outcome = (change: Partial<CheckOutcome>): CheckOutcome => ({
  verdict: 'differs',
  slips: [],
  notEvaluated: false,
  followsThrough: false,
  ...change,
});

const part = {
  outOf: 4000,
  slipCredits: [
    { slip: 'sign', credit: 2000 },
    { slip: 'conjugated', credit: 3000 },
    { slip: 'factor-two', credit: 'person' as const },
  ],
};

describe('what becomes of a checked answer', () => {
  it('credits what agrees in full', () => {
    expect(decideMarking(outcome({ verdict: 'agrees' }), part, defaultSetPolicy)).toEqual({
      kind: 'automatic',
      credit: 4000,
      rule: null,
    });
  });

  it('gives a slip the credit its author gave it', () => {
    expect(decideMarking(outcome({ slips: ['sign'] }), part, defaultSetPolicy)).toEqual({
      kind: 'automatic',
      credit: 2000,
      rule: 'sign',
    });
  });

  it('leaves to a person: no credited slip, a slip left to a person, slips with unlike credits', () => {
    expect(decideMarking(outcome({}), part, defaultSetPolicy)).toMatchObject({
      kind: 'person',
      reasons: ['no-credited-slip'],
      suggestion: null,
    });
    expect(decideMarking(outcome({ slips: ['factor-two'] }), part, defaultSetPolicy)).toMatchObject({
      kind: 'person',
      reasons: ['slip-left-to-person'],
      suggestion: null,
    });
    expect(decideMarking(outcome({ slips: ['sign', 'conjugated'] }), part, defaultSetPolicy)).toMatchObject({
      kind: 'person',
      reasons: ['slip-left-to-person'],
      suggestion: null,
    });
  });

  it('never credits the question written back by itself, whatever the policy', () => {
    const loose = { ...defaultSetPolicy, flag: [] };
    expect(decideMarking(outcome({ verdict: 'agrees', notEvaluated: true }), part, loose)).toMatchObject({
      kind: 'person',
      reasons: ['not-evaluated'],
      suggestion: null,
    });
  });

  it('never decides by itself what is undecided or unreadable, whatever the policy', () => {
    const loose = { ...defaultSetPolicy, flag: [] };
    for (const verdict of ['undecided', 'unreadable'] as const) {
      expect(decideMarking(outcome({ verdict }), part, loose)).toMatchObject({
        kind: 'person',
        reasons: [verdict],
        suggestion: null,
      });
    }
  });

  it('gives zero to what differs where a set’s policy asks for no person', () => {
    const loose = { ...defaultSetPolicy, flag: [] };
    expect(decideMarking(outcome({}), part, loose)).toEqual({ kind: 'automatic', credit: 0, rule: null });
  });

  it('flags a scan and follow-through, keeping the suggestion', () => {
    expect(decideMarking(outcome({ verdict: 'agrees' }), part, defaultSetPolicy, { scan: true })).toMatchObject({
      kind: 'person',
      reasons: ['scan'],
      suggestion: 4000,
    });
    expect(decideMarking(outcome({ verdict: 'agrees', followsThrough: true }), part, defaultSetPolicy)).toMatchObject({
      kind: 'person',
      reasons: ['follow-through'],
      suggestion: 4000,
    });
  });
});
