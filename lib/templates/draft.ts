import { z } from 'zod';
import { optionsOfKind } from './blank-draft';
import { answerKinds, templateContentSchema, type TemplateContent } from './content';

/**
 * A template while it is being written: the shape of a template with nothing said yet about what stands in it, so that
 * an unfinished question is kept as it is. Only its size is bounded. Numbers are kept as they were typed.
 */
const text = (most: number) => z.string().max(most).default('');
const share = z.union([z.int().min(0).max(1000), z.literal('person')]);

export const draftParameterSchema = z.object({
  type: z.enum(['integer', 'choice']),
  name: text(40),
  from: text(12),
  to: text(12),
  /** Integers left out, between commas. */
  except: text(1000),
  /** One value a line. */
  values: text(20_000),
});

export const draftPartSchema = z.object({
  key: text(1),
  prompt: text(8000),
  kind: z.enum(answerKinds),
  reference: text(4000),
  options: z.object({
    upToPhase: z.boolean().default(false),
    upToScale: z.boolean().default(false),
    requireNormalised: z.boolean().default(false),
    answerForm: z.enum(['any', 'evaluated']).default('evaluated'),
    /** One label a line, for the kind `choice`. */
    choices: text(4000),
    /** For the kind `quantity`: what may differ. */
    toleranceKind: z.enum(['none', 'relative', 'absolute', 'significantFigures']).default('none'),
    tolerance: text(20),
  }),
  weight: text(6),
  slips: z
    .array(z.object({ slip: text(40), share }))
    .max(40)
    .default([]),
  expected: z
    .array(z.object({ id: text(40), expression: text(4000), share, sentence: text(500) }))
    .max(20)
    .default([]),
  alwaysPerson: z.boolean().default(false),
});

export const templateDraftSchema = z.object({
  title: text(200),
  prompt: text(20_000),
  solution: text(20_000),
  parameters: z.array(draftParameterSchema).max(30).default([]),
  /** One condition each. */
  constraints: z.array(text(4000)).max(30).default([]),
  symbols: z
    .array(
      z.object({
        name: text(40),
        domain: z.enum(['real', 'positive', 'nonnegative', 'nonzero', 'integer', 'complex', 'between']).default('real'),
        from: text(4000),
        to: text(4000),
      }),
    )
    .max(30)
    .default([]),
  parts: z.array(draftPartSchema).max(12).default([]),
});

export type TemplateDraft = z.infer<typeof templateDraftSchema>;
export type DraftPart = TemplateDraft['parts'][number];
export type DraftParameter = TemplateDraft['parameters'][number];

/**
 * What a draft says as template content, not yet checked: `templateContentSchema` tells whether it is one. Numbers that
 * are not numbers become NaN, which that schema refuses at their place.
 */
export function contentOfDraft(draft: TemplateDraft): z.input<typeof templateContentSchema> {
  return {
    format: 1,
    title: draft.title,
    prompt: draft.prompt,
    solution: draft.solution,
    parameters: draft.parameters.map((parameter) =>
      parameter.type === 'integer'
        ? {
            type: 'integer',
            name: parameter.name.trim(),
            from: wholeNumber(parameter.from),
            to: wholeNumber(parameter.to),
            except: parameter.except
              .split(/[,;\s]+/)
              .filter(Boolean)
              .map(wholeNumber),
          }
        : { type: 'choice', name: parameter.name.trim(), values: linesOf(parameter.values) },
    ),
    constraints: draft.constraints,
    symbols: draft.symbols.map(({ name, domain, from, to }) => ({
      name: name.trim(),
      domain: domain === 'between' ? { between: [from, to] as [string, string] } : domain,
    })),
    parts: draft.parts.map((part) => ({
      key: part.key,
      prompt: part.prompt,
      kind: part.kind,
      reference: part.reference,
      options: contentOptions(part),
      weight: wholeNumber(part.weight),
      slips: part.slips,
      expected: part.expected,
      alwaysPerson: part.alwaysPerson,
    })),
  };
}

/** A stored draft, whether it was written in the editor or taken from finished content. Throws a ZodError for neither. */
export function readDraft(stored: unknown): TemplateDraft {
  const content = templateContentSchema.safeParse(stored);
  return content.success && isFinished(stored) ? draftOfContent(content.data) : templateDraftSchema.parse(stored);
}

function isFinished(stored: unknown): boolean {
  return typeof stored === 'object' && stored !== null && 'format' in stored;
}

/** A published content as a draft again, to go on from. */
export function draftOfContent(content: TemplateContent): TemplateDraft {
  return templateDraftSchema.parse({
    title: content.title,
    prompt: content.prompt,
    solution: content.solution,
    parameters: content.parameters.map((parameter) =>
      parameter.type === 'integer'
        ? {
            type: 'integer',
            name: parameter.name,
            from: String(parameter.from),
            to: String(parameter.to),
            except: parameter.except.join(', '),
          }
        : { type: 'choice', name: parameter.name, values: parameter.values.join('\n') },
    ),
    constraints: content.constraints,
    symbols: content.symbols.map(({ name, domain }) =>
      typeof domain === 'string'
        ? { name, domain }
        : { name, domain: 'between', from: domain.between[0], to: domain.between[1] },
    ),
    parts: content.parts.map((part) => ({
      ...part,
      weight: String(part.weight),
      options: { ...part.options, choices: part.options.choices?.join('\n') ?? '', ...draftTolerance(part) },
    })),
  });
}

function contentOptions(part: DraftPart): z.input<typeof templateContentSchema>['parts'][number]['options'] {
  const { options } = part;
  const has = (option: keyof DraftPart['options']) => optionsOfKind[part.kind].includes(option);
  return {
    answerForm: has('answerForm') ? options.answerForm : 'any',
    ...(has('upToPhase') && options.upToPhase ? { upToPhase: true } : {}),
    ...(has('upToScale') && options.upToScale ? { upToScale: true } : {}),
    ...(has('requireNormalised') && options.requireNormalised ? { requireNormalised: true } : {}),
    ...(has('choices') ? { choices: linesOf(options.choices) } : {}),
    ...(has('toleranceKind') && options.toleranceKind !== 'none'
      ? { tolerance: { [options.toleranceKind]: decimal(options.tolerance) } }
      : {}),
  };
}

function draftTolerance({ options }: TemplateContent['parts'][number]) {
  for (const kind of ['relative', 'absolute', 'significantFigures'] as const) {
    const value = options.tolerance?.[kind];
    if (value !== undefined) return { toleranceKind: kind, tolerance: String(value) };
  }
  return {};
}

function linesOf(lines: string): string[] {
  return lines
    .split('\n')
    .map((line) => line.trim())
    .filter(Boolean);
}

function wholeNumber(typed: string): number {
  return /^\s*[-+−]?\d+\s*$/.test(typed) ? Number(typed.trim().replace('−', '-')) : Number.NaN;
}

function decimal(typed: string): number {
  return /^\s*\d+(\.\d+)?(e-?\d+)?\s*$/i.test(typed) ? Number(typed) : Number.NaN;
}
