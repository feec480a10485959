import { describe, expect, it } from 'vitest';
import { addCounts, closingLine, countStage } from '@/scripts/ground/test-counts.mjs';

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((one) => ({ status: one })),
});

describe('counting tests', () => {
  it('counts what passed, failed and was skipped', () => {
    const report = { testResults: [file('passed', 'passed', 'passed', 'todo'), file('failed', 'failed', 'pending')] };
    expect(countStage(report, 1)).toEqual({ passed: 2, failed: 1, skipped: 2 });
  });

  it('counts a file that could not be loaded as a failure beside the tests that passed', () => {
    expect(countStage({ testResults: [file('passed', 'passed'), file('failed')] }, 1)).toEqual({
      passed: 1,
      failed: 1,
      skipped: 0,
    });
  });

  it('lets nothing end badly in silence', () => {
    const good = { testResults: [file('passed', 'passed')] };
    expect(countStage(null, 0).failed).toBe(1);
    expect(countStage({ testResults: [] }, 0).failed).toBe(1);
    expect(countStage(good, 1).failed).toBe(1);
    expect(countStage(good, 0)).toEqual({ passed: 1, failed: 0, skipped: 0 });
    expect(countStage({ testResults: [file('passed', 'a state nobody knows')] }, 0).failed).toBe(1);
  });

  it('adds up to one plain line', () => {
    const total = addCounts([
      { passed: 3, failed: 0, skipped: 0 },
      { passed: 4, failed: 1, skipped: 2 },
    ]);
    expect(closingLine(total)).toBe('7 passed, 1 failed, 2 skipped');
  });
});
