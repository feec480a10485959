/**
 * The whole job in a real browser, against the production build with its worker, database and mail sink: one question,
 * one set, four people, from the template to a corrected score report. Each test goes on where the one before ended.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Browser } from 'playwright-core';
import accounts from '@/seeders/demo-accounts.json' with { type: 'json' };
import { launchBrowser, personAt, signIn, type Person } from '../setup/browser';
import { startHalfmark, type RunningHalfmark } from '../setup/running-halfmark';
import { openSet, writeQuestion } from './steps/instructor';
import {
  answerAppeal,
  markSecondly,
  outcomeHeaders,
  settleAll,
  takeInSheet,
  uploadDirectly,
  workQueue,
} from './steps/graders';
import { closeAndRelease, watchDeliveries } from './steps/release';
import { answerQuestion, appealEnergies } from './steps/student';

const title = 'Spins in a steady field';
const setName = new RegExp(title);
const noor = 'noor.applewick@wrenfield.example';

let halfmark: RunningHalfmark;
let folder: string;
let browser: Browser;
const people = new Map<string, Person>();

/** The person of a name, at a browser of their own that is signed in once. */
async function at(name: string): Promise<Person> {
  const found = people.get(name);
  if (found) return found;
  const account = accounts.accounts.find((each) => each.name === name);
  if (!account) throw new Error(`The demo has no ${name}.`);
  const person = await personAt(browser, halfmark.url);
  people.set(name, person);
  await signIn(person, halfmark.url, account.email, accounts.password);
  return person;
}

beforeAll(async () => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-journey-'));
  halfmark = await startHalfmark();
  browser = await launchBrowser();
});

afterAll(async () => {
  await browser?.close();
  await halfmark?.stop();
  rmSync(folder, { recursive: true, force: true });
});

describe('from template to corrected report', { timeout: 240_000 }, () => {
  let setUrl: string;

  it('an instructor writes a question, proves it on three draws, publishes and sets it', async () => {
    const instructor = await at('Maren Tollgate');
    await writeQuestion(instructor, halfmark.url);
    setUrl = await openSet(instructor, title);
  });

  it('a student answers their own draw, with live reading, a receipt and a second attempt', async () => {
    const draw = await answerQuestion(await at('Noor Applewick'), { url: halfmark.url, name: setName });
    expect(draw.n).toBeGreaterThan(1);
  });

  it('a TA takes in a sheet of answers, and reads in the outcome sheet what became of every row', async () => {
    const { outcome, good } = await takeInSheet(await at('Priya Lanternby'), { setUrl, folder });
    expect(good).toBe(24);
    expect(outcome).toHaveLength(good + 2);
    expect(outcome.filter((line) => line.includes(',taken in,'))).toHaveLength(good);
    expect(outcome.filter((line) => line.includes(',refused,'))).toHaveLength(2);
    expect(outcome.filter((line) => line.includes('waiting'))).toEqual([]);
  });

  it('a sheet that is too large or no sheet is refused with a plain sentence, and sheets leave as attachments', async () => {
    const grader = await at('Priya Lanternby');
    const buffer = Buffer.alloc(26 * 1024 * 1024, 'x,1,a,2\n');
    const large = await uploadDirectly(grader, setUrl, { name: 'large.csv', mimeType: 'text/csv', buffer });
    expect(large).toMatchObject({ status: 413, type: 'application/problem+json' });
    expect(large.said).toContain('The file is larger than 25 MB.');
    const pdf = Buffer.from('%PDF-1.7\n1 0 obj\n<< /Type /Catalog >>\nendobj\n');
    const wrong = await uploadDirectly(grader, setUrl, { name: 'answers.csv', mimeType: 'text/csv', buffer: pdf });
    expect(wrong.status).toBe(415);
    expect(wrong.said).toContain('This is a PDF file, whatever its name says.');
    expect(await outcomeHeaders(grader, setUrl)).toMatchObject({
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': expect.stringMatching(/^attachment; filename="/) as string,
      'x-content-type-options': 'nosniff',
    });
  });

  it('the TA works the queue by keyboard, and other graders mark a second time without seeing the first mark', async () => {
    const ruled = await workQueue(await at('Priya Lanternby'), setUrl);
    expect(ruled).toBeGreaterThanOrEqual(20);
    let marked = 0;
    for (const name of ['Oskar Millrace', 'Hana Stonecrop', 'Luca Weatherlea', 'Jonas Ferrywell']) {
      marked += await markSecondly(await at(name), setUrl, name === 'Oskar Millrace');
    }
    expect(marked).toBe(ruled);
  });

  it('the head TA settles where two differ, and sees how consistent the marking was', async () => {
    const headTa = await at('Jonas Ferrywell');
    expect(await settleAll(headTa, setUrl)).toBe(1);
    const { page } = headTa;
    await page.goto(`${setUrl}/consistency`);
    await page.getByRole('region', { name: 'Agreement in a picture' }).getByRole('img').waitFor();
    const pairs = page.getByRole('region', { name: 'Graders in pairs', exact: true });
    expect(await pairs.getByRole('row').filter({ hasText: 'Priya Lanternby' }).count()).toBe(4);
    await headTa.inspect('consistency');
  });

  it('the instructor closes and releases, and every student gets one mail', async () => {
    const instructor = await at('Maren Tollgate');
    await closeAndRelease(instructor, setUrl);
    const mail = await halfmark.waitForMail(noor, title, 60_000);
    expect(mail.subject).toMatch(/^Score report/);
    const { text, html } = await halfmark.readMail(mail.id);
    expect(text).toContain('Question 1');
    expect(html).not.toMatch(/<img|<script|src=/);
    await watchDeliveries(instructor, setUrl, 60);
    const all = (await halfmark.mails()).filter(({ subject }) => subject.includes(title));
    expect(all).toHaveLength(60);
    expect(new Set(all.map(({ messageId }) => messageId)).size).toBe(60);
  });

  it('the student appeals, another grader answers, and a corrected report says what changed', async () => {
    await appealEnergies(await at('Noor Applewick'), { url: halfmark.url, name: setName });
    await answerAppeal(await at('Oskar Millrace'), setUrl, '3');
    const corrected = await halfmark.waitForMail(noor, 'Corrected', 60_000);
    const { text } = await halfmark.readMail(corrected.id);
    expect(text).toMatch(/Question 1, part b: 3 marks, before [12] marks?/);
    const { page } = await at('Noor Applewick');
    await page.reload();
    await page.getByText('half of it stands').first().waitFor();
    await (await at('Noor Applewick')).inspect('corrected report');
  });

  it('no page had a fault: no violation, no console error, no request to another host', () => {
    expect([...people].flatMap(([name, person]) => person.complaints().map((line) => `${name}: ${line}`))).toEqual([]);
  });
});
