'use client';

import { useState } from 'react';
import { type Theme, themeCookie } from './theme';

const choices: readonly { theme: Theme; words: string }[] = [
  { theme: 'paper', words: 'paper' },
  { theme: 'night', words: 'night' },
  { theme: 'device', words: 'as the device' },
];

const year = 365 * 24 * 3600;

/** Three words that set the page's theme at once and keep the choice in a cookie for the next page's server. */
export function ThemeSwitch({ initial }: { initial: Theme }) {
  const [chosen, setChosen] = useState(initial);
  const choose = (theme: Theme) => {
    setChosen(theme);
    if (theme === 'device') delete document.documentElement.dataset.theme;
    else document.documentElement.dataset.theme = theme;
    const life = theme === 'device' ? 0 : year;
    document.cookie = `${themeCookie}=${theme}; path=/; max-age=${life}; samesite=lax`;
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
