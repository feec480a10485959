import { renderInlineMarkdown, renderMarkdown } from '@/lib/markdown';
import { ScrollReach } from './scroll-reach';
import './typeset.css';

export interface MarkdownProps {
  readonly source: string;
  /** Set in a line, without paragraphs: prompts beside a part's letter, comments in a margin. */
  readonly inline?: boolean;
}

/** An author's Markdown with TeX. Safe to set as HTML because renderMarkdown escapes everything but its own tags. */
export function Markdown({ source, inline = false }: MarkdownProps) {
  return inline ? (
    <span dangerouslySetInnerHTML={{ __html: renderInlineMarkdown(source) }} />
  ) : (
    <ScrollReach>
      <div className="prose" dangerouslySetInnerHTML={{ __html: renderMarkdown(source) }} />
    </ScrollReach>
  );
}
