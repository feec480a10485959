import { describe, expect, it } from 'vitest';
import { pressValue, readHandInForm, readPress } from '@/app/(student)/work/[setId]/_components/hand-in-form';
import { ago } from '@/app/(student)/work/[setId]/_components/saved-status';
import { symbolsFrom } from '@/app/(tools)/reading/_components/symbols-from';

function form(entries: Record<string, string>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(entries)) data.set(name, value);
  return data;
}

const filled = { drawId: 'd', clientKey: 'k', 'answer.a': 'S_x\r\n+ S_y', 'revision.a': '2', 'answer.b': '' };

describe('the bare form', () => {
  it.each([
    { part: 'a', confirmUnreadable: false },
    { part: 'all', confirmUnreadable: true },
  ])('carries the press %o in its button', (press) => {
    expect(readPress(pressValue(press))).toEqual(press);
  });

  it('saves everything typed and hands in what was pressed', () => {
    const { drafts, handIn } = readHandInForm(form({ ...filled, press: 'a:unreadable' }));
    expect(drafts).toEqual([
      { drawId: 'd', partKey: 'a', text: 'S_x\n+ S_y', baseRevision: 2 },
      { drawId: 'd', partKey: 'b', text: '', baseRevision: 0 },
    ]);
    expect(handIn).toEqual({
      drawId: 'd',
      clientKey: 'k',
      confirmUnreadable: true,
      answers: [{ partKey: 'a', text: 'S_x\n+ S_y' }],
    });
  });

  it('hands in all parts when all is pressed, and takes a form without anything as nothing', () => {
    expect(readHandInForm(form({ ...filled, press: 'all' })).handIn.answers).toHaveLength(2);
    expect(readHandInForm(form({})).handIn).toEqual({
      drawId: '',
      clientKey: '',
      confirmUnreadable: false,
      answers: [],
    });
  });
});

describe('the time since something was saved', () => {
  it.each([
    [0, 'just now'],
    [12_400, '12 s ago'],
    [180_000, '3 min ago'],
    [2 * 3_600_000, '2 h ago'],
  ])('of %d ms is "%s"', (milliseconds, words) => {
    expect(ago(milliseconds)).toBe(words);
  });
});

describe('declared symbols, as typed', () => {
  it('are names separated by commas or blanks; the rest comes back', () => {
    expect(symbolsFrom('omega, t  B_0;x')).toEqual({
      symbols: { omega: 'real', t: 'real', B_0: 'real', x: 'real' },
      faults: [],
    });
    expect(symbolsFrom('2x, a_b_c, ω, constructor')).toEqual({
      symbols: { constructor: 'real' },
      faults: ['2x', 'a_b_c', 'ω'],
    });
    expect(symbolsFrom('')).toEqual({ symbols: {}, faults: [] });
  });
});
