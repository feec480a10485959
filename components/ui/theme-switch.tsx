'use client';

import { useState } from 'react';
import { applyTheme, type Theme } from './theme';

const choices: readonly { theme: Theme; words: string }[] = [
  { theme: 'paper', words: 'paper' },
  { theme: 'night', words: 'night' },
  { theme: 'device', words: 'as the device' },
];

/** Three words that set the page's theme at once and keep the choice in a cookie for the next page's server. */
export function ThemeSwitch({ initial }: { initial: Theme }) {
  const [chosen, setChosen] = useState(initial);
  const choose = (theme: Theme) => {
    setChosen(theme);
    applyTheme(theme);
  };
  return (
    <div role="group" aria-label="Theme" className="flex flex-wrap gap-x-3">
      {choices.map(({ theme, words }) => (
        <button
          key={theme}
          type="button"
          aria-pressed={chosen === theme}
          onClick={() => choose(theme)}
          className="min-h-6 border-b-2 border-transparent hover:text-ink aria-pressed:border-madder aria-pressed:text-ink"
        >
          {words}
        </button>
      ))}
    </div>
  );
}
