import { existsSync, statfsSync } from 'node:fs';
import { ensureBuild } from './build.mjs';
import { migrate, requireMigrated, seed } from './database-steps.mjs';
import { Failure, report } from './failure.mjs';
import { readJson, writeJson } from './files.mjs';
import { inState, makeStateFolder, projectRoot } from './folders.mjs';
import { openOwnDatabase, withClient } from './own-database.mjs';
import { ensurePackages } from './packages.mjs';
import { freePort, webPort } from './ports.mjs';
import { takeLock } from './run-lock.mjs';
import { secrets } from './secrets.mjs';
import { keepRunning } from './services.mjs';
import { readSettings } from './settings.mjs';
import { demoAccounts, hasDemo, isEmpty } from './demo.mjs';
import { readyText } from './ready-text.mjs';
import { httpAddress, sinkService, webService, workerService } from './service-list.mjs';
import { shutDownInOrder } from './shut-down.mjs';

const usualPort = 3420;
const longestFarewellMs = 15_000;
const leastFreeBytes = { firstStart: 2_000_000_000, laterStart: 200_000_000 };

/** Runs Halfmark until a signal ends it or something fails; sets the exit code. */
export async function startHalfmark() {
  const began = performance.now();
  const end = shutDownInOrder();
  try {
    loadEnvironmentFile();
    const settings = readSettings(process.env);
    makeStateFolder();
    const lock = await takeLock(inState('running.json'));
    if ('holder' in lock) throw alreadyRunning(lock.holder);
    end.last('lock', () => lock.release());
    const { text, url } = await bringUp(settings, end, lock.tookOver);
    lock.note({ url });
    console.log(text(Math.round((performance.now() - began) / 1000)));
  } catch (error) {
    if (!end.isEnding()) report(error, projectRoot);
    await end.now(end.isEnding() ? null : 1);
  }
}

async function bringUp(settings, end, tookOver) {
  const say = (line) => end.isEnding() || console.log(line);
  const goOn = () => {
    if (end.isEnding()) throw new Failure('Halfmark was asked to stop.', '');
  };
  requireDisk();
  // The web server of a killed start takes a few seconds to notice and to give its port back.
  const patience = tookOver ? longestFarewellMs : 0;
  const port = await webPort(settings.port, settings.host, usualPort, patience);
  await ensurePackages(say, end.watchHelper);
  goOn();

  const facts = await serviceFacts(settings, port);
  // The build needs no database, so both are made at once; where one fails the other is ended.
  const building = ensureBuild(say, { onStart: end.watchHelper });
  const prepared = prepareDatabase(settings, facts, say, end, goOn);
  const [database] = await Promise.all([prepared, building]);
  goOn();

  const complete = { ...facts, databaseUrl: database.url };
  const services = [
    ...(facts.sink ? [sinkService(complete)] : []),
    webService(complete),
    ...Array.from({ length: settings.workers }, (_, index) => workerService(complete, index + 1)),
  ];
  const listener = { say, giveUp: (error) => void fail(error, end) };
  for (const service of services) {
    const { stop } = await keepRunning(service, listener);
    if (service.endsLast) end.last(service.name, stop);
    else end.first(service.name, stop);
    goOn();
  }
  return {
    url: facts.appUrl,
    text: (seconds) =>
      readyText({
        url: facts.appUrl,
        seconds,
        accounts: database.showsDemo ? demoAccounts() : null,
        mailUrl: facts.sink ? httpAddress('127.0.0.1', facts.sink.mailPage) : null,
        dataFolder: database.folder,
        logFolder: facts.logFolder,
      }),
  };
}

