import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { spawn } from 'node:child_process';
import { ensureBuild, servingFromHere } from './build.mjs';
import { ensureChromium } from './chromium.mjs';
import { Failure, report } from './failure.mjs';
import { readJson } from './files.mjs';
import { inState, makeStateFolder, projectRoot } from './folders.mjs';
import { ensurePackages } from './packages.mjs';
import { shutDownInOrder } from './shut-down.mjs';
import { addCounts, closingLine, countStage } from './test-counts.mjs';
import { openTestDatabase } from './test-database.mjs';

/** A stage that takes longer than this hangs. */
const longestStageMs = 45 * 60_000;

/** What the person's own environment must not lend to a test: real databases, mail servers and addresses. */
const kept = (env) =>
  Object.fromEntries(
    Object.entries(env).filter(
      ([name]) =>
        !/^(DATABASE_|SMTP_|MAIL_|APP_URL|NEXTAUTH_|UPLOADS_DIR|PORT$|HOST$|NODE_ENV$|LOG_LEVEL|HALFMARK_WORKERS)/.test(
          name,
        ),
    ),
  );

/** Provides what each stage needs before it runs. */
const stages = [
  { name: 'unit', needs: [] },
  { name: 'integration', needs: ['database'] },
  { name: 'journeys', needs: ['database', 'browser', 'build'] },
];

/**
 * Runs the stages one after another, prints the closing line, and ends the process with 0 only where every test passed
 * and none was skipped.
 *
 * @param {string[]} names stages to run; all where empty
 */
export async function runTests(names) {
  const end = shutDownInOrder({ codeAfterSignal: 130 });
  const counts = [];
  try {
    const wanted = chooseStages(names);
    makeStateFolder();
    const say = (line) => console.log(line);
    await ensurePackages(say, end.watchHelper);
    const folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-tests-'));
    end.last('folder of this run', () => rmSync(folder, { recursive: true, force: true }));
    const provide = provider(say, end);
    for (const { name, needs } of wanted) {
      const env = {
        ...kept(process.env),
        NEXT_TELEMETRY_DISABLED: '1',
        HALFMARK_TEST_FOLDER: folder,
        LOG_LEVEL: 'silent',
      };
      for (const need of needs) Object.assign(env, await provide(need));
      if (end.isEnding()) return;
      counts.push(await runStage(name, path.join(folder, `${name}.json`), env, end));
    }
  } catch (error) {
    if (end.isEnding()) return;
    report(error, projectRoot);
    counts.push({ passed: 0, failed: 1, skipped: 0 });
  }
  if (end.isEnding()) return;
  const total = addCounts(counts);
  end.lastWords(closingLine(total));
  await end.now(total.failed > 0 || total.skipped > 0 ? 1 : 0);
}

function chooseStages(names) {
  const unknown = names.find((name) => !stages.some((stage) => stage.name === name));
  if (unknown !== undefined) {
    throw new Failure(`There is no stage "${unknown}".`, `Name some of: ${stages.map(({ name }) => name).join(', ')}.`);
  }
  return names.length === 0 ? stages : stages.filter(({ name }) => names.includes(name));
}

/** Gives each need once, as environment variables for the tests. */
function provider(say, end) {
  const make = {
    async database() {
      const database = await openTestDatabase(say);
      end.last('test database', database.stop);
      return { HALFMARK_TEST_DATABASE_URL: database.url };
    },
    async browser() {
      return { HALFMARK_CHROMIUM: await ensureChromium(say) };
    },
    async build() {
      await ensureBuild(say, {
        onStart: end.watchHelper,
        mayReplace: () => servingFromHere(inState('running.json')),
      });
      return {};
    },
  };
  const made = new Map();
  return (need) => {
    if (!made.has(need)) made.set(need, make[need]());
    return made.get(need);
  };
}

function runStage(name, reportFile, env, end) {
  console.log(`\n── ${name} ──`);
  const child = spawn(
    process.execPath,
    [
      'node_modules/vitest/vitest.mjs',
      'run',
      ...['--project', name],
      ...['--reporter=default', '--reporter=json', `--outputFile.json=${reportFile}`],
    ],
    { cwd: projectRoot, env, stdio: ['ignore', 'inherit', 'inherit'] },
  );
  end.watchHelper(child);
  const timer = setTimeout(() => child.kill('SIGKILL'), longestStageMs);
  return new Promise((resolve) => {
    child.once('error', () => resolve({ passed: 0, failed: 1, skipped: 0 }));
    child.once('close', (code) => {
      clearTimeout(timer);
      resolve(countStage(readJson(reportFile), code ?? 1));
    });
  });
}
