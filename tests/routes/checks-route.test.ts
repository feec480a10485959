import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { attemptLimits, countAttempt } from '@/lib/auth/attempt-limits';
import { startSession } from '@/lib/auth/session-store';
import { type TokenScope } from '@/lib/domain/token-scopes';
import { checksAnswerSchema, LONGEST_CHECKS_BODY, MOST_CHECKS, problemSchema } from '@/lib/http-api/check-schemas';
import { closeCheckerPool } from '@/lib/jobs/checker-pool';
import { createApiToken } from '@/lib/services/create-api-token';
import { actingAs } from '../factories/context';
import { buildCourseWithPeople, type CourseWithPeople } from '../factories/people';

const jar = vi.hoisted(() => ({ session: '' }));
vi.mock('server-only', () => ({}));
vi.mock('react', async (original) => ({ ...(await original<object>()), cache: (read: unknown) => read }));
vi.mock('next/headers', () => ({
  cookies: () =>
    Promise.resolve({
      has: (name: string) => name === 'halfmark.session' && jar.session !== '',
      get: (name: string) => (name === 'halfmark.session' && jar.session !== '' ? { value: jar.session } : undefined),
    }),
}));

const { POST } = await import('@/app/api/v1/checks/route');

const site = 'http://127.0.0.1:3420';
const one = { id: 'one', kind: 'operator', reference: 'i*hbar*S_z', answer: '[S_x, S_y]' };

let people: CourseWithPeople;

beforeAll(async () => {
  vi.stubEnv('APP_URL', site);
  people = await buildCourseWithPeople();
});
beforeEach(() => {
  jar.session = '';
});
afterAll(closeCheckerPool);

async function post(body: unknown, headers: Record<string, string> = {}): Promise<Response> {
  const request = new Request(`${site}/api/v1/checks`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', ...headers },
    body: typeof body === 'string' ? body : JSON.stringify(body),
  });
  return POST(request, { params: Promise.resolve({}) });
}

async function tokenFor(scope: TokenScope): Promise<{ authorization: string; tokenId: string }> {
  const input = { courseId: people.course.id, name: 'a program', scopes: [scope], days: 1 };
  const made = await actingAs(people.headTa.user, (context) => createApiToken(context, input));
  return { authorization: `Bearer ${made.token}`, tokenId: made.tokenId };
}

async function signIn(who: 'student' | 'headTa', origin = site): Promise<Record<string, string>> {
  const user = who === 'headTa' ? people.headTa.user : people.students[0]?.user;
  jar.session = await startSession(user?.id ?? '', new Date());
  return { cookie: `halfmark.session=${jar.session}`, ...(origin ? { origin } : {}) };
}

async function refusalOf(response: Response): Promise<[status: number, code: string]> {
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  const problem = problemSchema.parse(await response.json());
  expect(problem.status).toBe(response.status);
  return [response.status, problem.code];
}

describe('checks over HTTP', () => {
  it('are made for a token that was made for it', async () => {
    const { authorization } = await tokenFor('check-answers');
    const response = await post({ checks: [one, { ...one, id: 'two', answer: 'S_z' }, 5] }, { authorization });
    expect(response.status).toBe(200);
    const { results } = checksAnswerSchema.parse(await response.json());
    expect(results).toMatchObject([
      { id: 'one', verdict: 'agrees' },
      { id: 'two', verdict: 'differs' },
      { id: null, line: 3 },
    ]);
  });

  it('are made for the staff of a course from our own pages', async () => {
    const response = await post({ checks: [one] }, await signIn('headTa'));
    expect(response.status).toBe(200);
  });

  it.each(['https://elsewhere.example', ''])('are refused to a session that comes from “%s”', async (origin) => {
    expect(await refusalOf(await post({ checks: [one] }, await signIn('headTa', origin)))).toEqual([
      403,
      'cross-origin',
    ]);
  });

  it('are refused to a student, to nobody, to a wrong token and to one made for something else', async () => {
    expect(await refusalOf(await post({ checks: [one] }, await signIn('student')))).toEqual([403, 'forbidden']);
    jar.session = '';
    expect(await refusalOf(await post({ checks: [one] }))).toEqual([401, 'signed-out']);
    const wrong = { authorization: `Bearer halfmark_${'x'.repeat(43)}` };
    expect(await refusalOf(await post({ checks: [one] }, wrong))).toEqual([401, 'signed-out']);
    const { authorization } = await tokenFor('export-marks');
    expect(await refusalOf(await post({ checks: [one] }, { authorization }))).toEqual([403, 'forbidden']);
  });

  it('are refused where the body is no JSON, empty, too many or too long', async () => {
    const { authorization } = await tokenFor('check-answers');
    const sent = async (body: unknown) => refusalOf(await post(body, { authorization }));
    expect(await sent('{"checks": [')).toEqual([422, 'invalid']);
    expect(await sent({ checks: [] })).toEqual([422, 'invalid']);
    expect(await sent({ check: one })).toEqual([422, 'invalid']);
    expect(await sent({ checks: Array.from({ length: MOST_CHECKS + 1 }, () => one) })).toEqual([413, 'too-large']);
    expect(await sent(' '.repeat(LONGEST_CHECKS_BODY + 1))).toEqual([413, 'too-large']);
  });

  it('are counted by caller, and too many are refused with the time to wait', async () => {
    const { authorization, tokenId } = await tokenFor('check-answers');
    expect(await countAttempt('checks', `token ${tokenId}`, attemptLimits.checks - 1)).toMatchObject({ allowed: true });
    expect((await post({ checks: [one] }, { authorization })).status).toBe(200);
    const refused = await post({ checks: [one] }, { authorization });
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0);
    expect(await refusalOf(refused)).toEqual([429, 'too-many']);
    const other = await tokenFor('check-answers');
    expect((await post({ checks: [one] }, { authorization: other.authorization })).status).toBe(200);
  });
});
