/*
 * `npm start`: from a fresh clone to a running Halfmark. This file is kept to what any Node.js understands, so that an
 * unfit one gets a sentence instead of a syntax error.
 */
import { readFileSync } from 'fs';
import { nodeFits, wantedNode } from './ground/node-version.mjs';

const { engines } = JSON.parse(readFileSync(new URL('../package.json', import.meta.url), 'utf8'));
const wanted = wantedNode(engines.node);

if (!nodeFits(process.versions.node, wanted)) {
  console.error(
    `halfmark: Node.js ${process.versions.node} runs here, Halfmark needs ${wanted.major} (${wanted.major}.${wanted.minor} or later). ` +
      `Install Node.js ${wanted.major} and start again.`,
  );
  process.exitCode = 1;
} else {
  import('./ground/start-halfmark.mjs').then(({ startHalfmark }) => startHalfmark());
}
