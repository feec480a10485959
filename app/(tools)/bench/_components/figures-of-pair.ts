import { type BlochVector } from '@/components/math/bloch-sphere';
import { type Levels } from '@/components/math/level-diagram';
import { type PauliFigures } from '@/components/math/pauli-bars';
import { type AnswerKind, type SymbolTable } from '@/lib/checker/contract';
import { parse } from '@/lib/checker/notation/parse';
import { checkMany } from '@/lib/jobs/check-many';
import { evaluateConstant, type Complex } from '@/lib/templates/evaluate-constant';

type Compared<Value> = { reference: Value; answer: Value };

/** What can be drawn of a pair, and at which values of the symbols ('' where it has none). */
export type Figures = {
  picture:
    | ({ kind: 'bloch' } & Compared<BlochVector>)
    | ({ kind: 'levels' } & Compared<Levels>)
    | ({ kind: 'pauli' } & Compared<PauliFigures>);
  at: string;
};

type Pair = { kind: AnswerKind; reference: string; answer: string; symbols: SymbolTable };

/**
 * Works out both sides as figures, in a checker thread, at the values of a witness or, without one, at values of our own
 * choice. Null for a kind without a picture, and where a side has no such figures.
 */
export async function figuresOfPair(
  pair: Pair,
  witness: Readonly<Record<string, string>> | undefined,
): Promise<Figures | null> {
  const kind = pictureKind[pair.kind];
  if (kind === undefined) return null;
  const definitions = Object.fromEntries(
    Object.keys(pair.symbols).map((name, index) => [
      name,
      witness?.[name] ?? (pair.symbols[name] === 'integer' ? '1' : `${7 + 4 * index}/10`),
    ]),
  );
  const worked = await checkMany(
    [pair.reference, pair.answer].map((text, index) => ({
      id: String(index),
      kind,
      reference: pair.kind === 'state' ? `bloch(${text})` : text,
      answer: '0',
      options: { definitions },
    })),
  );
  const [reference, answer] = worked.map(({ referenceLatex }) => numbersIn(kind, referenceLatex));
  const picture = reference && answer ? pictureOf(pair.kind, reference, answer) : null;
  const at = Object.entries(definitions).map(([name, value]) => `${name} = ${value}`);
  return picture && { picture, at: at.join(', ') };
}

const pictureKind: Partial<Record<AnswerKind, AnswerKind>> = {
  state: 'vector',
  operator: 'pauli',
  pauli: 'pauli',
  eigenvalues: 'eigenvalues',
};

/** The numbers of a worked-out tuple or of eigenvalues; null where one of them is none. */
function numbersIn(kind: AnswerKind, latex: string): readonly Complex[] | null {
  const { tree } = parse(latex, { kind, symbols: {} });
  if (tree === null) return null;
  if (tree.node !== 'values' && tree.node !== 'list') return null;
  const parts = tree.node === 'values' ? tree.entries.map(({ value }) => value) : tree.entries;
  const numbers = parts.map(evaluateConstant).filter((value) => value !== null);
  return numbers.length === parts.length ? numbers : null;
}

function pictureOf(
  kind: AnswerKind,
  reference: readonly Complex[],
  answer: readonly Complex[],
): Figures['picture'] | null {
  if (kind === 'state') {
    const [from, to] = [reference, answer].map(vectorOf);
    return from && to ? { kind: 'bloch', reference: from, answer: to } : null;
  }
  if (kind === 'eigenvalues') {
    const [from, to] = [reference, answer].map(levelsOf);
    return from && to ? { kind: 'levels', reference: from, answer: to } : null;
  }
  const [from, to] = [reference, answer].map(pauliOf);
  return from && to ? { kind: 'pauli', reference: from, answer: to } : null;
}

function vectorOf([x, y, z]: readonly Complex[]): BlochVector | null {
  return x && y && z ? { x: x.re, y: y.re, z: z.re } : null;
}

function levelsOf([one, other]: readonly Complex[]): Levels | null {
  return one && other ? [one.re, other.re] : null;
}

function pauliOf([a0, a1, a2, a3]: readonly Complex[]): PauliFigures | null {
  return a0 && a1 && a2 && a3 ? [a0, a1, a2, a3] : null;
}
