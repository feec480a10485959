import { compute, sentenceOf } from '@/lib/checker';
import type { AnswerKind } from '@/lib/checker/contract';
import { formatCredit, type Thousandths } from '@/lib/domain/credit';
import type { Verdict } from '@/lib/domain/verdict';
import type { AnswerForMarking } from '@/lib/queries/answer-for-marking';
import { interpolate } from '@/lib/templates/interpolate';
import { pointsOfPart } from '@/lib/templates/points-of-part';
import { referenceOf } from '@/lib/templates/reference-of';
import { evidenceInWords } from './evidence-words';
import { matrixElements, type MatrixElements } from './matrix-elements';
import { scriptCode } from './script-code';

/** An answer as its markers see it: nothing of any mark, whoever gave it. */
export type MarkedAnswer = {
  /** "K-1184", or the student's name where it may be seen. */
  script: string;
  position: number;
  partKey: string;
  title: string;
  /** Markdown with the drawn values set in. */
  prompt: string;
  asked: string;
  kind: AnswerKind;
  outOf: Thousandths;
  marks: string;
  attempt: number;
  byStaff: boolean;
  submittedAt: Date;
  text: string;
  solution: string;
  reading: { latex: string; plain: string } | null;
  referenceLatex: string;
  verdict: Verdict | null;
  message: string;
  /** Recognised slips as sentences, the likeliest first. */
  slips: string[];
  evidence: string[];
  /** The answer worked out, element by element, where it is a matrix or column of the reference's shape and differs. */
  elements: { answer: MatrixElements; differ: boolean[][] } | null;
};

/** Presents an answer to those who mark it. */
export function presentMarkedAnswer(row: AnswerForMarking, { named }: { named: boolean }): MarkedAnswer {
  const { content, values, check, partKey } = row;
  const part = content.parts.find(({ key }) => key === partKey);
  const outOf = pointsOfPart(content, row.points, partKey);
  return {
    script: named ? row.studentName : scriptCode(row.problemSetId, row.studentId),
    position: row.position,
    partKey,
    title: content.title,
    prompt: interpolate(content.prompt, values, content),
    asked: interpolate(part?.prompt ?? '', values, content),
    kind: part?.kind ?? 'scalar',
    outOf,
    marks: formatCredit(outOf),
    attempt: row.attempt,
    byStaff: row.byStaff,
    submittedAt: row.submittedAt,
    text: row.text,
    solution: interpolate(content.solution, values, content),
    reading: check && check.readingLatex !== '' ? { latex: check.readingLatex, plain: check.readingPlain } : null,
    referenceLatex: check?.referenceLatex ?? '',
    verdict: check?.verdict ?? null,
    message: check?.message ?? '',
    slips: (check?.slips ?? []).map((id) => part?.expected.find((own) => own.id === id)?.sentence ?? sentenceOf(id)),
    evidence: check ? evidenceInWords(check.verdict, check.evidence) : [],
    elements: elementsOf(row),
  };
}

const withElements: readonly AnswerKind[] = ['operator', 'pauli', 'state', 'vector'];

/** The answer worked out, so that element stands beside element whatever way it was written. */
function elementsOf({ content, values, partKey, text, check }: AnswerForMarking): MarkedAnswer['elements'] {
  if (check?.verdict !== 'differs') return null;
  const reference = referenceOf(content, partKey, values);
  if (!reference.ok || !withElements.includes(reference.check.kind)) return null;
  const worked = compute({ ...reference.check, reference: text });
  const given = worked.ok ? matrixElements(worked.latex) : null;
  const wanted = matrixElements(check.referenceLatex);
  if (!given || !wanted || given.rows.length !== wanted.rows.length) return null;
  if (given.rows[0]?.length !== wanted.rows[0]?.length) return null;
  const marked = new Set((check.evidence.elements ?? []).map((place) => place.join(',')));
  const differ = given.rows.map((row, index) =>
    row.map(
      (_, column) => marked.has(`${index + 1},${column + 1}`) || (row.length === 1 && marked.has(`${index + 1}`)),
    ),
  );
  return { answer: given, differ };
}
