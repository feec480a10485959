// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Mark } from '@/components/ui/mark';
import { VerdictSign } from '@/components/ui/verdict-sign';

afterEach(cleanup);

const words = { agrees: 'Agrees', differs: 'Differs', undecided: 'Undecided', unreadable: 'Unreadable' } as const;
const verdicts = Object.keys(words) as (keyof typeof words)[];

describe('VerdictSign', () => {
  for (const size of ['line', 'margin'] as const) {
    it(`shows the sign first and then the words (${size})`, () => {
      for (const verdict of verdicts) {
        const { container } = render(<VerdictSign verdict={verdict} size={size} detail="slip: sign" />);
        const sign = container.querySelector('svg');
        expect(sign?.getAttribute('aria-hidden')).toBe('true');
        expect(container.textContent).toMatch(new RegExp(`^${words[verdict]}(, )?slip: sign$`));
        const first = container.firstElementChild?.firstElementChild;
        expect(first).toBe(sign);
        cleanup();
      }
    });
  }

  it('has a shape of its own for each verdict, so that colour only helps', () => {
    const shapes = verdicts.map((verdict) => {
      const { container } = render(<VerdictSign verdict={verdict} />);
      return container.querySelector('svg')?.innerHTML;
    });
    expect(new Set(shapes).size).toBe(verdicts.length);
  });
});

describe('Mark', () => {
  it('reads as a sentence, also while there is no credit', () => {
    expect(render(<Mark credit="2.5" of="4" state="suggested" />).container.textContent).toBe('2.5of 4, suggested');
    cleanup();
    expect(render(<Mark credit={null} of="4" />).container.textContent).toContain('not marked yet,of 4');
  });

  it('tells nought from nothing', () => {
    expect(render(<Mark credit={0} of={4} />).container.textContent).toBe('0of 4');
  });
});
