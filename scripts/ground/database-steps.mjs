import { Failure, lastWords } from './failure.mjs';
import { projectRoot } from './folders.mjs';
import { run } from './programs.mjs';

const somethingToDo = 3;

/** Runs one of our TypeScript programs with `tsx`; its packages must be installed. */
export function runTypeScript(file, values, env, onStart) {
  return run(process.execPath, ['--import', 'tsx', file, ...values], {
    cwd: projectRoot,
    env: { ...process.env, ...env },
    onStart,
  });
}

/** Brings a database up to date; gives what was said. */
export async function migrate(databaseUrl, onStart) {
  const { code, output } = await runTypeScript('scripts/migrate.ts', [], { DATABASE_URL: databaseUrl }, onStart);
  if (code === 0) return output.trim();
  throw (
    commonFailure(output) ??
    new Failure(
      `A migration failed and was rolled back: ${lastWords(output)}`,
      'Mend the cause named there and run: npm run migrate',
    )
  );
}

/** Throws a Failure where a database is not up to date. */
export async function requireMigrated(databaseUrl, onStart) {
  const { code, output } = await runTypeScript(
    'scripts/migrate.ts',
    ['--check'],
    { DATABASE_URL: databaseUrl },
    onStart,
  );
  if (code === 0) return;
  if (code === somethingToDo) throw new Failure(lastWords(output), 'Back it up, then run: npm run migrate');
  throw (
    commonFailure(output) ?? new Failure(`The database cannot be read: ${lastWords(output)}`, 'Check DATABASE_URL.')
  );
}

/** Puts the demo into an empty database. */
export async function seed(databaseUrl, appUrl, env, onStart) {
  const { code, output } = await runTypeScript(
    'scripts/seed.ts',
    [],
    { ...env, DATABASE_URL: databaseUrl, APP_URL: appUrl },
    onStart,
  );
  if (code === 0) return;
  throw (
    commonFailure(output) ??
    new Failure(
      `The demo could not be put into the database: ${lastWords(output, 800)}`,
      'Mend the cause and start again.',
    )
  );
}

function commonFailure(output) {
  if (/No space left|ENOSPC/i.test(output)) return Object.assign(new Error('No space left'), { code: 'ENOSPC' });
  if (/ECONNREFUSED|ENOTFOUND|ETIMEDOUT|EHOSTUNREACH/.test(output)) {
    return new Failure(
      'The database server cannot be reached.',
      'Start it, or check the host and port in DATABASE_URL.',
    );
  }
  if (/password authentication failed|no pg_hba\.conf entry|SASL/i.test(output)) {
    return new Failure('The database server refuses the sign-in.', 'Check user and password in DATABASE_URL.');
  }
  if (/database "[^"]*" does not exist/.test(output)) {
    return new Failure(
      'The database that DATABASE_URL names does not exist.',
      'Create it (createdb), then run: npm run migrate',
    );
  }
  return null;
}
