'use client';

import { createContext, useContext } from 'react';
import { type TemplateProblem } from '@/lib/templates/template-problem';

/** What is wrong with the draft, for the fields at whose place it stands. */
export const ProblemContext = createContext<readonly TemplateProblem[]>([]);

/**
 * What is wrong at one place of the draft; undefined where nothing is. An empty field is not scolded: what it still needs
 * is in the list beside the result.
 */
export function useProblem(path: string, value: string): string | undefined {
  const problems = useContext(ProblemContext);
  if (value.trim() === '') return undefined;
  return problems.find((problem) => problem.path === path && problem.weight === 'mistake')?.message;
}
