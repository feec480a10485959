import type { Page } from 'playwright-core';
import type { Person } from '../../setup/browser';

/** What one student was given in the journey's question. */
export type OwnDraw = { n: number; axis: 'x' | 'y' | 'z' };

/** Reads the student's own numbers off the page, from the source of its formula. */
export async function readDraw(page: Page): Promise<OwnDraw> {
  const sources = await page.locator('main annotation[encoding="application/x-tex"]').allTextContents();
  for (const source of sources) {
    const found = /H\s*=\s*(\d)\\,\\Omega\\,\s*S_\{?([xyz])/.exec(source);
    if (found) return { n: Number(found[1]), axis: found[2] as OwnDraw['axis'] };
  }
  throw new Error(`No draw on the page among: ${sources.join(' | ')}`);
}

/** n [S_k, S_x + S_y + S_z], by the cyclic rule [S_x, S_y] = iħ S_z. */
export function commutatorOf({ n, axis }: OwnDraw): string {
  const rest = { x: 'S_z - S_y', y: 'S_x - S_z', z: 'S_y - S_x' }[axis];
  return `i hbar ${n} (${rest})`;
}

/** The field of a part, by the words that announce it. */
export function answerField(page: Page, question: number, part: string) {
  return page.getByRole('textbox', { name: `Answer to question ${question}, part ${part}` });
}

export function partOf(page: Page, question: number, part: string) {
  return page.getByRole('region', { name: `Question ${question}, part ${part}`, exact: true });
}

/** What the student hands in: a slip in a, a wrong answer in b, and c right in a form of its own. */
export const wrongEnergies = ({ n }: OwnDraw) => `± ${n} ħ Ω`;

/** Answers the journey's question: live reading, an unreadable line, a receipt, and a second attempt at part a. */
export async function answerQuestion(student: Person, set: { url: string; name: RegExp }): Promise<OwnDraw> {
  const { page } = student;
  await page.goto(`${set.url}/work`);
  await student.inspect('my work');
  await page.getByRole('link', { name: set.name }).first().click();
  await answerField(page, 1, 'a').waitFor();
  const draw = await readDraw(page);

  await answerField(page, 1, 'b').fill(`${draw.n}/2 hbar Omega, `);
  await partOf(page, 1, 'b').getByText('Something is missing after ,.').first().waitFor();
  await student.inspect('set with an unreadable answer');
  await answerField(page, 1, 'a').fill(`-(${commutatorOf(draw)})`);
  await partOf(page, 1, 'a').getByText('Read as', { exact: true }).waitFor();
  await answerField(page, 1, 'b').fill(wrongEnergies(draw));
  await answerField(page, 1, 'c').fill(`(${draw.n} hbar Omega/2)^2`);
  await partOf(page, 1, 'c').getByRole('img').waitFor();
  await page.getByRole('banner').getByText(/saved/).first().waitFor();
  await page.reload();
  await answerField(page, 1, 'c').waitFor();

  await page.getByRole('button', { name: 'Submit question 1' }).click();
  await partOf(page, 1, 'a').getByText('attempt 1 of 3').waitFor();
  await partOf(page, 1, 'a')
    .getByText(/^receipt/)
    .waitFor();
  await answerField(page, 1, 'a').fill(commutatorOf(draw));
  await partOf(page, 1, 'a').getByRole('button', { name: 'Submit part a' }).click();
  await partOf(page, 1, 'a').getByText('attempt 2 of 3').waitFor();
  await student.inspect('set with receipts');
  return draw;
}

/** Reads the released report, and appeals the wrong energies. */
export async function appealEnergies(student: Person, set: { url: string; name: RegExp }): Promise<void> {
  const { page } = student;
  await page.goto(`${set.url}/work`);
  const released = page.getByRole('region', { name: set.name });
  await released.getByRole('link', { name: 'Read the score report' }).click();
  await page.getByRole('button', { name: 'Appeal this part: question 1, part b' }).waitFor();
  await student.inspect('score report');
  await page.getByRole('button', { name: 'Appeal this part: question 1, part b' }).click();
  await page
    .getByLabel('Why should it be marked otherwise?')
    .fill('The sign and the units are right; a factor is not.');
  await student.inspect('appeal');
  await page.getByRole('dialog').getByRole('button', { name: 'Appeal this part' }).click();
  await page.getByText('You get a corrected report when it is answered.').waitFor();
}
