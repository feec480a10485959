import AxeBuilder from '@axe-core/playwright';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

/** One person at a browser of their own, whose every page is watched. */
export type Person = {
  page: Page;
  /** What went wrong on any page so far: console errors, script errors, requests to another host. */
  complaints(): string[];
  /** Checks the present page for accessibility in both themes; what axe finds joins the complaints. */
  inspect(place: string): Promise<void>;
  leave(): Promise<void>;
};

/** Rules of WCAG 2.2 AA and what comes with them. */
const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Starts the browser that npm test provides. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.HALFMARK_CHROMIUM ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking', '--disable-component-update'],
  });
}

/**
 * Opens a browser profile of its own, as another person at another machine.
 *
 * @param origin the only host that a page may speak to
 */
export async function personAt(browser: Browser, origin: string): Promise<Person> {
  const context = await browser.newContext({ viewport: { width: 1280, height: 900 }, locale: 'en-GB' });
  context.setDefaultTimeout(20_000);
  const found: string[] = [];
  watch(context, origin, found);
  const page = await context.newPage();
  return {
    page,
    complaints: () => [...found],
    async inspect(place) {
      for (const colorScheme of ['light', 'dark'] as const) {
        await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
        const { violations } = await new AxeBuilder({ page }).withTags(rules).analyze();
        for (const { id, nodes } of violations) {
          found.push(`${place} (${colorScheme}): ${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`);
        }
      }
      await page.emulateMedia({ colorScheme: 'light' });
    },
    leave: () => context.close(),
  };
}

function watch(context: BrowserContext, origin: string, found: string[]): void {
  context.on('console', (message) => {
    if (message.type() === 'error') found.push(`console on ${message.page()?.url() ?? '?'}: ${message.text()}`);
  });
  context.on('weberror', (error) => found.push(`script error: ${error.error().message}`));
  context.on('request', (request) => {
    const url = request.url();
    if (/^https?:/.test(url) && new URL(url).origin !== origin) found.push(`request to another host: ${url}`);
  });
}

/** Signs in by the form, and waits for the first page. */
export async function signIn({ page }: Person, url: string, email: string, password: string): Promise<void> {
  await page.goto(`${url}/sign-in`, { waitUntil: 'networkidle' });
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((address) => !address.pathname.startsWith('/sign-in'));
}
