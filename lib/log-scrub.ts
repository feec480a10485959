/**
 * What may stand in a log. The rule is by name: a field whose name speaks of an answer, a secret or a person's address
 * never shows its value, however deep it lies, and errors show code and place but not the values a database or a parser
 * quotes back.
 */

const secretName =
  /pass(word|phrase)?|secret|token|authorization|cookie|credential|hash$|api.?key|answer|raw|reading|prompt|comment|reason|payload|body|e.?mail|(^|_)name$|fullName|parameters|bind|sql|detail/i;

const rowId = /^[0-9a-f]{8}-([0-9a-f]{4}-){3}[0-9a-f]{12}$/i;

const deepest = 6;
const longestText = 500;
const longestList = 50;

/** A copy of a value that is fit for the log. */
export function scrub(value: unknown, depth = 0): unknown {
  if (value instanceof Error) return describeError(value);
  if (typeof value === 'string') return value.length > longestText ? `${value.slice(0, longestText)}…` : value;
  if (typeof value === 'bigint') return value.toString();
  if (value === null || typeof value !== 'object') return typeof value === 'function' ? '[function]' : value;
  if (value instanceof Date) return value.toISOString();
  if (depth >= deepest) return '[deep]';
  if (Array.isArray(value)) return value.slice(0, longestList).map((entry) => scrub(entry, depth + 1));
  return Object.fromEntries(
    Object.entries(value).map(([name, entry]) => [
      name,
      isSecret(name, entry) ? '[left out]' : scrub(entry, depth + 1),
    ]),
  );
}

/** Numbers, truth values and the ids of rows tell nothing, whatever they are called. */
function isSecret(name: string, value: unknown): boolean {
  if (!secretName.test(name) || value === null || value === undefined) return false;
  if (typeof value === 'number' || typeof value === 'boolean') return false;
  return !(typeof value === 'string' && rowId.test(value));
}

/** What a log says of an error. */
export type LoggedError = {
  type: string;
  message: string;
  code?: string;
  constraint?: string;
  table?: string;
  at?: string[];
  cause?: LoggedError;
};

/** Describes an error without values: messages of the database quote what was typed, so only their code is kept. */
export function describeError(error: Error, depth = 0): LoggedError {
  const facts = factsOf(error);
  const { cause } = error;
  return {
    type: error.name,
    message: facts.quotesValues ? 'database error' : String(scrub(facts.message)),
    ...(facts.code === undefined ? {} : { code: facts.code }),
    ...(facts.constraint === undefined ? {} : { constraint: facts.constraint }),
    ...(facts.table === undefined ? {} : { table: facts.table }),
    at: placesOf(error),
    ...(cause instanceof Error && depth < 3 ? { cause: describeError(cause, depth + 1) } : {}),
  };
}

type DatabaseFacts = { code?: unknown; severity?: unknown; constraint?: unknown; table?: unknown };

function factsOf(error: Error) {
  const own = error as Error & DatabaseFacts & { log?: unknown; parent?: DatabaseFacts };
  const parent = own.parent ?? own;
  const quotesValues =
    error.name.startsWith('Sequelize') || typeof own.severity === 'string' || error.name === 'AggregateError';
  return {
    quotesValues,
    message: typeof own.log === 'string' ? own.log : error.message,
    code: textOf(parent.code) ?? textOf(own.code),
    constraint: textOf(parent.constraint),
    table: textOf(parent.table),
  };
}

function textOf(value: unknown): string | undefined {
  return typeof value === 'string' ? value : undefined;
}

/** The lines of a stack that name places in the code: without its first lines, which repeat the message. */
function placesOf(error: Error): string[] {
  return (error.stack ?? '')
    .split('\n')
    .filter((line) => /^\s+at /.test(line))
    .slice(0, 12)
    .map((line) => line.trim());
}
