import { type AnswerKind } from '@/lib/checker/contract';
import { type DraftParameter, type DraftPart, type TemplateDraft } from './draft';

/** What the pieces of a draft begin with, and which options a kind of answer has: plain data, for the browser, too. */

/** The options that mean something for a kind of answer; the others are left out of the content. */
export const optionsOfKind: Record<AnswerKind, readonly (keyof DraftPart['options'])[]> = {
  scalar: ['answerForm'],
  quantity: ['toleranceKind'],
  operator: ['upToPhase', 'answerForm'],
  pauli: ['answerForm'],
  eigenvalues: ['answerForm'],
  state: ['upToPhase', 'upToScale', 'requireNormalised', 'answerForm'],
  eigenpairs: ['requireNormalised', 'answerForm'],
  vector: ['answerForm'],
  choice: ['choices'],
};

/** An empty part under the given letter. */
export function emptyPart(key: string): DraftPart {
  return {
    key,
    prompt: '',
    kind: 'scalar',
    reference: '',
    options: {
      upToPhase: false,
      upToScale: false,
      requireNormalised: false,
      answerForm: 'evaluated',
      choices: '',
      toleranceKind: 'none',
      tolerance: '',
    },
    weight: '1',
    slips: [],
    expected: [],
    alwaysPerson: false,
  };
}

/** A drawn value without name or range. */
export function emptyParameter(type: DraftParameter['type']): DraftParameter {
  return { type, name: '', from: '', to: '', except: '', values: '' };
}

/** A new question with one empty part. */
export function emptyDraft(title: string): TemplateDraft {
  return { title, prompt: '', solution: '', parameters: [], constraints: [], symbols: [], parts: [emptyPart('a')] };
}
