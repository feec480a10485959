import createMarkdownIt, { type MarkdownIt, type StateBlock, type StateInline } from 'markdown-it';
import { typeset } from './typeset';

export interface MarkdownOptions {
  /** `typeset` (default) for pages; `source` shows TeX as it was written, for mail, which has no stylesheet of ours. */
  readonly tex?: 'typeset' | 'source';
}

/**
 * Markdown to HTML: CommonMark with tables, `$…$` and `$$…$$` as TeX. Raw HTML comes out as text, images as links, and
 * links lead to http and https only. A `|` inside TeX in a table is written `\vert`, because it ends the cell otherwise.
 * A `$` opens TeX when no space follows it and closes it when no space precedes it and no digit follows; `\$` is a dollar.
 */
export function renderMarkdown(source: string, { tex = 'typeset' }: MarkdownOptions = {}): string {
  return renderers[tex].render(source);
}

/** The same for a text that stands in a line, without paragraphs. */
export function renderInlineMarkdown(source: string, { tex = 'typeset' }: MarkdownOptions = {}): string {
  return renderers[tex].renderInline(source);
}

const renderers = { typeset: createRenderer(typesetToHtml), source: createRenderer(sourceToHtml) };

function createRenderer(toHtml: (latex: string, display: boolean) => string): MarkdownIt {
  const markdown = createMarkdownIt({ html: false, linkify: false, typographer: false, breaks: false, maxNesting: 40 });
  markdown.disable('image');
  markdown.validateLink = (url) => /^https?:\/\//i.test(url.trim());
  markdown.inline.ruler.before('escape', 'tex', readInlineTex);
  markdown.block.ruler.before('fence', 'tex_display', readDisplayTex, {
    alt: ['paragraph', 'reference', 'blockquote', 'list'],
  });
  markdown.renderer.rules.tex = (tokens, index) => toHtml(tokens[index]?.content ?? '', false);
  markdown.renderer.rules.tex_display = (tokens, index) => toHtml(tokens[index]?.content ?? '', true);
  markdown.renderer.rules.link_open = (tokens, index, options, _env, renderer) => {
    tokens[index]?.attrSet('rel', 'noopener noreferrer nofollow');
    return renderer.renderToken(tokens, index, options);
  };
  return markdown;
}

/** `$ tex $` and `$$ tex $$` inside a line of text. */
function readInlineTex(state: StateInline, silent: boolean): boolean {
  const { src, pos, posMax } = state;
  if (src[pos] !== '$') return false;
  const fence = src[pos + 1] === '$' ? '$$' : '$';
  const start = pos + fence.length;
  if (fence === '$' && /\s/.test(src[start] ?? ' ')) return false;
  const end = findClosing(src, start, posMax, fence);
  if (end === -1) return false;
  if (!silent) {
    const token = state.push(fence === '$$' ? 'tex_display' : 'tex', 'math', 0);
    token.content = src.slice(start, end).trim();
  }
  state.pos = end + fence.length;
  return true;
}

function findClosing(src: string, start: number, posMax: number, fence: '$' | '$$'): number {
  for (let at = start; at < posMax; at += 1) {
    if (src[at] === '\\') at += 1;
    else if (src.startsWith(fence, at) && at + fence.length <= posMax && closesHere(src, start, at, fence)) return at;
  }
  return -1;
}

function closesHere(src: string, start: number, at: number, fence: '$' | '$$'): boolean {
  if (src.slice(start, at).trim() === '') return false;
  return fence === '$$' || (!/\s/.test(src[at - 1] ?? ' ') && !/[0-9]/.test(src[at + 1] ?? ''));
}

/** `$$` at the start of a line, TeX over any number of lines without an empty one, `$$` at the end of a line. */
function readDisplayTex(state: StateBlock, startLine: number, endLine: number, silent: boolean): boolean {
  const begin = (state.bMarks[startLine] ?? 0) + (state.tShift[startLine] ?? 0);
  if (!state.src.startsWith('$$', begin)) return false;
  for (let line = startLine; line < endLine && !(line > startLine && state.isEmpty(line)); line += 1) {
    const text = state.src.slice(begin, state.eMarks[line]).trimEnd();
    if (text.length > 4 && text.endsWith('$$') && text.indexOf('$$', 2) === text.length - 2) {
      if (!silent) {
        const token = state.push('tex_display', 'math', 0);
        token.block = true;
        token.content = text.slice(2, -2).trim();
        token.map = [startLine, line + 1];
        state.line = line + 1;
      }
      return true;
    }
  }
  return false;
}

function typesetToHtml(latex: string, display: boolean): string {
  const set = typeset(latex, display);
  if (!set.ok) return `<code class="tex-unset" title="${escapeHtml(set.message)}">${escapeHtml(latex)}</code>`;
  return display ? `<span class="tex-display">${set.html}</span>` : set.html;
}

function sourceToHtml(latex: string, display: boolean): string {
  const source = `<code>${escapeHtml(latex)}</code>`;
  return display ? `<br>${source}<br>` : source;
}

function escapeHtml(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
}
