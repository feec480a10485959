import { describe, expect, it } from 'vitest';
import { quickCredits } from '@/app/(course)/courses/[courseId]/sets/[setId]/desk/_components/quick-credits';

describe('the credits that have a key', () => {
  it('are every whole mark where there are at most nine', () => {
    expect(quickCredits(4000)).toEqual(
      [0, 1, 2, 3, 4].map((marks) => ({ key: String(marks), credit: marks * 1000, words: String(marks) })),
    );
    expect(quickCredits(9000)).toHaveLength(10);
  });

  it('are quarters of any other part', () => {
    expect(quickCredits(2400).map(({ words }) => words)).toEqual(['0', '0.6', '1.2', '1.8', '2.4']);
    expect(quickCredits(10_000).map(({ words }) => words)).toEqual(['0', '2.5', '5', '7.5', '10']);
  });
});
