import { z } from 'zod';

/** The kinds of answer a part may ask for. */
export const answerKinds = [
  'scalar',
  'quantity',
  'operator',
  'pauli',
  'eigenvalues',
  'state',
  'eigenpairs',
  'vector',
  'choice',
] as const;

export type AnswerKind = (typeof answerKinds)[number];

const name = z
  .string()
  .regex(
    /^[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?$/,
    'A name is letters and digits, with at most one index: n, B_0, omega.',
  )
  .max(40);

const expression = z.string().trim().min(1, 'Write an expression.').max(4000);

/** What is drawn for each student, and from where; values are expressions in the answer language. */
export const parameterSchema = z.discriminatedUnion('type', [
  z
    .object({
      type: z.literal('integer'),
      name,
      from: z.int().min(-1_000_000).max(1_000_000),
      to: z.int().min(-1_000_000).max(1_000_000),
      /** Integers left out of the range, such as 0. */
      except: z.array(z.int()).max(100).default([]),
    })
    .refine((range) => range.from <= range.to, { message: 'The range ends before it begins.', path: ['to'] }),
  z.object({
    type: z.literal('choice'),
    name,
    /** Expressions of one type, such as sigma_x, sigma_y, sigma_z. */
    values: z.array(expression).min(1, 'Give at least one value.').max(200),
  }),
]);

export type Parameter = z.infer<typeof parameterSchema>;

const domain = z.union([
  z.enum(['real', 'positive', 'nonnegative', 'nonzero', 'integer', 'complex']),
  z.object({ between: z.tuple([expression, expression]) }),
]);

/** A symbol that stays symbolic in the question, with its domain. */
export const symbolSchema = z.object({ name, domain });

/** The credit of a slip as a share of the part's credit in thousandths, or left to a person. */
const share = z.union([z.int().min(0).max(1000), z.literal('person')]);

/** One asked-for answer. */
export const partSchema = z.object({
  /** The letter of the part: a, b, c. Answers are stored under it. */
  key: z.string().regex(/^[a-z]$/, 'A part is named by one letter.'),
  /** What is asked, in Markdown with TeX and drawn values. */
  prompt: z.string().trim().min(1, 'Say what is asked.').max(8000),
  kind: z.enum(answerKinds),
  /** The reference computation in the answer language, over symbols and parameters. */
  reference: expression,
  /** Options of the check contract that the author sets for this part. */
  options: z
    .object({
      upToPhase: z.boolean().optional(),
      upToScale: z.boolean().optional(),
      requireNormalised: z.boolean().optional(),
      reportHermitian: z.boolean().optional(),
      reportUnitary: z.boolean().optional(),
      answerForm: z.enum(['any', 'evaluated']).default('evaluated'),
      choices: z.array(z.string().trim().min(1).max(200)).min(2).max(20).optional(),
      tolerance: z
        .object({
          relative: z.number().positive().optional(),
          absolute: z.number().positive().optional(),
          significantFigures: z.int().min(1).max(12).optional(),
        })
        .optional(),
    })
    .default({ answerForm: 'evaluated' }),
  /** The weight of this part in the item's points. */
  weight: z.int().min(1).max(1000).default(1),
  slips: z
    .array(z.object({ slip: z.string().max(40), share }))
    .max(40)
    .default([]),
  /** Wrong answers the author expects, each with its credit and a sentence for the student. */
  expected: z
    .array(
      z.object({
        id: z
          .string()
          .regex(/^[a-z][a-z0-9-]*$/)
          .max(40),
        expression,
        share,
        sentence: z.string().max(500),
      }),
    )
    .max(20)
    .default([]),
  /** Whether every answer of this part goes to a person. */
  alwaysPerson: z.boolean().default(false),
});

export type Part = z.infer<typeof partSchema>;

/** A whole template, as it is stored with a version and as a draft is edited. */
export const templateContentSchema = z
  .object({
    format: z.literal(1).default(1),
    title: z.string().trim().min(1, 'Give the question a title.').max(200),
    prompt: z.string().trim().min(1, 'Write the question.').max(20_000),
    /** For staff, and for students after release where the set says so. */
    solution: z.string().max(20_000).default(''),
    parameters: z.array(parameterSchema).max(30).default([]),
    /** Conditions between drawn values that every draw satisfies. */
    constraints: z.array(expression).max(30).default([]),
    symbols: z.array(symbolSchema).max(30).default([]),
    parts: z.array(partSchema).min(1, 'Ask for at least one answer.').max(12),
  })
  .superRefine((content, context) => {
    const names = [...content.parameters, ...content.symbols].map((named) => named.name);
    names.forEach((value, index) => {
      if (names.indexOf(value) !== index)
        context.addIssue({ code: 'custom', message: `The name ${value} is used twice.`, path: ['symbols'] });
    });
    const keys = content.parts.map((part) => part.key);
    keys.forEach((key, index) => {
      if (keys.indexOf(key) !== index)
        context.addIssue({ code: 'custom', message: `There are two parts ${key}.`, path: ['parts', index, 'key'] });
    });
  });

export type TemplateContent = z.infer<typeof templateContentSchema>;

/** The drawn values of one draw: parameter name to an expression in the answer language. */
export type DrawnValues = Readonly<Record<string, string>>;