/** The database, up to date and (where it is ours alone and empty) with the demo in it. */
async function prepareDatabase(settings, facts, say, end, goOn) {
  if (settings.databaseUrl !== null) {
    await requireMigrated(settings.databaseUrl, end.watchHelper);
    return { url: settings.databaseUrl, folder: null, showsDemo: false };
  }
  const own = await openOwnDatabase(say);
  end.last('database', own.stop);
  own.onUnexpectedExit((words) => void fail(new Failure(`The database server ended: ${words}`, 'Start again.'), end));
  goOn();
  const folder = own.inside ? null : own.home;
  if (folder) say(`The database's user cannot reach this folder, so the data lies in ${folder}`);
  if (!settings.managesDatabase) {
    await requireMigrated(own.url, end.watchHelper);
    if (await withClient(own.url, hasDemo)) throw demoInPublic();
    return { url: own.url, folder, showsDemo: false };
  }
  await migrate(own.url, end.watchHelper);
  goOn();
  await seedOnce(own, facts, say, end);
  return { url: own.url, folder, showsDemo: await withClient(own.url, hasDemo) };
}

/**
 * Seeds an empty database. A seeding cut short left a database that nobody has used, since the web server starts only
 * afterwards: it is made again.
 */
async function seedOnce(own, { appUrl, sessionSecret, smtpUrl, uploadsFolder }, say, end) {
  const marker = inState('seeding.json');
  if (existsSync(marker) && readJson(marker)?.home === own.home) {
    await own.recreate();
    await migrate(own.url, end.watchHelper);
  } else if (!(await withClient(own.url, isEmpty))) return;
  say('Putting the demo into the database …');
  writeJson(marker, { home: own.home });
  const env = { NEXTAUTH_SECRET: sessionSecret, SMTP_URL: smtpUrl, UPLOADS_DIR: uploadsFolder };
  await seed(own.url, appUrl, env, end.watchHelper);
  end.removeFile(marker);
}

/** @returns {Promise<import('./service-list.mjs').ServiceFacts>} all but the database */
async function serviceFacts(settings, port) {
  const sink = settings.smtpUrl === null ? await sinkPorts() : null;
  return {
    baseEnv: process.env,
    host: settings.host,
    port,
    appUrl: settings.appUrl ?? httpAddress(settings.host, port),
    sessionSecret: process.env.NEXTAUTH_SECRET || secrets().sessionSecret,
    smtpUrl: settings.smtpUrl ?? `smtp://127.0.0.1:${sink.smtp}`,
    sink,
    mailFolder: inState('mail'),
    uploadsFolder: process.env.UPLOADS_DIR || `${projectRoot}/uploads`,
    logFolder: inState('log'),
  };
}

async function sinkPorts() {
  const file = inState('ports.json');
  const kept = readJson(file, {});
  const ports = { smtp: await freePort(kept?.smtp), mailPage: await freePort(kept?.mailPage) };
  writeJson(file, { ...kept, ...ports });
  return ports;
}

async function fail(error, end) {
  if (end.isEnding()) return;
  report(error, projectRoot);
  await end.now(1);
}

function requireDisk() {
  const isFirst = !existsSync(inState('secrets.json'));
  const { bavail, bsize } = statfsSync(projectRoot);
  const least = isFirst ? leastFreeBytes.firstStart : leastFreeBytes.laterStart;
  if (bavail * bsize < least) throw Object.assign(new Error('No space left on device'), { code: 'ENOSPC' });
}

/** A .env file beside package.json may set what the environment does not. */
function loadEnvironmentFile() {
  const file = `${projectRoot}/.env`;
  if (existsSync(file)) process.loadEnvFile(file);
}

function alreadyRunning({ pid, url }) {
  return url
    ? new Failure(`Halfmark is already running at ${url} (process ${pid}).`, `To stop it: kill ${pid}`)
    : new Failure(`Halfmark is being started already (process ${pid}).`, `Wait for it, or stop it: kill ${pid}`);
}

function demoInPublic() {
  return new Failure(
    'This database holds the demo, whose passwords are public, and HOST or APP_URL would let other machines reach it.',
    'Set DATABASE_URL to a database of your own, or move .halfmark aside to begin an empty one.',
  );
}
