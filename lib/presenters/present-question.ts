import { type AnswerKind, type SymbolTable } from '@/lib/checker/contract';
import { dividePoints, type Thousandths } from '@/lib/domain/credit';
import { type DrawnValues, type TemplateContent } from '@/lib/templates/content';
import { interpolate } from '@/lib/templates/interpolate';
import { symbolsOfDraw } from '@/lib/templates/reference-of';

/** One part as a student sees it: nothing of its reference, its credits or its expected wrong answers. */
export type PresentedPart = {
  key: string;
  /** Markdown with the drawn values set in. */
  prompt: string;
  kind: AnswerKind;
  /** Points of the part in thousandths of a mark. */
  outOf: Thousandths;
  /** The labels of a choice; null for other kinds. */
  choices: readonly string[] | null;
};

/** One question of one draw, as it may leave the server to the student whose draw it is. */
export type PresentedQuestion = {
  title: string;
  /** Markdown with the drawn values set in. */
  prompt: string;
  /** The symbols an answer may use, with their domains: what the reader in the browser needs. */
  symbols: SymbolTable;
  parts: PresentedPart[];
};

/** Presents a question with a student's drawn values; points are the item's, divided over its parts. */
export function presentQuestion(content: TemplateContent, values: DrawnValues, points: Thousandths): PresentedQuestion {
  const outOf = dividePoints(
    points,
    content.parts.map((part) => part.weight),
  );
  return {
    title: content.title,
    prompt: interpolate(content.prompt, values, content),
    symbols: symbolsOfDraw(content, values),
    parts: content.parts.map((part, index) => ({
      key: part.key,
      prompt: interpolate(part.prompt, values, content),
      kind: part.kind,
      outOf: outOf[index] ?? 0,
      choices: part.options.choices ?? null,
    })),
  };
}
