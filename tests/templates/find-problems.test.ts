import { describe, expect, it } from 'vitest';
import { emptyDraft } from '@/lib/templates/blank-draft';
import {
  contentOfDraft,
  draftOfContent,
  readDraft,
  templateDraftSchema,
  type TemplateDraft,
} from '@/lib/templates/draft';
import { findProblems } from '@/lib/templates/find-problems';
import { previewDraw } from '@/lib/templates/preview';
import { templateContentSchema } from '@/lib/templates/content';
import { templateContent } from '../factories/template-content';

const whole = draftOfContent(templateContent());

function problemsOf(change: (draft: TemplateDraft) => void) {
  const draft = structuredClone(whole);
  change(draft);
  return findProblems(draft).problems;
}

const placesOf = (change: (draft: TemplateDraft) => void) => problemsOf(change).map((problem) => problem.path);

describe('findProblems', () => {
  it('finds none in a whole template and gives its content', () => {
    expect(findProblems(whole)).toEqual({ problems: [], content: templateContent() });
  });

  it('lists what an empty question still needs', () => {
    const { problems, content } = findProblems(emptyDraft('New'));
    expect(content).toBeNull();
    expect(problems.map((problem) => problem.path)).toEqual(['prompt', 'parts.0.prompt', 'parts.0.reference']);
  });

  it.each<[string, (draft: TemplateDraft) => void, string]>([
    ['a range that ends before it begins', (draft) => (draft.parameters[0]!.to = '-5'), 'parameters.0.to'],
    ['an end that is no number', (draft) => (draft.parameters[0]!.from = 'one'), 'parameters.0.from'],
    ['an exception that is no number', (draft) => (draft.parameters[0]!.except = '1, x'), 'parameters.0.except'],
    ['a range with nothing left', (draft) => (draft.parameters[0]!.except = '1 2 3 4 5 6 7 8 9'), 'parameters'],
    ['a name that is none', (draft) => (draft.parameters[0]!.name = '2n'), 'parameters.0.name'],
    ['a name with a meaning of its own', (draft) => (draft.symbols[0]!.name = 'hbar'), 'symbols.0.name'],
    ['a value that cannot be read', (draft) => (draft.parameters[1]!.values = 'S_x\nS_y +'), 'parameters.1.values'],
    ['values of two types', (draft) => (draft.parameters[1]!.values = 'S_x\n3'), 'parameters.1.values'],
    ['a name twice', (draft) => (draft.symbols[0]!.name = 'n'), 'symbols'],
    ['an unknown name in the prompt', (draft) => (draft.prompt += ' {{k}}'), 'prompt'],
    ['an unknown name in a part', (draft) => (draft.parts[1]!.prompt += ' ${{k}}$'), 'parts.1.prompt'],
    ['an unreadable reference', (draft) => (draft.parts[0]!.reference = 'commutator(A,'), 'parts.0.reference'],
    ['an undeclared name', (draft) => (draft.parts[2]!.reference = 'n omga'), 'parts.2.reference'],
    ['a state where a scalar is asked for', (draft) => (draft.parts[2]!.reference = '|+>'), 'parts.2.reference'],
    ['a reference with no value', (draft) => (draft.parts[2]!.reference = '1/(n - n)'), 'parts.2.reference'],
    ['a weight that is no number', (draft) => (draft.parts[0]!.weight = 'heavy'), 'parts.0.weight'],
    ['a condition that cannot be read', (draft) => draft.constraints.push('n >'), 'constraints'],
    ['a condition nothing satisfies', (draft) => draft.constraints.push('n > 100'), 'constraints'],
    ['an empty condition', (draft) => draft.constraints.push(''), 'constraints.0'],
    [
      'an expected answer that cannot be read',
      (draft) => draft.parts[2]!.expected.push({ id: 'e', expression: 'n +', share: 0, sentence: '' }),
      'parts.2.expected.0.expression',
    ],
    [
      'a label that is none of the choices',
      (draft) => (Object.assign(draft.parts[2]!, { kind: 'choice', reference: 'up' }).options.choices = 'left\nright'),
      'parts.2.reference',
    ],
  ])('finds %s', (_what, change, path) => {
    expect(placesOf(change)).toContain(path);
    expect(problemsOf(change).every((problem) => /\S{3}.*[.!?”)]$/.test(problem.message))).toBe(true);
  });

  it('advises on a value that is drawn and not used, and still gives the content', () => {
    const draft = structuredClone(whole);
    draft.parameters.push({ type: 'integer', name: 'spare', from: '1', to: '2', except: '', values: '' });
    const { problems, content } = findProblems(draft);
    expect(problems).toEqual([expect.objectContaining({ path: 'parameters.2.name', weight: 'advice' })]);
    expect(content).not.toBeNull();
  });
});

describe('drafts', () => {
  it('come back from content and go back to it', () => {
    const content = templateContent({
      symbols: [{ name: 'theta', domain: { between: ['0', 'pi'] } }],
      parts: [
        {
          ...templateContent().parts[0]!,
          kind: 'quantity',
          reference: '3 MHz',
          options: { answerForm: 'any', tolerance: { significantFigures: 3 } },
        },
        {
          ...templateContent().parts[1]!,
          kind: 'choice',
          reference: 'up',
          options: { answerForm: 'any', choices: ['up', 'down'] },
        },
      ],
    });
    expect(templateContentSchema.parse(contentOfDraft(draftOfContent(content)))).toEqual(content);
  });

  it('are read from either shape in which they are stored', () => {
    expect(readDraft(templateContent())).toEqual(whole);
    expect(readDraft(JSON.parse(JSON.stringify(whole)))).toEqual(whole);
    expect(readDraft(emptyDraft('New'))).toEqual(emptyDraft('New'));
    expect(templateDraftSchema.parse(emptyDraft('New'))).toEqual(emptyDraft('New'));
    expect(() => readDraft({ title: 3 })).toThrow();
  });
});

describe('previewDraw', () => {
  it('sets values in and works every reference out', () => {
    const preview = previewDraw(templateContent(), 'sample 1');
    if (!preview.ok) throw new Error(preview.error);
    expect(preview.draw.values.map(({ name }) => name)).toEqual(['n', 'A']);
    expect(preview.draw.prompt).not.toContain('{{');
    expect(preview.draw.parts.map((part) => part.key)).toEqual(['a', 'b', 'c']);
    expect(preview.draw.parts.every((part) => part.reference.ok && 'latex' in part.reference)).toBe(true);
  });
});
