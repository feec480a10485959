/**
 * The table of tests/routes/permissions over HTTP, against the production build: every page and every method of a route
 * for every caller, and the session of every server action. How to add rows is said in
 * tests/routes/permission-matrix.test.ts.
 */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeDatabase, database } from '@/lib/db/connection';
import { allRows, prepareAreas } from '../routes/matrix/all-rows';
import { cookiesOf, tryOverHttp } from '../routes/matrix/over-http';
import { callers, expected, rowKey, type Caller, type OpenRow } from '../routes/matrix/row';
import { buildScene, type Scene } from '../routes/matrix/scene';
import { builtActions, callAction } from '../routes/matrix/server-actions';
import { startHalfmark, type RunningHalfmark } from '../setup/running-halfmark';

const rows = await allRows();
const walked = rows.filter((row) => row.kind === 'page' || row.kind === 'route');
const open = rows.filter((row): row is OpenRow => row.kind === 'open' && row.path !== undefined);
const openActions = new Set(rows.filter((row) => row.kind === 'open').map(rowKey));

let halfmark: RunningHalfmark;
let scene: Scene;
let cookies: Map<Caller, string>;

beforeAll(async () => {
  halfmark = await startHalfmark({ data: 'migrated', workers: 0 });
  process.env.DATABASE_URL = halfmark.databaseUrl;
  process.env.NEXTAUTH_SECRET = halfmark.sessionSecret;
  database();
  scene = await buildScene();
  await prepareAreas(scene);
  cookies = await cookiesOf(scene);
});

afterAll(async () => {
  await closeDatabase();
  await halfmark?.stop();
});

describe.each(walked.map((row) => [rowKey(row), row] as const))('%s', (_key, row) => {
  it.each(callers)('for %s', async (caller) => {
    expect(await tryOverHttp(halfmark.url, row, scene, cookies.get(caller))).toBe(expected(row.expect, caller));
  });
});

describe('what is open on purpose', () => {
  it.each(open.map((row) => [rowKey(row), row] as const))('%s lets a signed-out visitor in', async (_key, row) => {
    expect(await tryOverHttp(halfmark.url, row, scene, undefined)).toBe('allow');
  });
});

describe('every server action of the build', () => {
  const actions = builtActions(process.env.HALFMARK_DIST_DIR ?? '.next');

  it('has a row', () => {
    const known = new Set(rows.map(rowKey));
    expect(actions.length).toBeGreaterThan(10);
    expect(actions.map((action) => action.key).filter((key) => !known.has(key))).toEqual([]);
  });

  it.each(actions.filter((action) => !openActions.has(action.key)).map((action) => [action.key, action] as const))(
    '%s asks for a session, and refuses another site',
    async (_key, action) => {
      const signedOut = await callAction(halfmark.url, action, { origin: halfmark.url });
      expect(signedOut.text).toContain('"code":"signed-out"');
      const cookie = cookies.get('instructor') ?? '';
      const foreign = await callAction(halfmark.url, action, { origin: 'https://elsewhere.example', cookie });
      expect(foreign.status).toBe(403);
    },
  );

  it('answers to a session that ended as to none', async () => {
    const action = actions.find((one) => one.key.endsWith('#saveName'));
    if (action === undefined) throw new Error('There is an action to change one’s name.');
    const headers = { origin: halfmark.url, cookie: cookies.get('student') ?? '' };
    expect((await callAction(halfmark.url, action, headers)).text).toContain('"code":"invalid"');
    await database().query('delete from sessions where user_id = :userId', {
      replacements: { userId: scene.student.user.id },
    });
    expect((await callAction(halfmark.url, action, headers)).text).toContain('"code":"signed-out"');
  });
});
