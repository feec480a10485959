/**
 * The whole job in a real browser, against the production build with its worker, database and mail sink: one question,
 * one set, four people, from the template to a corrected score report. Each test goes on where the one before ended.
 */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Browser } from 'playwright-core';
import accounts from '@/seeders/demo-accounts.json' with { type: 'json' };
import { launchBrowser, personAt, signIn, type Person } from '../setup/browser';
import { startHalfmark, type RunningHalfmark } from '../setup/running-halfmark';
import { openSet, writeQuestion } from './steps/instructor';
import { answerQuestion, type OwnDraw } from './steps/student';

const title = 'Spins in a steady field';

let halfmark: RunningHalfmark;
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
  halfmark = await startHalfmark();
  browser = await launchBrowser();
});

afterAll(async () => {
  await browser?.close();
  await halfmark?.stop();
});

describe('from template to corrected report', { timeout: 120_000 }, () => {
  let draw: OwnDraw;

  it('an instructor writes a question, proves it on three draws, publishes and sets it', async () => {
    const instructor = await at('Maren Tollgate');
    await writeQuestion(instructor, halfmark.url);
    await openSet(instructor, title);
  });

  it('a student answers their own draw, with live reading, a receipt and a second attempt', async () => {
    draw = await answerQuestion(await at('Noor Applewick'), { url: halfmark.url, name: new RegExp(title) });
    expect(draw.n).toBeGreaterThan(1);
  });

  it('no page had a fault: no violation, no console error, no request to another host', () => {
    expect([...people].flatMap(([name, person]) => person.complaints().map((line) => `${name}: ${line}`))).toEqual([]);
  });
});
