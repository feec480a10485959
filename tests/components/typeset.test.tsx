// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Typeset } from '@/components/math/typeset';
import { TypesetLive } from '@/components/math/typeset-live';
import { refusedTex } from '@/lib/tex-guard';
import { markDiffering, typeset } from '@/lib/typeset';

afterEach(cleanup);

describe('Typeset', () => {
  it('is read out as its plain line', () => {
    render(<Typeset latex="\frac{\hbar}{2}" plain="hbar over 2" />);
    const picture = screen.getByRole('img', { name: 'hbar over 2' });
    expect(picture.querySelector('math')).not.toBeNull();
    expect(picture.querySelector('.katex-html')).not.toBeNull();
  });

  it('leaves the reading to MathML when there is no plain line', () => {
    const { container } = render(<Typeset latex="x" display />);
    expect(container.querySelector('[role=img]')).toBeNull();
    expect(container.querySelector('.katex-display math')).not.toBeNull();
  });

  it('falls back to words', () => {
    render(<Typeset latex="\frac{" plain="a fraction" />);
    expect(screen.getByText('a fraction').tagName).toBe('CODE');
  });
});

describe('typeset', () => {
  it('refuses what is too long, too deep or not allowed', () => {
    expect(typeset('x'.repeat(20_001), false).ok).toBe(false);
    expect(typeset('{'.repeat(9000) + '}'.repeat(9000), false).ok).toBe(false);
    expect(typeset('\\def\\a{\\a}\\a', false).ok).toBe(false);
  });

  it('marks a differing element with a line and the colour that the stylesheet knows', () => {
    const set = typeset(markDiffering('2-i'), false);
    expect(set.ok && set.html).toContain('color:#96283a');
    expect(set.ok && set.html).toContain('underline-line');
  });
});

describe('TypesetLive', () => {
  it('shows the words first and the formula when the typesetter has come', async () => {
    const { container } = render(<TypesetLive latex="\sqrt{2}" plain="root 2" display />);
    expect(screen.getByRole('img', { name: 'root 2' }).textContent).toBe('root 2');
    await expect.poll(() => container.querySelector('.katex-display')).not.toBeNull();
  });

  it('shows words for TeX that our printer never writes', () => {
    const { container } = render(<TypesetLive latex="\href{https://example.org}{x}" plain="x" />);
    expect(container.innerHTML).toBe('<code>x</code>');
    for (const tex of [
      '\\def\\a{b}',
      '\\gdef\\a{b}',
      '\\rule{1em}{1em}',
      '\\htmlData{a=b}{x}',
      '\\newcommand\\a b',
      '\\let\\a b',
    ])
      expect(refusedTex(tex), tex).not.toBeNull();
    for (const tex of ['\\rho', '\\left(x\\right)', '\\hbar', '\\begin{pmatrix}a&b\\\\c&d\\end{pmatrix}', '\\delta'])
      expect(refusedTex(tex), tex).toBeNull();
  });
});
