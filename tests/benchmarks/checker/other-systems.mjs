import { spawnSync } from 'node:child_process';
import { performance } from 'node:perf_hooks';

/** SymPy and Maxima on the same pairs, where they are installed. */
export async function otherSystems(pairs) {
  return [sympy(pairs), maxima(pairs)];
}

const SYMPY = `
import json, sys, time
import sympy as sp
pairs = json.load(sys.stdin)
names = {'hbar': sp.Symbol('hbar', positive=True), 'i': sp.I, 'pi': sp.pi, 'E': sp.Symbol('E'), 'S': sp.Symbol('S'),
  'N': sp.Symbol('N'), 'Q': sp.Symbol('Q'), 'O': sp.Symbol('O'), 'abs': sp.Abs}
wrong = undecided = 0
started = time.perf_counter()
for pair in pairs:
    local = dict(names)
    for name, domain in pair['symbols'].items():
        local[name] = sp.Symbol(name, positive=True) if domain == 'positive' else sp.Symbol(name, real=True)
    try:
        left, right = (sp.sympify(pair[side].replace('^', '**'), locals=local, rational=True) for side in ('left', 'right'))
        difference = sp.simplify(left - right)
        verdict = True if difference == 0 else difference.equals(0)
    except Exception:
        verdict = None
    if verdict is None: undecided += 1
    elif verdict != (pair['verdict'] == 'agrees'): wrong += 1
print(json.dumps({'mean': 1000 * (time.perf_counter() - started) / len(pairs), 'wrong': wrong, 'undecided': undecided}))
`;

function sympy(pairs) {
  const run = spawnSync('/usr/bin/python3', ['-c', SYMPY], {
    input: JSON.stringify(pairs),
    encoding: 'utf8',
    timeout: 600_000,
  });
  if (run.status !== 0) return { system: 'SymPy', missing: true };
  return { system: 'SymPy', ...JSON.parse(run.stdout) };
}

function maxima(pairs) {
  const lines = pairs.map(({ left, right, symbols }) => {
    const text = (side) => side.replaceAll(/\bpi\b/g, '%pi').replaceAll(/\bi\b/g, '%i');
    const positive = Object.keys(symbols).filter((name) => symbols[name] === 'positive');
    const assumed = ['hbar', ...positive].map((name) => `${name} > 0`).join(', ');
    return `assume(${assumed})$ print("=>", is(ratsimp(trigreduce(exponentialize(radcan((${text(left)}) - (${text(right)}))))) = 0))$ kill(all)$`;
  });
  const started = performance.now();
  const run = spawnSync('maxima', ['--very-quiet', '--batch-string', lines.join('\n')], {
    encoding: 'utf8',
    timeout: 600_000,
  });
  if (run.error || run.status !== 0) return { system: 'Maxima', missing: true };
  const answers = [...run.stdout.matchAll(/^=> (\S+)/gm)].map((match) => match[1]);
  let wrong = 0;
  pairs.forEach(({ verdict }, k) => {
    if (answers[k] !== undefined && (answers[k] === 'true') !== (verdict === 'agrees')) wrong += 1;
  });
  const undecided = pairs.length - answers.length;
  return { system: 'Maxima', mean: (performance.now() - started) / pairs.length, wrong, undecided };
}
