// @vitest-environment happy-dom
import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { AnswerField } from '@/components/math/answer-field';
import { type ReadAnswer } from '@/components/math/use-reading';

const faultAt = (text: string) => Array.from(text).indexOf('?');

/** Reads anything as itself, but for a question mark; a slash is ambiguous. */
const read: ReadAnswer = vi.fn((text: string) => {
  const start = faultAt(text);
  if (start >= 0) {
    return {
      readable: false,
      latex: '',
      plain: '',
      ambiguous: false,
      diagnostics: [
        {
          code: 'unexpected' as const,
          span: { start, end: start + 1 },
          message: 'A question mark has no meaning here.',
          hint: 'Leave it out.',
        },
      ],
    };
  }
  const slash = text.indexOf('/');
  return {
    readable: true,
    latex: text,
    plain: `spoken ${text}`,
    ambiguous: slash >= 0,
    diagnostics:
      slash >= 0
        ? [
            {
              code: 'ambiguous' as const,
              span: { start: slash, end: slash + 1 },
              message: 'The slash divides all before it.',
            },
          ]
        : [],
  };
});

beforeEach(() => {
  vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] });
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
  vi.clearAllMocks();
});

const field = () => screen.getByRole<HTMLTextAreaElement>('textbox', { name: 'Answer to part a' });
const type = (value: string) => fireEvent.change(field(), { target: { value } });
/** Lets time pass in short steps, because React renders only between them. */
const rest = async (milliseconds: number) => {
  for (let left = milliseconds; left > 0; left -= 20) await act(() => vi.advanceTimersByTimeAsync(20));
};
const show = (props: Partial<Parameters<typeof AnswerField>[0]> = {}) =>
  render(<AnswerField name="a" label="Answer to part a" kind="scalar" symbols={{}} read={read} {...props} />);

describe('AnswerField', () => {
  it('shows a readable answer almost at once and announces it after a rest', async () => {
    show();
    type('x + 1');
    await rest(100);
    expect(screen.getByRole('img', { name: 'spoken x + 1' })).toBeTruthy();
    expect(screen.getByRole('status').textContent).toBe('');
    await rest(1000);
    expect(screen.getByRole('status').textContent).toBe('Read as: spoken x + 1');
    expect(field().getAttribute('aria-describedby')?.split(' ')).toContain(screen.getByRole('status').id);
  });

  it('does not scold in the middle of a formula, then says what and marks where, counting code points', async () => {
    show();
    type('𝟙 + ? + 1');
    await rest(300);
    expect(screen.queryByText(/question mark/)).toBeNull();
    expect(field().hasAttribute('aria-invalid')).toBe(false);
    await rest(400);
    expect(screen.getAllByText(/A question mark has no meaning here\. Leave it out\./).length).toBeGreaterThan(0);
    expect(document.querySelector('mark')?.textContent).toBe('?');
    expect(field().getAttribute('aria-invalid')).toBe('true');
    await rest(1000);
    expect(screen.getByRole('status').textContent).toBe(
      'Not readable. A question mark has no meaning here. Leave it out.',
    );
  });

  it('never says that a text is unreadable once it has been mended', async () => {
    show();
    type('a ?');
    await rest(300);
    type('a');
    await rest(2000);
    expect(screen.queryByText(/question mark/)).toBeNull();
    expect(screen.getByRole('status').textContent).toBe('Read as: spoken a');
  });

  it('notes that there are two ways to read an answer', async () => {
    show();
    type('a/2b');
    await rest(1200);
    expect(screen.getByText('Two ways to read this.')).toBeTruthy();
    expect(screen.getByRole('status').textContent).toContain('The slash divides all before it.');
  });

  it('keeps what is typed exactly, and gives no form of answer away', () => {
    show({ defaultValue: '  x^2 / 2 ' });
    expect(field().value).toBe('  x^2 / 2 ');
    expect(field().hasAttribute('placeholder')).toBe(false);
    expect(field().getAttribute('spellcheck')).toBe('false');
    expect(field().hasAttribute('maxlength')).toBe(false);
  });

  it('tells its page the reading, and null for an empty field', async () => {
    const onReading = vi.fn();
    show({ onReading, defaultValue: 'x' });
    expect(onReading).toHaveBeenLastCalledWith(expect.objectContaining({ text: 'x', readable: true }));
    type('');
    await rest(100);
    expect(onReading).toHaveBeenLastCalledWith(null);
    expect(screen.getByText('What you type is shown back here as it is read.')).toBeTruthy();
  });

  it('reads again when it is told of other symbols', async () => {
    const { rerender } = show({ defaultValue: 'x', symbols: { x: 'real' } });
    rerender(
      <AnswerField
        name="a"
        label="Answer to part a"
        kind="scalar"
        read={read}
        defaultValue="x"
        symbols={{ x: 'positive' }}
      />,
    );
    await rest(100);
    expect(read).toHaveBeenLastCalledWith('x', expect.objectContaining({ symbols: { x: 'positive' } }));
  });

  it("reads with the checker's own reader when it is given no other", async () => {
    show({ read: undefined, symbols: { omega: 'positive' } });
    type('hbar*omega/2');
    await rest(100);
    expect(screen.getByRole('img').getAttribute('aria-label')).toContain('omega');
    type('hbar*omega/');
    await rest(700);
    expect(document.querySelector('mark')).not.toBeNull();
    expect(field().getAttribute('aria-invalid')).toBe('true');
  });

  it('belongs to a form elsewhere on the page', () => {
    show({ id: 'q1-a', form: 'q1' });
    expect(field().id).toBe('q1-a');
    expect(field().getAttribute('form')).toBe('q1');
  });
});
