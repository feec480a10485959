import { readFileSync, writeFileSync } from 'node:fs';
import type { Download, Page } from 'playwright-core';
import type { Person } from '../../setup/browser';

/** Answers as a section hands them in on paper: some wrong, some that nothing can read. */
const written = ['i hbar S_z', '2 hbar Omega, -2 hbar Omega', 'hbar (', 'sigma_x + sigma_y'] as const;

/**
 * Takes in a sheet made from the set's own: two parts of the first twelve students, a row of a stranger and one of a
 * question that is not in the set.
 *
 * @returns the outcome sheet, line by line, and how many rows were good
 */
export async function takeInSheet(
  grader: Person,
  { setUrl, folder }: { setUrl: string; folder: string },
): Promise<{ outcome: string[]; good: number }> {
  const { page } = grader;
  await page.goto(setUrl);
  await page.getByRole('navigation', { name: 'Pages' }).getByRole('link', { name: 'Intake' }).click();
  await page.getByRole('heading', { name: 'Answers in bulk' }).waitFor();
  await grader.inspect('intake');
  const blank = await textOf(await downloadBy(page, /roster filled in/));
  const [header = '', ...rows] = blank.trim().split('\r\n');
  const good = rows.filter((row) => /,1,[ab],$/.test(row)).slice(0, 24);
  const sheet = [
    header,
    ...good.map((row, index) => `${row}"${written[index % written.length]}"`),
    'nobody@elsewhere.example,1,a,3',
    `${(good[0] ?? '').replace(/,1,a,$/, ',9,a,')}3`,
  ];
  const file = `${folder}/section.csv`;
  writeFileSync(file, sheet.join('\r\n'));

  await page.getByLabel('Answer sheet').setInputFiles(file);
  await page.getByRole('button', { name: 'Upload and look at it' }).click();
  await page.getByRole('button', { name: /^Take in the 24 rows/ }).waitFor();
  await page.getByText('No student of this course has the address nobody@elsewhere.example.').waitFor();
  await grader.inspect('intake preview');
  await page.getByRole('button', { name: /^Take in the 24 rows/ }).click();
  await page.getByRole('banner').getByText('done', { exact: true }).waitFor({ timeout: 60_000 });
  await grader.inspect('intake outcome');
  const outcome = await textOf(await downloadBy(page, /outcome sheet/));
  return { outcome: outcome.trim().split('\r\n').slice(1), good: good.length };
}

/**
 * Sends a file to a set as a program would that does not heed the page: with the grader's own session, from our own site.
 *
 * @returns the status and what the answer says
 */
export async function uploadDirectly(
  grader: Person,
  setUrl: string,
  file: { name: string; mimeType: string; buffer: Buffer },
): Promise<{ status: number; type: string; said: string }> {
  const { origin, pathname } = new URL(setUrl);
  const response = await grader.page.request.post(`${origin}/api/intakes?set=${pathname.split('/').at(-1)}`, {
    headers: { origin },
    multipart: { file },
  });
  return { status: response.status(), type: response.headers()['content-type'] ?? '', said: await response.text() };
}

/** The headers under which the outcome sheet of the newest upload of a set is sent. */
export async function outcomeHeaders(grader: Person, setUrl: string): Promise<Record<string, string>> {
  const { page } = grader;
  await page.goto(`${setUrl}/intake`);
  await page.getByRole('link', { name: 'section.csv' }).first().click();
  const href = await page.getByRole('link', { name: 'Download the outcome sheet' }).getAttribute('href');
  const response = await page.request.get(new URL(href ?? '', setUrl).toString());
  return response.headers();
}

async function downloadBy(page: Page, link: RegExp): Promise<Download> {
  const [download] = await Promise.all([page.waitForEvent('download'), page.getByRole('link', { name: link }).click()]);
  return download;
}

async function textOf(download: Download): Promise<string> {
  return readFileSync(await download.path(), 'utf8').replace(/^\uFEFF/, '');
}

