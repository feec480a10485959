import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { renderInlineMarkdown, renderMarkdown } from '@/lib/markdown';

describe('renderMarkdown', () => {
  it('lets links lead to http and https only, and marks them', () => {
    expect(renderMarkdown('[a](https://example.org/x)')).toBe(
      '<p><a href="https://example.org/x" rel="noopener noreferrer nofollow">a</a></p>\n',
    );
    for (const target of [
      'javascript:alert(1)',
      'data:text/html;base64,PHNjcmlwdD4=',
      'vbscript:x',
      'mailto:a@example.org',
      'JaVaScRiPt:alert(1)',
      '//example.org',
      'file:///etc/passwd',
      '&#106;avascript:alert(1)',
      '/inside',
    ]) {
      expect(renderMarkdown(`[a](${target})`), target).not.toContain('<a');
      expect(renderMarkdown(`<${target}>`), target).not.toContain('<a');
      expect(renderMarkdown(`[a]\n\n[a]: ${target}`), target).not.toContain('<a');
    }
  });

  it('shows raw HTML as text, and an image as a link', () => {
    expect(renderMarkdown('<script>alert(1)</script>')).toContain('&lt;script&gt;');
    expect(renderMarkdown('a <b onclick="x">b</b>')).toContain('&lt;b onclick=&quot;x&quot;&gt;');
    expect(renderMarkdown('![a](https://example.org/a.png)')).not.toContain('<img');
  });

  it('typesets TeX, inline and displayed', () => {
    const inline = renderMarkdown('With $H = \\frac{\\hbar}{2}\\,\\vec\\omega\\cdot\\vec\\sigma$ given.');
    expect(inline).toContain('class="katex"');
    expect(inline).toContain('<math');
    expect(inline).not.toContain('katex-display');
    for (const source of ['$$a^2$$', 'before\n$$\na\n+ b\n$$\nafter', 'in a line $$a^2$$ too']) {
      expect(renderMarkdown(source), source).toContain('katex-display');
    }
  });

  it('leaves alone dollars that are not TeX, and emphasis inside TeX', () => {
    expect(renderMarkdown('It costs $5 and $10.')).toBe('<p>It costs $5 and $10.</p>\n');
    expect(renderMarkdown('\\$a$')).toBe('<p>$a$</p>\n');
    expect(renderMarkdown('`$a$`')).toBe('<p><code>$a$</code></p>\n');
    expect(renderMarkdown('$a_1 b_1$')).not.toContain('<em>');
    expect(renderMarkdown('$$\nunclosed')).toContain('$$');
  });

  it('keeps a table', () => {
    expect(renderMarkdown('| a | b |\n| - | - |\n| $x$ | 2 |')).toContain('<table>');
  });

  it('shows TeX that it will not set as its source with a reason', () => {
    for (const tex of [
      '\\href{javascript:alert(1)}{x}',
      '\\htmlClass{a}{x}',
      '\\includegraphics{x}',
      '\\undefinedcommand',
      '\\frac{1',
      '\\def\\a{\\a\\a}\\a',
      '{'.repeat(5000) + '}'.repeat(5000),
    ]) {
      const html = renderInlineMarkdown(`$${tex}$`);
      expect(html.includes('class="tex-unset"') || html.includes('mathcolor="#cc0000"'), tex.slice(0, 40)).toBe(true);
      expect(html, tex.slice(0, 40)).not.toMatch(/<a |<img|href="javascript/);
    }
  });

  it('bounds sizes', () => {
    const html = renderInlineMarkdown('$\\rule{9999em}{9999em}$');
    expect(html).not.toContain('9999em;');
    expect(html).toContain('12em');
  });

  it('shows TeX as it was written where no stylesheet goes along', () => {
    expect(renderMarkdown('a $x^2$ <b>', { tex: 'source' })).toBe('<p>a <code>x^2</code> &lt;b&gt;</p>\n');
  });

  it('never throws and never lets a tag of the author through', () => {
    const bits = fc.constantFrom(
      '$', '$$', '\\', '{', '}', '<', '>', '"', "'", '[', ']', '(', ')', '|', '\n', ' ', '*', '_', '`', '-', '&lt;',
      'a', '1', '\\frac', '\\href', '<script>', '<img src=x onerror=y>', 'javascript:', 'https://a.example', '![',
    ); // prettier-ignore
    fc.assert(
      fc.property(fc.array(bits, { maxLength: 30 }), (parts) => {
        const html = renderMarkdown(parts.join(''));
        // Every attribute value is double-quoted and its quotes escaped, so what is left after taking them out is tags.
        expect(html.replace(/"[^"]*"/g, '""')).not.toMatch(/<script|<img|<[a-z]+ [^>]*\bon[a-z]+=/i);
        expect(html).not.toMatch(/href="(?!https?:)/i);
      }),
      { numRuns: 2000 },
    );
  });
});
