import type { Person } from '../../setup/browser';

/** Closes a set before its time and releases the scores of everyone. */
export async function closeAndRelease(instructor: Person, setUrl: string): Promise<void> {
  const { page } = instructor;
  await page.goto(`${setUrl}/release`);
  await page.getByRole('button', { name: 'Close the set…' }).click();
  await instructor.inspect('closing');
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /^Close/ })
    .last()
    .click();
  await page.getByRole('button', { name: 'Release the scores…' }).waitFor();
  await instructor.inspect('release');
  await page.getByRole('button', { name: 'Release the scores…' }).click();
  await instructor.inspect('release dialog');
  await page.getByRole('dialog').getByRole('button', { name: 'Release now' }).click();
  await page.getByRole('button', { name: 'Release the scores…' }).waitFor({ state: 'detached', timeout: 60_000 });
}

/** Looks at the deliveries of a set until all have been handed over. */
export async function watchDeliveries(instructor: Person, setUrl: string, count: number): Promise<void> {
  const { page } = instructor;
  await page.goto(`${setUrl}/deliveries`);
  await page.getByText(`${count} sent`, { exact: true }).waitFor({ timeout: 90_000 });
  await instructor.inspect('deliveries');
}
