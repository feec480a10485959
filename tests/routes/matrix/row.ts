import { type ServiceContext } from '@/lib/services/context';
import { type Scene } from './scene';

/** Who comes, in the order of a row's columns. A stranger is the instructor of another course and department. */
export const callers = ['signedOut', 'student', 'ta', 'headTa', 'instructor', 'administrator', 'stranger'] as const;

export type Caller = (typeof callers)[number];

/**
 * What becomes of it:
 * - `allow`: let through (what is asked may still be wrong in itself: invalid, in the wrong state);
 * - `refuse`: known, but not to be done or seen in this role (403);
 * - `hide`: for this caller it is not there (404);
 * - `sign-in`: sent to sign in, or 401 where there is no page to send to;
 * - `elsewhere`: led to another page of theirs.
 */
export type Outcome = 'allow' | 'refuse' | 'hide' | 'sign-in' | 'elsewhere';

/** One outcome a caller: signed out, student, TA, head TA, instructor, administrator, stranger. */
export type Expectation = readonly [Outcome, Outcome, Outcome, Outcome, Outcome, Outcome, Outcome];

/** The outcome that a row expects for a caller. */
export function expected(expect: Expectation, caller: Caller): Outcome {
  const outcome = expect[callers.indexOf(caller)];
  if (outcome === undefined) throw new Error('A row has an outcome for every caller.');
  return outcome;
}

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** A page, as `app/<file>`, at the address that the scene gives it. */
export type PageRow = { kind: 'page'; file: string; path: (scene: Scene) => string; expect: Expectation };

/** One method of a route handler. `body` is sent as JSON; a string is sent as it is. */
export type RouteRow = {
  kind: 'route';
  file: string;
  method: Method;
  path: (scene: Scene) => string;
  body?: (scene: Scene) => unknown;
  expect: Expectation;
};

/**
 * A server action. It is tried through the services it calls, named in `services`, in a transaction that is taken back:
 * the action itself adds the session, which is tried over HTTP for every action alike. The first column is `sign-in`.
 */
export type ActionRow = {
  kind: 'action';
  file: string;
  action: string;
  services: readonly string[];
  run: (context: ServiceContext, scene: Scene) => Promise<unknown>;
  expect: Expectation;
};

/** A page, method or action that is open to everybody on purpose, and why. `path` is needed for a page or route. */
export type OpenRow = {
  kind: 'open';
  file: string;
  /** Which method, or which action; left out for a page. */
  name?: string;
  path?: (scene: Scene) => string;
  why: string;
};

export type Row = PageRow | RouteRow | ActionRow | OpenRow;

/** What names a row among all: the file, and the method or action in it. */
export function rowKey(row: Row): string {
  switch (row.kind) {
    case 'page':
      return row.file;
    case 'route':
      return `${row.file}#${row.method}`;
    case 'action':
      return `${row.file}#${row.action}`;
    case 'open':
      return row.name === undefined ? row.file : `${row.file}#${row.name}`;
  }
}
