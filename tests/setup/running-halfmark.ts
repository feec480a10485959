import { cpSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { planForTest, serveForTest } from '@/scripts/ground/serve-for-test.mjs';
import { createEmptyDatabase, createTestDatabase, dropTestDatabase } from './test-database';
import { createSeededDatabase } from './seeded-database';

/** A mail as the sink keeps it. */
export type KeptMail = {
  id: string;
  receivedAt: string;
  messageId: string | null;
  from: string;
  to: string[];
  subject: string;
};

/** The whole application, as a person meets it: web server, workers and mail sink on loopback, own database and files. */
export type RunningHalfmark = {
  /** Address of the pages, without a slash at the end. */
  url: string;
  /** Address of the sink's pages. */
  mailUrl: string;
  databaseUrl: string;
  /** The secret that signs links and sessions. */
  sessionSecret: string;
  uploadsFolder: string;
  logFolder: string;
  /** Mails to an address (all where left out), newest first. */
  mails(to?: string): Promise<KeptMail[]>;
  /** The texts of one mail. */
  readMail(id: string): Promise<KeptMail & { text: string; html: string }>;
  /** Waits for a mail to an address whose subject holds a text. */
  waitForMail(to: string, subjectPart: string, milliseconds?: number): Promise<KeptMail>;
  /** Ends every worker at once, as a power cut would; none is started again by itself. */
  killWorkers(signal?: NodeJS.Signals): Promise<void>;
  startWorker(): Promise<void>;
  /** Ends everything and deletes database and files. */
  stop(): Promise<void>;
};

/**
 * Starts the built application against a database of its own.
 *
 * @param options `data`: the demo, an empty but migrated database, or nothing at all; `workers`: how many worker processes
 */
export async function startHalfmark({
  data = 'demo',
  workers = 1,
}: { data?: 'demo' | 'migrated' | 'nothing'; workers?: number } = {}): Promise<RunningHalfmark> {
  const folder = mkdtempSync(path.join(process.env.HALFMARK_TEST_FOLDER ?? os.tmpdir(), 'halfmark-running-'));
  const plan = await planForTest(folder);
  const databaseUrl = await makeDatabase(data, plan.uploadsFolder);
  const facts = { ...plan, databaseUrl };
  const clear = async () => {
    await dropTestDatabase(databaseUrl);
    rmSync(folder, { recursive: true, force: true });
  };
  const services = await serveForTest(facts, workers).catch(async (error: unknown) => {
    await clear();
    throw error;
  });
  const mailUrl = `http://127.0.0.1:${facts.sink.mailPage}`;

  const mails = async (to?: string) => {
    const query = to === undefined ? '' : `?${new URLSearchParams({ to }).toString()}`;
    const list = (await (await fetch(`${mailUrl}/mails.json${query}`)).json()) as { mails: KeptMail[] };
    return list.mails;
  };
  return {
    url: facts.appUrl,
    mailUrl,
    databaseUrl,
    sessionSecret: facts.sessionSecret,
    uploadsFolder: facts.uploadsFolder,
    logFolder: facts.logFolder,
    mails,
    async readMail(id) {
      return (await (await fetch(`${mailUrl}/mails/${id}.json`)).json()) as KeptMail & { text: string; html: string };
    },
    async waitForMail(to, subjectPart, milliseconds = 30_000) {
      const end = performance.now() + milliseconds;
      for (;;) {
        const found = (await mails(to)).find(({ subject }) => subject.includes(subjectPart));
        if (found) return found;
        if (performance.now() > end) throw new Error(`No mail to ${to} with "${subjectPart}" in ${milliseconds} ms.`);
        await new Promise((resolve) => setTimeout(resolve, 100));
      }
    },
    killWorkers: (signal) => services.killWorkers(signal),
    startWorker: () => services.startWorker(),
    async stop() {
      await services.stop();
      await clear();
    },
  };
}

async function makeDatabase(data: 'demo' | 'migrated' | 'nothing', uploadsFolder: string): Promise<string> {
  if (data === 'nothing') return createEmptyDatabase();
  if (data === 'migrated') return createTestDatabase();
  const { url, uploads } = await createSeededDatabase();
  mkdirSync(uploadsFolder, { recursive: true });
  cpSync(uploads, uploadsFolder, { recursive: true });
  return url;
}
