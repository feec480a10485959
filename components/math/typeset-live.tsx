'use client';

import { lazy, Suspense } from 'react';
import { refusedTex } from '@/lib/tex-guard';
import { ScrollReach } from './scroll-reach';
import './typeset.css';

const BlockMath = lazy(async () => ({ default: (await import('react-katex')).BlockMath }));
const InlineMath = lazy(async () => ({ default: (await import('react-katex')).InlineMath }));

export interface TypesetLiveProps {
  /** TeX written by our own printer. */
  readonly latex: string;
  /** What is read out, and what is shown while the typesetter is on its way or cannot set the formula. */
  readonly plain: string;
  readonly display?: boolean;
}

/** Mathematics typeset in the browser, for what changes as a person types; KaTeX is loaded when the first formula comes. */
export function TypesetLive({ latex, plain, display = false }: TypesetLiveProps) {
  const words = <code>{plain}</code>;
  if (refusedTex(latex) !== null) return words;
  const Formula = display ? BlockMath : InlineMath;
  const formula = (
    <Suspense fallback={words}>
      <Formula math={latex} renderError={() => words} />
    </Suspense>
  );
  return display ? (
    <ScrollReach>
      <div role="img" aria-label={plain} className="typeset-display">
        {formula}
      </div>
    </ScrollReach>
  ) : (
    <span role="img" aria-label={plain}>
      {formula}
    </span>
  );
}
