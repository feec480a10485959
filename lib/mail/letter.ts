import { renderMarkdown } from '@/lib/markdown';

/** One piece of a letter, in reading order. */
export type LetterPart =
  | { kind: 'paragraph'; text: string }
  | { kind: 'link'; label: string; href: string }
  | { kind: 'note'; text: string }
  | { kind: 'heading'; text: string }
  /** The name of a piece under a heading: a part of a question. */
  | { kind: 'subheading'; text: string }
  /** A line that matters: a mark, a total. */
  | { kind: 'strong'; text: string }
  | { kind: 'list'; lines: readonly string[] }
  /** Words after a few that say what they are. */
  | { kind: 'labelled'; label: string; text: string }
  /** What somebody typed, letter for letter, after a few words that say what it is. */
  | { kind: 'typed'; label: string; text: string }
  /** What a teacher wrote; its formulas stand as TeX, because a mail reader has no stylesheet of ours. */
  | { kind: 'markdown'; label?: string; source: string };

/** A message as it is written once; both its forms are made from this. */
export type Letter = { subject: string; title: string; parts: readonly LetterPart[] };

/** A message ready to hand over: the same content as plain text and as HTML. */
export type RenderedLetter = { subject: string; text: string; html: string };

const ink = '#1F2430';
const faint = '#55606F';
const blue = '#243F73';
const paper = '#FBF8F1';
const line = '#E3DCC8';
const mono = "'Noto Sans Mono', Consolas, Menlo, monospace";
const serif = "'Noto Serif', Georgia, 'Times New Roman', serif";

/** Makes the two forms of a letter. The HTML uses no picture, no script and no address but those of its links. */
export function renderLetter(letter: Letter): RenderedLetter {
  return { subject: letter.subject.replace(/[\r\n]+/g, ' '), text: renderText(letter), html: renderHtml(letter) };
}

/** Text as it may stand in HTML, between tags or inside a quoted attribute. */
export function escapeHtml(text: string): string {
  const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
  return text.replace(/[&<>"']/g, (character) => entities[character] ?? character);
}

function renderText(letter: Letter): string {
  const parts = letter.parts.map((part) => {
    switch (part.kind) {
      case 'paragraph':
      case 'strong':
      case 'note':
        return wrap(part.text);
      case 'heading':
        return `${wrap(part.text)}\n${'-'.repeat(Math.min(part.text.length, 76))}`;
      case 'subheading':
        return `${part.text}.`;
      case 'labelled':
        return `${part.label}:\n${indent(part.text)}`;
      case 'list':
        return part.lines.map((line) => wrap(`- ${line}`)).join('\n');
      case 'typed':
        return `${part.label}:\n${indent(part.text)}`;
      case 'markdown':
        return part.label === undefined ? part.source.trim() : `${part.label}:\n${indent(part.source.trim())}`;
      case 'link':
        return `${part.label}:\n${part.href}`;
    }
  });
  return `${[letter.title, ...parts].join('\n\n')}\n\n-- \nHalfmark\n`;
}

function renderHtml(letter: Letter): string {
  const parts = letter.parts.map((part) => {
    switch (part.kind) {
      case 'paragraph':
        return `<p style="margin:0 0 16px">${escapeHtml(part.text)}</p>`;
      case 'strong':
        return `<p style="margin:0 0 16px;font-weight:bold">${escapeHtml(part.text)}</p>`;
      case 'heading':
        return `<h2 style="margin:28px 0 12px;padding-top:16px;border-top:1px solid ${line};font-size:18px;line-height:1.35">${escapeHtml(part.text)}</h2>`;
      case 'subheading':
        return `<h3 style="margin:24px 0 6px;font-size:16px;line-height:1.35">${escapeHtml(part.text)}</h3>`;
      case 'labelled':
        return `<p style="margin:0 0 12px">${labelHtml(part.label)}${escapeHtml(part.text)}</p>`;
      case 'list':
        return `<ul style="margin:0 0 16px;padding-left:22px">${part.lines.map((text) => `<li>${escapeHtml(text)}</li>`).join('')}</ul>`;
      case 'typed':
        return (
          `<p style="margin:0 0 12px">${labelHtml(part.label)}<code style="font-family:${mono};font-size:14px;` +
          `white-space:pre-wrap;word-break:break-word">${escapeHtml(part.text)}</code></p>`
        );
      case 'markdown':
        return `<div style="margin:0 0 12px">${part.label === undefined ? '' : labelHtml(part.label)}${markdownHtml(part.source)}</div>`;
      case 'note':
        return `<p style="margin:0 0 16px;color:${faint};font-size:14px">${escapeHtml(part.text)}</p>`;
      case 'link':
        return linkHtml(part.label, part.href);
    }
  });
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escapeHtml(letter.subject)}</title></head>
<body style="margin:0;background:${paper};color:${ink};font-family:${serif};font-size:16px;line-height:1.55">
<div style="max-width:34rem;margin:0 auto;padding:32px 24px">
<h1 style="margin:0 0 20px;font-size:22px;line-height:1.3">${escapeHtml(letter.title)}</h1>
${parts.join('\n')}
<p style="margin:32px 0 0;padding-top:12px;border-top:1px solid ${line};color:${faint};font-size:14px">Halfmark</p>
</div>
</body>
</html>
`;
}

/** Markdown with paragraphs as close as those around it; raw HTML is text in it, so each `<p>` is the renderer's own. */
function markdownHtml(source: string): string {
  return renderMarkdown(source, { tex: 'source' }).replaceAll('<p>', '<p style="margin:0 0 8px">');
}

function linkHtml(label: string, href: string): string {
  const address = escapeHtml(href);
  return (
    `<p style="margin:0 0 8px"><a href="${address}" style="display:inline-block;padding:10px 18px;background:${blue};` +
    `color:#FFFFFF;text-decoration:none;border-radius:3px">${escapeHtml(label)}</a></p>\n` +
    `<p style="margin:0 0 16px;color:${faint};font-size:14px;word-break:break-all">${address}</p>`
  );
}

function labelHtml(label: string): string {
  return `<span style="color:${faint};font-size:14px">${escapeHtml(label)}</span><br>`;
}

/** Sets a text of any number of lines apart, without breaking its lines. */
function indent(text: string): string {
  return text
    .split(/\r?\n/)
    .map((row) => `    ${row}`)
    .join('\n');
}

/** Breaks lines at blanks so that none is longer than 76 characters, as mail readers expect of plain text. */
function wrap(text: string): string {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(/\s+/)) {
    if (line !== '' && line.length + 1 + word.length > 76) {
      lines.push(line);
      line = word;
    } else {
      line = line === '' ? word : `${line} ${word}`;
    }
  }
  return [...lines, line].join('\n');
}
