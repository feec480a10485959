import path from 'node:path';
import { inState, projectRoot } from './folders.mjs';

/**
 * The programs that make up a running Halfmark, in the order in which they start.
 *
 * @returns {import('./services.mjs').Service[]}
 */
export function serviceList({ settings, appUrl, sessionSecret, smtpUrl, databaseUrl, port, ports }) {
  const env = {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    TZ: 'UTC',
    DATABASE_URL: databaseUrl,
    APP_URL: appUrl,
    NEXTAUTH_URL: appUrl,
    NEXTAUTH_SECRET: sessionSecret,
    SMTP_URL: smtpUrl,
    UPLOADS_DIR: process.env.UPLOADS_DIR || path.join(projectRoot, 'uploads'),
  };
  const log = (name) => inState('log', `${name}.log`);
  const sink = {
    name: 'mail sink',
    command: ['scripts/mail-sink/main.mjs'],
    env: {
      PATH: process.env.PATH,
      HALFMARK_MAIL_FOLDER: inState('mail'),
      HALFMARK_SMTP_PORT: String(ports.smtp),
      HALFMARK_MAIL_PAGE_PORT: String(ports.mailPage),
    },
    log: log('mail'),
    healthUrl: null,
    patience: 3_000,
    endsLast: true,
  };
  const worker = (number) => ({
    name: settings.workers > 1 ? `worker ${number}` : 'worker',
    command: ['--import', 'tsx', 'lib/jobs/worker.ts'],
    env,
    log: log(settings.workers > 1 ? `worker-${number}` : 'worker'),
    healthUrl: null,
    patience: 15_000,
  });
  const reachable = settings.host === '0.0.0.0' || settings.host === '::' ? '127.0.0.1' : settings.host;
  const web = {
    name: 'web server',
    command: ['node_modules/next/dist/bin/next', 'start', '--hostname', settings.host, '--port', String(port)],
    env: { ...env, PORT: String(port) },
    log: log('web'),
    healthUrl: `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${port}/api/health`,
    patience: 10_000,
  };
  return [
    ...(settings.smtpUrl === null ? [sink] : []),
    web,
    ...Array.from({ length: settings.workers }, (_, index) => worker(index + 1)),
  ];
}
