import path from 'node:path';

/**
 * What the programs of a running Halfmark are told.
 *
 * @typedef {object} ServiceFacts
 * @property {Record<string, string | undefined>} baseEnv environment that they inherit
 * @property {string} host at which the web server listens
 * @property {number} port
 * @property {string} appUrl
 * @property {string} databaseUrl
 * @property {string} sessionSecret
 * @property {string} smtpUrl
 * @property {{ smtp: number, mailPage: number } | null} sink ports of the mail sink; null where real mail is sent
 * @property {string} mailFolder
 * @property {string} uploadsFolder
 * @property {string} logFolder
 */

/** @param {ServiceFacts} facts */
export function webService(facts) {
  const reachable = facts.host === '0.0.0.0' ? '127.0.0.1' : facts.host === '::' ? '::1' : facts.host;
  return {
    name: 'web server',
    command: ['node_modules/next/dist/bin/next', 'start', '--hostname', facts.host, '--port', String(facts.port)],
    env: { ...applicationEnv(facts), PORT: String(facts.port) },
    log: path.join(facts.logFolder, 'web.log'),
    healthUrl: `${httpAddress(reachable, facts.port)}/api/health`,
    patience: 10_000,
  };
}

/**
 * @param {ServiceFacts} facts
 * @param {number} number 1 for the first
 */
export function workerService(facts, number = 1) {
  const name = number === 1 ? 'worker' : `worker-${number}`;
  return {
    name,
    command: ['--import', 'tsx', 'lib/jobs/worker.ts'],
    env: applicationEnv(facts),
    log: path.join(facts.logFolder, `${name}.log`),
    healthUrl: null,
    patience: 15_000,
  };
}

/** @param {ServiceFacts} facts */
export function sinkService(facts) {
  return {
    name: 'mail sink',
    command: ['scripts/mail-sink/main.mjs'],
    env: {
      PATH: facts.baseEnv.PATH,
      HALFMARK_MAIL_FOLDER: facts.mailFolder,
      HALFMARK_SMTP_PORT: String(facts.sink.smtp),
      HALFMARK_MAIL_PAGE_PORT: String(facts.sink.mailPage),
    },
    log: path.join(facts.logFolder, 'mail.log'),
    healthUrl: null,
    patience: 3_000,
    endsLast: true,
  };
}

/** The address of a host and port, with brackets around an IPv6 address. */
export function httpAddress(host, port) {
  return `http://${host.includes(':') ? `[${host}]` : host}:${port}`;
}

function applicationEnv({ baseEnv, databaseUrl, appUrl, sessionSecret, smtpUrl, uploadsFolder }) {
  return {
    ...baseEnv,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    TZ: 'UTC',
    DATABASE_URL: databaseUrl,
    APP_URL: appUrl,
    NEXTAUTH_URL: appUrl,
    NEXTAUTH_SECRET: sessionSecret,
    SMTP_URL: smtpUrl,
    UPLOADS_DIR: uploadsFolder,
  };
}
