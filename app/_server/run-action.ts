import 'server-only';
import { headers } from 'next/headers';
import { type z } from 'zod';
import { checkOrigin } from '@/lib/auth/origin';
import { inTransaction } from '@/lib/db/transaction';
import { type Actor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { withLogContext } from '@/lib/log';
import { type ServiceContext } from '@/lib/services/context';
import { type ActionResult } from './action-result';
import { currentActor } from './current-actor';
import { asHalfmarkError, invalidBy, plainWords } from './fail';
import { formInput } from './form-input';

type Service<Input, Value> = (context: ServiceContext, input: Input) => Promise<Value>;

/**
 * The body of a server action: session, schema, then the service in one transaction. Every failure comes back as a
 * result, never as an exception; only Next's own interrupts pass. `input` is the form, or any object. A redirect or a
 * revalidation belongs after it, when the result is known to be good.
 */
export async function runAction<Schema extends z.ZodType, Value>(
  schema: Schema,
  input: unknown,
  service: Service<z.output<Schema>, Value>,
): Promise<ActionResult<Value>> {
  return run(schema, input, service, currentActor);
}

/**
 * The same for the few forms of signed-out people (setting a password by a link, asking for one): the service acts as
 * the system under the given name and must itself decide by what it is handed.
 */
export async function runPublicAction<Schema extends z.ZodType, Value>(
  name: string,
  schema: Schema,
  input: unknown,
  service: Service<z.output<Schema>, Value>,
): Promise<ActionResult<Value>> {
  return run(schema, input, service, () => Promise.resolve({ kind: 'system', name }));
}

async function run<Schema extends z.ZodType, Value>(
  schema: Schema,
  input: unknown,
  service: Service<z.output<Schema>, Value>,
  whoActs: () => Promise<Actor | null>,
): Promise<ActionResult<Value>> {
  const head = await headers();
  return withLogContext({ requestId: head.get('x-request-id') ?? 'none' }, async () => {
    try {
      const origin = checkOrigin({ method: 'POST', headers: head });
      if (!origin.allowed) throw new HalfmarkError('cross-origin', undefined, { log: origin.reason });
      const actor = await whoActs();
      if (actor === null) throw new HalfmarkError('signed-out');
      const parsed = schema.safeParse(input instanceof FormData ? formInput(input) : input, { error: plainWords });
      if (!parsed.success) throw invalidBy(parsed.error);
      const value = await inTransaction((transaction) => service({ actor, transaction, now: new Date() }, parsed.data));
      return { ok: true, value };
    } catch (error) {
      return refusal(asHalfmarkError(error));
    }
  });
}

function refusal(error: HalfmarkError): ActionResult<never> {
  const fields = Object.keys(error.fields).length > 0 ? error.fields : { '': error.message };
  return { ok: false, code: error.code, message: error.message, fields };
}