/** Works the whole queue of a set by keyboard alone: nothing for what cannot be read, one mark for the rest. */
export async function workQueue(grader: Person, setUrl: string): Promise<number> {
  const { page } = grader;
  await page.goto(`${setUrl}/queue`);
  await page.getByRole('heading', { name: 'Review queue' }).waitFor();
  await grader.inspect('queue');
  await page.getByRole('button', { name: 'Take the next' }).focus();
  await page.keyboard.press('Enter');
  let ruled = 0;
  for (;;) {
    await page.waitForURL(/\/desk\/|done=1/);
    if (page.url().includes('done=1')) return ruled;
    await page.getByRole('group', { name: 'Review desk' }).waitFor();
    if (ruled === 0) await grader.inspect('review desk');
    const here = page.url();
    await page.keyboard.press((await isUnreadable(page)) ? '0' : '1');
    if (ruled % 5 === 0) {
      await page.keyboard.press('c');
      await page.keyboard.type('Compare your form with the draw.');
      await page.keyboard.press('Escape');
    }
    await page.keyboard.press('Enter');
    await page.waitForURL((address) => address.toString() !== here);
    ruled += 1;
  }
}

/** Does every second marking that is assigned, blind; the first that can be read more generously than the first marker. */
export async function markSecondly(grader: Person, setUrl: string, generous: boolean): Promise<number> {
  const { page } = grader;
  await page.goto(`${setUrl}/queue`);
  await page.getByRole('heading', { name: 'Review queue' }).waitFor();
  const list = page.getByRole('region', { name: 'To mark a second time' });
  if ((await list.count()) === 0) return 0;
  await list.getByRole('link').first().click();
  await page.waitForURL(/\/desk\/second\//);
  let marked = 0;
  let mayBeGenerous = generous;
  for (;;) {
    await page.waitForURL(/\/desk\/second\/|\/queue$/);
    if (!page.url().includes('/second/')) return marked;
    await page.getByRole('group', { name: 'Second marking' }).waitFor();
    if (marked === 0) await grader.inspect('second marking');
    const here = page.url();
    const unreadable = await isUnreadable(page);
    await page.keyboard.press(unreadable ? '0' : mayBeGenerous ? '3' : '1');
    mayBeGenerous &&= unreadable;
    await page.keyboard.press('Enter');
    await page.waitForURL((address) => address.toString() !== here);
    marked += 1;
  }
}

async function isUnreadable(page: Page): Promise<boolean> {
  return (await page.getByRole('main').getByText('Unreadable', { exact: true }).count()) > 0;
}

/** Settles every disagreement of a set at two marks. */
export async function settleAll(settler: Person, setUrl: string): Promise<number> {
  const { page } = settler;
  for (let settled = 0; ; settled += 1) {
    await page.goto(`${setUrl}/queue`);
    await page.getByRole('heading', { name: 'Review queue' }).waitFor();
    const list = page.getByRole('region', { name: 'To settle' });
    if ((await list.count()) === 0) return settled;
    await list.getByRole('link').first().click();
    await page.getByRole('group', { name: 'Settling' }).waitFor();
    if (settled === 0) await settler.inspect('settling');
    await page.keyboard.press('2');
    await page.getByLabel(/^Reasons/).fill('The form is right, the factor is not.');
    await page.getByRole('button', { name: /^Settle/ }).click();
    await page.waitForURL(/\/queue$/);
  }
}

/** Answers the one appeal of a set with a credit and a reply. */
export async function answerAppeal(grader: Person, setUrl: string, key: string): Promise<void> {
  const { page } = grader;
  await page.goto(`${setUrl}/queue`);
  await page.getByRole('heading', { name: 'Review queue' }).waitFor();
  await page.getByRole('button', { name: 'Take the next' }).click();
  await page.getByRole('group', { name: 'Review desk' }).waitFor();
  await page.getByText('The student appeals').waitFor();
  await grader.inspect('desk of an appeal');
  await page.keyboard.press(key);
  await page.getByLabel('Reply to the student').fill('The units are right; half of it stands.');
  await page.getByRole('button', { name: /^Answer and go on/ }).click();
  await page.waitForURL(/done=1/);
}
