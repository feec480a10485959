import { typeset } from '@/lib/typeset';
import { ScrollReach } from './scroll-reach';
import './typeset.css';

export interface TypesetProps {
  /** TeX written by our own printer, without dollar signs. */
  readonly latex: string;
  /** The same as a plain line, read out instead of the picture: "minus i hbar S z". */
  readonly plain?: string;
  /** On a line of its own, centred, scrolling in itself when it is too wide. */
  readonly display?: boolean;
}

/** Mathematics, typeset by the server. What cannot be typeset is shown as its plain line or its TeX, never as an error. */
export function Typeset({ latex, plain, display = false }: TypesetProps) {
  const set = typeset(latex, display);
  if (!set.ok) {
    return <code title={set.message}>{plain ?? latex}</code>;
  }
  const picture = <span dangerouslySetInnerHTML={{ __html: set.html }} />;
  const named = plain ? (
    <span role="img" aria-label={plain}>
      {picture}
    </span>
  ) : (
    picture
  );
  return display ? (
    <ScrollReach inline>
      <span className="typeset-display">{named}</span>
    </ScrollReach>
  ) : (
    named
  );
}
