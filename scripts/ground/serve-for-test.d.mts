/** What the programs of one running Halfmark are told (service-list.mjs says more). */
export type ServiceFacts = {
  baseEnv: Record<string, string | undefined>;
  host: string;
  port: number;
  appUrl: string;
  databaseUrl: string;
  sessionSecret: string;
  smtpUrl: string;
  sink: { smtp: number; mailPage: number };
  mailFolder: string;
  uploadsFolder: string;
  logFolder: string;
};

export function seedFingerprint(): string;

export function planForTest(folder: string): Promise<Omit<ServiceFacts, 'databaseUrl'>>;

export function serveForTest(
  facts: ServiceFacts,
  workerCount: number,
): Promise<{
  startWorker(): Promise<void>;
  killWorkers(signal?: NodeJS.Signals): Promise<void>;
  stop(): Promise<void>;
}>;
