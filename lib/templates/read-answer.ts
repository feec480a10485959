import { type AnswerKind, type CheckOptions, type SymbolDomain } from '@/lib/checker/contract';
import { read } from '@/lib/checker/reader';
import { type TemplateContent } from './content';

/** What the reader is told of a part: nothing from which its reference could be guessed. */
export type PartReading = {
  kind: AnswerKind;
  symbols: Record<string, SymbolDomain>;
  options: Pick<CheckOptions, 'choices'>;
};

/**
 * How answers to a part are read: its kind, the declared symbols, the choices. The ends of an interval are left out,
 * because they may hold drawn values and reading does not depend on them. Throws a RangeError for a part the template
 * does not have.
 */
export function partReadingOf(content: Pick<TemplateContent, 'symbols' | 'parts'>, partKey: string): PartReading {
  const part = content.parts.find(({ key }) => key === partKey);
  if (part === undefined) throw new RangeError(`The template has no part ${partKey}.`);
  return {
    kind: part.kind,
    symbols: Object.fromEntries(
      content.symbols.map(({ name, domain }) => [name, typeof domain === 'string' ? domain : 'real']),
    ),
    options: part.options.choices === undefined ? {} : { choices: part.options.choices },
  };
}

/** Reads an answer to a part of a template as the student's browser does. */
export function readAnswer(
  content: Pick<TemplateContent, 'symbols' | 'parts'>,
  partKey: string,
  text: string,
): ReturnType<typeof read> {
  return read(text, partReadingOf(content, partKey));
}
