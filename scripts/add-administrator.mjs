/*
 * `npm run add-administrator -- ADDRESS NAME`: how the first person comes into a database that was not seeded.
 */
import { openCommandDatabase } from './ground/command-database.mjs';
import { runTypeScript } from './ground/database-steps.mjs';
import { report } from './ground/failure.mjs';
import { projectRoot } from './ground/folders.mjs';
import { secrets } from './ground/secrets.mjs';
import { shutDownInOrder } from './ground/shut-down.mjs';

const end = shutDownInOrder({ codeAfterSignal: 130 });

try {
  const { databaseUrl, appUrl } = await openCommandDatabase(end, { besideRunning: true });
  const { code, output } = await runTypeScript(
    'scripts/add-administrator.ts',
    process.argv.slice(2),
    {
      DATABASE_URL: databaseUrl,
      APP_URL: appUrl ?? '',
      NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET || secrets().sessionSecret,
    },
    end.watchHelper,
  );
  console.log(output.trim());
  await end.now(code === 0 ? 0 : 1);
} catch (error) {
  if (!end.isEnding()) report(error, projectRoot);
  await end.now(end.isEnding() ? null : 1);
}
