'use client';

import '@/components/math/typeset.css';
import { fieldId } from '@/components/ui/field-frame';
import { type TemplateProblem } from '@/lib/templates/template-problem';
import { type RenderedDraw, type RenderedPreview } from './render-preview';

interface ResultProps {
  readonly preview: RenderedPreview;
  /** The source has changed since. */
  readonly stale: boolean;
}

/** What the source makes: what is still wrong with it, and three draws as students and graders will have them. */
export function Result({ preview, stale }: ResultProps) {
  const { problems, draws } = preview;
  return (
    <div className={`grid gap-6 transition-opacity ${stale ? 'opacity-70' : ''}`}>
      {problems.length > 0 ? <Problems problems={problems} /> : null}
      {draws.map((draw, index) => (
        <Draw key={index} draw={draw} number={index + 1} />
      ))}
      {draws.length === 0 ? (
        <p className="text-small text-grey">
          Three draws appear here, with their references, once the question is whole.
        </p>
      ) : null}
    </div>
  );
}

function Problems({ problems }: { problems: readonly TemplateProblem[] }) {
  const mistakes = problems.filter((problem) => problem.weight === 'mistake').length;
  const title = mistakes === 0 ? 'Worth a look' : mistakes === 1 ? 'One thing to mend' : `${mistakes} things to mend`;
  return (
    <section aria-label={title}>
      <h2>
        <span role="status">{title}</span>
      </h2>
      <ul className="mt-2 grid gap-1.5 text-small">
        {problems.map((problem) => (
          <li key={problem.path + problem.message} className="flex gap-2">
            <span aria-hidden="true" className={problem.weight === 'mistake' ? 'text-madder' : 'text-ochre'}>
              {problem.weight === 'mistake' ? '✗' : '·'}
            </span>
            <span>
              {problem.path ? (
                <a href={`#${fieldId(problem.path)}`} className="text-ink">
                  {placeOf(problem.path)}
                </a>
              ) : (
                'The question'
              )}
              : {problem.message}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}

function Draw({ draw, number }: { draw: RenderedDraw; number: number }) {
  return (
    <section aria-label={`Draw ${number}`} className="min-w-0 border-t border-hairline pt-4 first:border-0 first:pt-0">
      <h2>Draw {number}</h2>
      {draw.values ? <p className="mt-1 text-small text-grey" {...html(draw.values)} /> : null}
      <div className="prose mt-2" {...html(draw.prompt)} />
      <ol className="mt-3 grid gap-3">
        {draw.parts.map((part) => (
          <li key={part.key} className="min-w-0">
            <p className="flex gap-2">
              <span className="font-semibold">{part.key}.</span>
              <span className="min-w-0" {...html(part.prompt)} />
            </p>
            {'html' in part.reference ? (
              <div className="mt-1 border-y border-hairline py-1.5">
                <p className="text-note text-grey">Reference</p>
                <div className="typeset-display" {...html(part.reference.html)} />
              </div>
            ) : (
              <p className="mt-1 text-small text-madder">No reference: {part.reference.error}</p>
            )}
          </li>
        ))}
      </ol>
      {draw.solution ? (
        <details className="mt-3 text-small">
          <summary className="text-blue">Solution note</summary>
          <div className="prose mt-2" {...html(draw.solution)} />
        </details>
      ) : null}
    </section>
  );
}

/** Set as it is: it was made on the server by our own renderer, which escapes everything but its own tags. */
function html(text: string) {
  return { dangerouslySetInnerHTML: { __html: text } };
}

const lists: Record<string, string> = {
  parameters: 'Drawn value',
  symbols: 'Symbol',
  constraints: 'Condition',
  expected: 'expected answer',
  slips: 'slip',
};

/** A place of the draft in words: "Part b, reference", "Drawn value 2, from". */
function placeOf(path: string): string {
  const steps = path.split('.');
  const words: string[] = [];
  for (let at = 0; at < steps.length; at += 1) {
    const step = steps[at] ?? '';
    const index = Number(steps[at + 1]);
    if (step === 'parts' && Number.isInteger(index)) words.push(`Part ${'abcdefghijkl'[index] ?? index + 1}`);
    else if (step in lists && Number.isInteger(index)) words.push(`${lists[step]} ${index + 1}`);
    else if (step !== 'options') {
      words.push(words.length === 0 ? (lists[step] ?? capitalised(step)) : fieldWords(step));
      continue;
    } else continue;
    at += 1;
  }
  return words.join(', ');
}

function fieldWords(field: string): string {
  const words: Record<string, string> = { prompt: 'what is asked', id: 'name', except: 'exceptions' };
  return words[field] ?? field;
}

function capitalised(word: string): string {
  return word.charAt(0).toUpperCase() + word.slice(1);
}
