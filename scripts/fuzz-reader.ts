/**
 * Reads random and mutated texts and reports throws, the longest time and memory growth.
 *
 *   npm run fuzz:reader -- [count] [seed]
 *
 * Every input follows from the seed. A throw is printed with its input and ends the run with exit code 1.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';
import { type AnswerKind, type Symbols } from '@/lib/checker/notation/answer-tree';
import { read } from '@/lib/checker/reader';

const count = Number(process.argv[2] ?? 1_000_000);
const seed = Number(process.argv[3] ?? 1);

const kinds: readonly AnswerKind[] = [
  'scalar',
  'quantity',
  'operator',
  'pauli',
  'eigenvalues',
  'state',
  'eigenpairs',
  'vector',
  'choice',
];

const symbols: Symbols = {
  omega: 'positive',
  theta: 'real',
  phi: 'real',
  a_0: 'real',
  a: 'real',
  b: 'complex',
  x: 'real',
  n: 'integer',
  k_B: 'positive',
  T: 'positive',
  "x'": 'real',
};

const pieces = (
  '+ - ± ∓ +- * · × / ^ ** _ ( ) [ ] { } \\{ \\} , ; : = | < > ⟨ ⟩ \\langle \\rangle \\left \\right | |+> |-> <+| ' +
  "<-| |0⟩ \\ket{+} \\bra{-} ' ′ † ^* ^T ^† \\dagger √ \\sqrt \\frac \\frac12 ½ ² ⁻¹ ₁ ₊ 1 2 10 0 0.5 1e-3 2e3 . e i pi π " +
  'hbar ħ \\hbar h omega ω \\omega theta θ a a_0 a0 b x n k_B T I 𝟙 S_x Sx S_+ sigma_x σ_x σx \\sigma_x \\hat ' +
  '\\mathrm \\text \\mathbb{1} sin cos \\sin exp ln sqrt abs conj atan2 sin^-1 sin² \\begin{pmatrix} \\end{pmatrix} & \\\\ ' +
  '$ \\, \\quad MHz rad/s µeV T s^-1 up down q foo é 😀 𝑥 \\foo \\ # % " ! != <='
).split(' ');

/** A generator of 32-bit numbers (Marsaglia's xorshift). */
function makeRandom(start: number): (below: number) => number {
  let state = start === 0 ? 0x9e3779b9 : start >>> 0;
  return (below) => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) % below;
  };
}

const random = makeRandom(seed);

interface Input {
  readonly text: string;
  readonly kind: AnswerKind;
  readonly symbols: Symbols;
}

function loadTexts(): readonly Input[] {
  const base = join(import.meta.dirname, '../tests/corpus/notation');
  return ['valid', 'invalid'].flatMap((folder) =>
    readdirSync(join(base, folder)).flatMap((file) =>
      readFileSync(join(base, folder, file), 'utf8')
        .split('\n')
        .filter((line) => line !== '')
        .map((line) => JSON.parse(line) as Input),
    ),
  );
}

const inputs = loadTexts();
const plainInput: Input = { text: '', kind: 'scalar', symbols };

function pick(from: readonly string[]): string {
  return from[random(from.length)] ?? '';
}

function randomPieces(): string {
  let text = '';
  for (let left = 1 + random(12); left > 0; left -= 1) text += pick(pieces) + (random(3) === 0 ? ' ' : '');
  return text;
}

function randomCharacters(): string {
  let text = '';
  for (let left = 1 + random(20); left > 0; left -= 1)
    text += String.fromCharCode(random(4) === 0 ? random(0x10000) : 32 + random(95));
  return text;
}

/** A corpus case with one to four pieces of its text left out, put in, doubled or exchanged. */
function mutated(): Input {
  const input = inputs[random(inputs.length)] ?? plainInput;
  let { text } = input;
  for (let left = 1 + random(4); left > 0; left -= 1) {
    const at = random(text.length + 1);
    const to = Math.min(text.length, at + random(4));
    switch (random(4)) {
      case 0:
        text = text.slice(0, at) + text.slice(to);
        break;
      case 1:
        text = text.slice(0, at) + pick(pieces) + text.slice(at);
        break;
      case 2:
        text = text.slice(0, to) + text.slice(at);
        break;
      default:
        text = text.slice(0, at) + (inputs[random(inputs.length)] ?? plainInput).text.slice(0, 12) + text.slice(to);
    }
  }
  return { ...input, text };
}

/** Up to the length limit: one piece, or two, over and over. */
function repeated(): string {
  const unit = pick(pieces) + (random(2) === 0 ? pick(pieces) : '');
  return unit.repeat(Math.ceil((1 + random(4000)) / Math.max(1, unit.length)));
}

function nextInput(): Input {
  const choice = random(1000);
  if (choice < 550) return mutated();
  const text = choice < 850 ? randomPieces() : choice < 999 ? randomCharacters() : repeated();
  return { text, kind: kinds[random(kinds.length)] ?? 'scalar', symbols };
}

let readable = 0;
let ambiguous = 0;
let longest = 0;
let longestText = '';
const memory: number[] = [];
const began = performance.now();

for (let index = 0; index < count; index += 1) {
  if (index % Math.ceil(count / 10) === 0) memory.push(usedMemory());
  const input = nextInput();
  try {
    const time = readOnce(input, true);
    if (time > longest) keepLongest(input, time);
  } catch (error) {
    console.error(`throws: ${JSON.stringify({ kind: input.kind, text: input.text })}`, error);
    process.exit(1);
  }
}
memory.push(usedMemory());

function readOnce({ text, kind, symbols: declared }: Input, counted: boolean): number {
  const start = performance.now();
  const reading = read(text, { kind, symbols: declared, options: { choices: ['up', 'down'] } });
  const time = performance.now() - start;
  if (counted && reading.readable) readable += 1;
  if (counted && reading.ambiguous) ambiguous += 1;
  return time;
}

/** Other processes and the collector interrupt: a text took as long as its shortest of four readings. */
function keepLongest(input: Input, first: number): void {
  let time = first;
  for (let again = 0; again < 3; again += 1) time = Math.min(time, readOnce(input, false));
  if (time <= longest) return;
  longest = time;
  const { text } = input;
  longestText = text.length > 80 ? `${text.slice(0, 80)}… (${text.length})` : text;
}

function usedMemory(): number {
  globalThis.gc?.();
  return Math.round(process.memoryUsage().heapUsed / 1024);
}

const seconds = (performance.now() - began) / 1000;
console.log(`${count} inputs, seed ${seed}: no throw, ${readable} readable, ${ambiguous} ambiguous`);
console.log(`${seconds.toFixed(1)} s in all, ${((seconds / count) * 1e6).toFixed(1)} µs an input with making it`);
console.log(`longest ${longest.toFixed(2)} ms (shortest of four readings): ${JSON.stringify(longestText)}`);
console.log(`heap in use after each tenth, kB: ${memory.join(' ')}`);
