import { AsyncLocalStorage } from 'node:async_hooks';
import pino, { type Logger } from 'pino';
import { logLevels } from './env';
import { scrub } from './log-scrub';

/** What every line within a request or a job carries, such as `requestId` or `jobId`. */
export type LogContext = Readonly<Record<string, string | number>>;

const contexts = new AsyncLocalStorage<LogContext>();

/** Runs a function whose log lines, and those of everything it awaits, carry the context beside an outer one's. */
export function withLogContext<T>(context: LogContext, run: () => T): T {
  return contexts.run({ ...contexts.getStore(), ...context }, run);
}

/** The id of the request being served, where there is one: shown to a person beside an unexpected failure. */
export function currentRequestId(): string | null {
  const id = contexts.getStore()?.['requestId'];
  return typeof id === 'string' ? id : null;
}

/**
 * A logger that writes one JSON object a line. Fields named for answers, passwords, tokens and the like never show
 * their value (lib/log-scrub.ts).
 *
 * @param write takes each line; standard output unless given
 */
export function buildLogger(level: string, write?: (line: string) => void): Logger {
  const options = {
    level: (logLevels as readonly string[]).includes(level) ? level : 'info',
    base: { pid: process.pid },
    timestamp: pino.stdTimeFunctions.isoTime,
    mixin: () => ({ ...contexts.getStore() }),
    formatters: {
      level: (label: string) => ({ level: label }),
      log: (fields: Record<string, unknown>) => scrub(fields) as Record<string, unknown>,
    },
    serializers: { err: (error: unknown) => scrub(error) },
  };
  return write ? pino(options, { write }) : pino(options);
}

/** The logger of this process. */
export const log = buildLogger(process.env['LOG_LEVEL'] ?? 'info');
