import { compute } from '@/lib/checker';
import { templateContentSchema, type DrawnValues, type Part, type TemplateContent } from './content';
import { contentOfDraft, type TemplateDraft } from './draft';
import { drawValues } from './draw-values';
import { findNameProblems } from './find-name-problems';
import { referenceOf } from './reference-of';
import { readValue, type ValueKind } from './read-text';
import { slotsIn } from './interpolate';
import { type TemplateProblem } from './template-problem';

/** Draws on which references are worked out before a template is published. */
export const SAMPLE_DRAWS = 12;

/** The seed of a sample draw: the same samples for every author, so that a preview is the same after a reload. */
export function sampleSeed(index: number): string {
  return `sample ${index + 1}`;
}

/**
 * Finds the mistakes of a draft: shape, names, values, unreadable or mistyped references, constraints that nothing
 * satisfies, and references that cannot be worked out on `draws` sample draws. The first mistake of a place hides those
 * that follow from it. An empty list means that the draft can be published as the returned content.
 */
export function findProblems(
  draft: TemplateDraft,
  draws = SAMPLE_DRAWS,
): { problems: TemplateProblem[]; content: TemplateContent | null } {
  const parsed = templateContentSchema.safeParse(contentOfDraft(draft));
  if (!parsed.success) {
    const problems = new Map<string, TemplateProblem>();
    for (const issue of parsed.error.issues) {
      const path = draftPath(issue.path);
      if (!problems.has(path)) problems.set(path, mistake(path, wordsOf(issue)));
    }
    return { problems: [...problems.values()], content: null };
  }
  const content = parsed.data;
  const problems = [...findNameProblems(content), ...findSlotProblems(content), ...findValueProblems(content)];
  if (problems.every(isAdvice)) problems.push(...findPartProblems(content), ...findDrawProblems(content, draws));
  return { problems, content: problems.every(isAdvice) ? content : null };
}

function isAdvice(problem: TemplateProblem): boolean {
  return problem.weight === 'advice';
}

function mistake(path: string, message: string): TemplateProblem {
  return { path, message, weight: 'mistake' };
}

/** Places in the content that are one field in the draft. */
function draftPath(path: readonly PropertyKey[]): string {
  const [list, index, field] = path.map(String);
  if (list === 'parameters' && (field === 'except' || field === 'values')) return `${list}.${index}.${field}`;
  if (list === 'symbols' && field === 'domain') return `${list}.${index}.${path[4] === 1 ? 'to' : 'from'}`;
  return path.slice(0, 4).join('.');
}

function wordsOf(issue: { code: string; message: string; path: readonly PropertyKey[] }): string {
  if (issue.code !== 'invalid_type' && issue.code !== 'invalid_union') return issue.message;
  return issue.path.includes('tolerance') ? 'Write a number greater than zero.' : 'Write a whole number.';
}

/** Names between double braces that are not drawn. */
function findSlotProblems(content: TemplateContent): TemplateProblem[] {
  const drawn = new Set(content.parameters.map((parameter) => parameter.name));
  const texts: [string, string][] = [
    ['prompt', content.prompt],
    ['solution', content.solution],
    ...content.parts.map((part, index): [string, string] => [`parts.${index}.prompt`, part.prompt]),
  ];
  return texts.flatMap(([path, text]) => {
    const unknown = slotsIn(text).find((slot) => !drawn.has(slot.name));
    if (unknown === undefined) return [];
    const known = drawn.size === 0 ? 'no parameter has been made yet' : `the parameters are ${[...drawn].join(', ')}`;
    return [mistake(path, `{{${unknown.name}}} is not drawn: ${known}.`)];
  });
}

/** Values of choices that cannot be read, or of several types. */
function findValueProblems(content: TemplateContent): TemplateProblem[] {
  return content.parameters.flatMap((parameter, index) => {
    if (parameter.type !== 'choice') return [];
    const path = `parameters.${index}.values`;
    const kinds = new Set<ValueKind>();
    for (const value of parameter.values) {
      const read = readValue(value, content.symbols);
      if (!read.ok) return [mistake(path, `“${value}”: ${read.error}`)];
      if (read.kind) kinds.add(read.kind);
    }
    return kinds.size > 1
      ? [
          mistake(
            path,
            `The values are of different types (${[...kinds].join(' and ')}); one name stands for one type.`,
          ),
        ]
      : [];
  });
}

function findPartProblems(content: TemplateContent): TemplateProblem[] {
  return content.parts.flatMap((part, index) => {
    const problems: TemplateProblem[] = [];
    const ids = part.expected.map((wrong) => wrong.id);
    const twice = ids.findIndex((id, at) => ids.indexOf(id) !== at);
    if (twice !== -1)
      problems.push(mistake(`parts.${index}.expected.${twice}.id`, `The name ${ids[twice]} is used twice.`));
    const choices = part.options.choices;
    if (part.kind === 'choice' && choices && !hasChoice(choices, part.reference)) {
      problems.push(mistake(`parts.${index}.reference`, `The right label is one of: ${choices.join(', ')}.`));
    }
    return problems;
  });
}

function hasChoice(choices: readonly string[], label: string): boolean {
  const folded = (text: string) => text.trim().toLowerCase();
  return choices.some((choice) => folded(choice) === folded(label));
}

/** Works every reference out on sample draws; one problem for each part at most. */
function findDrawProblems(content: TemplateContent, draws: number): TemplateProblem[] {
  const problems = new Map<string, TemplateProblem>();
  for (let sample = 0; sample < draws; sample += 1) {
    const drawn = drawValues(content, sampleSeed(sample));
    if (!drawn.ok) return [mistake(content.constraints.length > 0 ? 'constraints' : 'parameters', drawn.error)];
    for (const [index, part] of content.parts.entries()) {
      const found = problems.has(part.key) ? null : problemOfPart(content, part, index, drawn.values);
      if (found !== null) problems.set(part.key, found);
    }
  }
  return [...problems.values()];
}

function problemOfPart(
  content: TemplateContent,
  part: Part,
  index: number,
  values: DrawnValues,
): TemplateProblem | null {
  const reference = referenceOf(content, part.key, values);
  if (!reference.ok) return mistake(`parts.${index}.${reference.place}`, reference.error);
  if (part.kind === 'choice') return null;
  const { kind, symbols, options } = reference.check;
  const computed = compute({ kind, symbols, options, reference: reference.check.reference });
  if (!computed.ok) return mistake(`parts.${index}.reference`, `${computed.error}${forDraw(values)}`);
  for (const [at, slip] of (options.slips ?? []).entries()) {
    const wrong = compute({ kind, symbols, options, reference: slip.expression });
    if (!wrong.ok) return mistake(`parts.${index}.expected.${at}.expression`, `${wrong.error}${forDraw(values)}`);
  }
  return null;
}

function forDraw(values: DrawnValues): string {
  const words = Object.entries(values).map(([name, value]) => `${name} = ${value}`);
  return words.length === 0 ? '' : ` (in the draw ${words.join(', ')})`;
}
