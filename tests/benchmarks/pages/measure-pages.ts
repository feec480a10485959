import pg from 'pg';
import type { Browser, Page } from 'playwright-core';
import accounts from '@/seeders/demo-accounts.json' with { type: 'json' };
import { launchBrowser, personAt, signIn } from '../../setup/browser';
import { startHalfmark, type RunningHalfmark } from '../../setup/running-halfmark';
import { pagesOf, type MeasuredPage } from './page-list';

/** What was measured of one page: medians of its visits, times in milliseconds, sizes in kilobytes as they were sent. */
export type PageFigures = { page: string; usable: number; server: number; script: number; mathematics: string };

const visits = 5;

/** Starts Halfmark with the demo, opens every page of the list `visits` times, and stops it again. */
export async function measurePages(): Promise<PageFigures[]> {
  const halfmark = await startHalfmark({ workers: 1 });
  const browser = await launchBrowser();
  try {
    const list = await listOf(halfmark.databaseUrl);
    const cookies = new Map<string, Cookies>();
    const figures: PageFigures[] = [];
    for (const entry of list) {
      const own = cookies.get(entry.as) ?? (await cookiesOf(browser, halfmark, entry.as));
      cookies.set(entry.as, own);
      figures.push(await measure(browser, halfmark.url, entry, own));
    }
    return figures;
  } finally {
    await browser.close();
    await halfmark.stop();
  }
}

type Cookies = Awaited<ReturnType<ReturnType<Page['context']>['cookies']>>;

async function listOf(databaseUrl: string): Promise<MeasuredPage[]> {
  const client = new pg.Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    return await pagesOf(async (sql) => {
      const { rows } = await client.query<{ id: string }>(sql);
      const id = rows[0]?.id;
      if (id === undefined) throw new Error(`The demo has nothing for: ${sql}`);
      return id;
    });
  } finally {
    await client.end();
  }
}

async function cookiesOf(browser: Browser, halfmark: RunningHalfmark, role: string): Promise<Cookies> {
  if (role === 'nobody') return [];
  const account = accounts.accounts.find((each) => each.role === role);
  if (!account) throw new Error(`The demo has no ${role}.`);
  const person = await personAt(browser, halfmark.url);
  await signIn(person, halfmark.url, account.email, accounts.password);
  const cookies = await person.page.context().cookies();
  await person.leave();
  return cookies;
}

async function measure(browser: Browser, url: string, entry: MeasuredPage, cookies: Cookies): Promise<PageFigures> {
  const seen = [];
  for (let visit = 0; visit <= visits; visit += 1) {
    const context = await browser.newContext({ viewport: { width: 1280, height: 900 } });
    await context.addCookies(cookies);
    const page = await context.newPage();
    await page.goto(url + entry.path, { waitUntil: 'commit' });
    const figures = await page
      .waitForFunction(usableAt, entry.control, { polling: 'raf', timeout: 10_000 })
      .catch((error: unknown) => {
        throw new Error(`${entry.name} (${page.url()}) has no usable "${entry.control}".`, { cause: error });
      });
    seen.push(await figures.jsonValue());
    await context.close();
  }
  // The first visit after the start also loads the server's own code for the page.
  const counted = seen.slice(1).filter((each) => each !== null);
  return {
    page: entry.name,
    usable: median(counted.map(({ usable }) => usable)),
    server: median(counted.map(({ server }) => server)),
    script: median(counted.map(({ script }) => script)),
    mathematics: counted.some(({ mathematics }) => mathematics) ? 'yes' : '–',
  };
}

/** Runs in the page: null until the control is seen, enabled and, where it is no plain link, listened to by React. */
function usableAt(selector: string) {
  const control = document.querySelector(selector);
  if (!(control instanceof HTMLElement) || control.offsetParent === null || control.matches(':disabled')) return null;
  const isListenedTo = Object.keys(control).some((key) => key.startsWith('__reactProps'));
  if (!isListenedTo && control.tagName !== 'A') return null;
  const resources = performance.getEntriesByType('resource') as PerformanceResourceTiming[];
  const [navigation] = performance.getEntriesByType('navigation') as PerformanceNavigationTiming[];
  const scripts = resources.filter(({ name }) => /\.js(\?|$)/.test(name));
  return {
    usable: Math.round(performance.now()),
    server: Math.round((navigation?.responseStart ?? 0) - (navigation?.requestStart ?? 0)),
    script: Math.round(scripts.reduce((sum, { encodedBodySize }) => sum + encodedBodySize, 0) / 100) / 10,
    mathematics: resources.some(({ name }) => /KaTeX/i.test(name)) || document.querySelector('.katex') !== null,
  };
}

function median(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;
}
