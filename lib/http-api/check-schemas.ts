import { z } from 'zod';

/** The most checks in one call. */
export const MOST_CHECKS = 1_000;
/** The longest body of one call, in bytes. */
export const LONGEST_CHECKS_BODY = 1_000_000;

const kind = z.enum([
  'scalar',
  'quantity',
  'operator',
  'pauli',
  'eigenvalues',
  'state',
  'eigenpairs',
  'vector',
  'choice',
]);

const domain = z.union([
  z.enum(['real', 'positive', 'nonnegative', 'nonzero', 'integer', 'complex']),
  z.strictObject({ between: z.tuple([z.string(), z.string()]) }),
]);

const tolerance = z.union([
  z.strictObject({ relative: z.number().min(0) }),
  z.strictObject({ absolute: z.number().min(0) }),
  z.strictObject({ significantFigures: z.int().min(1).max(15) }),
]);

const options = z.strictObject({
  upToPhase: z.boolean().optional(),
  upToScale: z.boolean().optional(),
  requireNormalised: z.boolean().optional(),
  reportHermitian: z.boolean().optional(),
  reportUnitary: z.boolean().optional(),
  answerForm: z.enum(['any', 'evaluated']).optional(),
  choices: z.array(z.string()).optional(),
  tolerance: tolerance.optional(),
  definitions: z.record(z.string(), z.string()).optional(),
  assume: z.array(z.string()).optional(),
  slips: z.array(z.strictObject({ id: z.string(), expression: z.string() })).optional(),
  budgetSteps: z.number().min(1).optional(),
});

/** One check of the contract. */
export const checkRequestSchema = z.strictObject({
  id: z.string().max(200),
  kind,
  reference: z.string(),
  answer: z.string(),
  symbols: z.record(z.string(), domain).optional(),
  options: options.optional(),
});

/** The body of a call. Each check is judged by itself, so that a bad one is an error in its place and not of the call. */
export const checksBodySchema = z.strictObject({
  checks: z
    .array(z.unknown(), 'Send {"checks": […]}.')
    .min(1, 'Send at least one check.')
    .max(MOST_CHECKS, `At most ${MOST_CHECKS} checks go in one call.`),
});

/** What comes back for a check that was decided; the fields of `evidence` are those of the checker's contract. */
export const checkResponseSchema = z.object({
  id: z.string(),
  verdict: z.enum(['agrees', 'differs', 'undecided', 'unreadable']),
  slip: z.string().nullable(),
  slips: z.array(z.string()),
  kinKey: z.string().nullable(),
  reading: z.string(),
  message: z.string(),
  evidence: z.looseObject({ test: z.string() }),
  ms: z.number(),
});

/** What comes back in the place of a check that cannot be made; `line` is its place, counted from 1. */
export const checkErrorSchema = z.object({ id: z.string().nullable(), line: z.int().min(1), error: z.string() });

/** The answer to a call: one result a check, in order. */
export const checksAnswerSchema = z.object({ results: z.array(z.union([checkResponseSchema, checkErrorSchema])) });

/** A refusal or failure as problem+json (RFC 9457). */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: z.string(),
  requestId: z.string().optional(),
  fields: z.record(z.string(), z.string()).optional(),
});
