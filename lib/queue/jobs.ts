import { z } from 'zod';

const id = z.uuid();

/** What the clock puts in has no content of ours; the queue adds when it was due, which is passed over. */
const fromTheClock = z.object({});

/**
 * Every kind of background job and what it is told. A payload names rows by their id and carries no answer, address,
 * password or token: the job reads what it needs when it runs. To add a job, add a line here and a handler in lib/jobs.
 */
export const jobSchemas = {
  /** Checks stored answers and writes one verdict for each; answers that have one already are passed over. */
  'check-answers': z.strictObject({ answerIds: z.array(id).min(1).max(1_000) }),
  /** Hands one score report to the mail server, at most once. */
  'send-score-report': z.strictObject({ deliveryId: id }),
  /** Mails the link of an invitation or of a forgotten password. */
  'send-account-mail': z.strictObject({ linkTokenId: id }),
  /** Reads an uploaded file into rows that a person can preview. */
  'parse-intake': z.strictObject({ intakeId: id }),
  /** Turns the accepted rows of an intake into attempts. */
  'commit-intake': z.strictObject({ intakeId: id }),
  /** Puts queue items whose lease ran out back. */
  'expire-leases': fromTheClock,
  /** Closes the sets whose closing time has passed. */
  'close-due-sets': fromTheClock,
  /** Puts reports whose hand-over was cut short before a person. */
  'doubt-deliveries': fromTheClock,
} as const satisfies Record<string, z.ZodType<object>>;

export type JobName = keyof typeof jobSchemas;

export type JobPayload<Name extends JobName> = z.output<(typeof jobSchemas)[Name]>;

/** Whether a text names a job of the table. */
export function isJobName(name: string): name is JobName {
  return Object.hasOwn(jobSchemas, name);
}

/**
 * Checks what came out of the queue.
 *
 * @throws z.ZodError where the payload does not fit the job
 */
export function parsePayload<Name extends JobName>(name: Name, payload: unknown): JobPayload<Name> {
  return jobSchemas[name].parse(payload) as JobPayload<Name>;
}
