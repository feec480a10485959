import type { Page } from 'playwright-core';
import type { Person } from '../../setup/browser';

/** The question that the journey's instructor writes. */
export const question = {
  title: 'A spin and its energies',
  prompt: 'A spin $\\tfrac12$ has $H = {{n}}\\,\\Omega\\,{{A}}$ with $\\Omega > 0$. Let $B = S_x + S_y + S_z$.',
} as const;

/** Writes the question through the editor, looks at three draws and publishes version 1; ends on its page. */
export async function writeQuestion(instructor: Person, url: string): Promise<void> {
  const { page } = instructor;
  await page.goto(`${url}/templates/new`, { waitUntil: 'networkidle' });
  await instructor.inspect('new question');
  await page.getByLabel('Title').fill(question.title);
  await page.getByRole('button', { name: 'Begin writing' }).click();
  await page.waitForURL(/templates\/[0-9a-f-]{36}/);
  await page.waitForLoadState('networkidle');

  await page.getByLabel('Prompt').fill(question.prompt);
  await page.getByRole('button', { name: 'Add a whole number' }).click();
  const number = page.getByRole('group', { name: /^Drawn value/ }).nth(0);
  await number.getByLabel('Name').fill('n');
  await number.getByLabel('From').fill('2');
  await number.getByLabel('To').fill('6');
  await page.getByRole('button', { name: 'Add a choice' }).click();
  const choice = page.getByRole('group', { name: /^Drawn value/ }).nth(1);
  await choice.getByLabel('Name').fill('A');
  await choice.getByLabel('One of').fill('S_x\nS_y\nS_z');
  await page.getByRole('button', { name: 'Add a symbol' }).click();
  const symbol = page.getByRole('group', { name: /^Symbol/ });
  await symbol.getByLabel('Name').fill('Omega');
  await symbol.getByLabel('Is').selectOption({ label: 'positive' });

  await writePart(
    page,
    'a',
    'Work out $[{{n}} A, B]$ for $A = {{A}}$.',
    'Operator',
    'commutator(n*A, S_x + S_y + S_z)',
  );
  await page.getByRole('button', { name: 'Add part b' }).click();
  await writePart(page, 'b', 'Find the energies.', 'Eigenvalues', 'eigenvalues(n*Omega*A)');
  await page.getByRole('button', { name: 'Add part c' }).click();
  await writePart(page, 'c', 'Find the expectation value of $H^2$.', 'Scalar', 'expectation((n*Omega*A)^2, |+>)');
  await creditSlip(page, 'a', 'commutator-order');

  await page.getByText('Saved', { exact: true }).waitFor();
  await page.getByRole('region', { name: 'Draw 3' }).getByText('Reference').first().waitFor();
  await instructor.inspect('template editor');
  await page.getByRole('button', { name: 'Publish version 1…' }).click();
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /^Publish/ })
    .click();
  await page.getByRole('region', { name: 'Versions' }).getByText('Version 1').first().waitFor();
}

async function writePart(page: Page, key: string, asked: string, kind: string, reference: string): Promise<void> {
  const part = page.getByRole('group', { name: `Part ${key}`, exact: true });
  await part.getByLabel('What is asked').fill(asked);
  await part.getByLabel('Kind of answer').selectOption({ label: kind });
  await part.getByLabel('Reference').fill(reference);
}

async function creditSlip(page: Page, key: string, slip: string): Promise<void> {
  const part = page.getByRole('group', { name: `Part ${key}`, exact: true });
  await part.getByText(/^Part credit/).click();
  await part.getByRole('button', { name: 'Credit a slip' }).click();
  await part.getByLabel('Slip', { exact: true }).selectOption(slip);
}

/** Makes a set of two questions and opens it at once; gives its address, on whose page the instructor stands. */
export async function openSet(instructor: Person, title: string): Promise<string> {
  const { page } = instructor;
  await page.getByRole('link', { name: 'Courses', exact: true }).first().click();
  await page.getByRole('link', { name: 'PHY 342' }).click();
  await page.getByRole('link', { name: 'New problem set' }).waitFor();
  await instructor.inspect('course');
  await page.getByRole('link', { name: 'New problem set' }).click();
  await page.getByLabel('Title').fill(title);
  await instructor.inspect('new set');
  await page.getByRole('button', { name: 'Make a draft' }).click();
  await page.waitForURL(/sets\/[0-9a-f-]{36}/);

  for (const [name, points] of [
    [question.title, '12'],
    ['Precession about z', '8'],
  ] as const) {
    await page.getByLabel('Question', { exact: true }).selectOption({ label: await optionBeginning(page, name) });
    await page.getByRole('region', { name: 'Add a question' }).getByLabel('Points').fill(points);
    await page.getByRole('button', { name: 'Add the question' }).click();
    await page.getByRole('main').getByRole('link', { name }).waitFor();
  }
  await page.getByLabel('Closes').fill(inDays(2));
  await page.getByLabel('Appeals until').fill(inDays(9));
  await page.getByLabel('Second marking').fill('100');
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByRole('button', { name: 'Open now…' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Open it now' }).click();
  await page.getByRole('button', { name: 'Close now…' }).waitFor();
  await instructor.inspect('open set');
  return page.url();
}

async function optionBeginning(page: Page, name: string): Promise<string> {
  const labels = await page.getByLabel('Question', { exact: true }).locator('option').allTextContents();
  return labels.find((label) => label.startsWith(name)) ?? name;
}

/** Noon some days from now, as a date-and-time field takes it. */
function inDays(days: number): string {
  return `${new Date(Date.now() + days * 86_400_000).toISOString().slice(0, 10)}T12:00`;
}
