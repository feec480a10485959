/*
 * `npm test`: every test there is, from nothing but Node.js, ending with one line that counts them. Names of stages
 * (unit, integration, journeys) run those alone: npm test -- unit
 */
import { readFileSync } from 'fs';
import { nodeFits, wantedNode } from './ground/node-version.mjs';

const { engines } = JSON.parse(readFileSync(new URL('../package.json', import.meta.url), 'utf8'));

if (!nodeFits(process.versions.node, wantedNode(engines.node))) {
  console.error(`halfmark: Node.js ${process.versions.node} runs here, Halfmark needs ${engines.node}.`);
  process.exitCode = 1;
} else {
  import('./ground/run-tests.mjs').then(({ runTests }) => runTests(process.argv.slice(2)));
}
