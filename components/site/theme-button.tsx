'use client';

import { chooseTheme, currentTheme } from '@/lib/client/theme';

/** Changes between light and dark; until it is used the system's own setting holds. */
export function ThemeButton() {
  return (
    <button
      type="button"
      onClick={() => chooseTheme(currentTheme() === 'dark' ? 'light' : 'dark')}
      className="flex items-center gap-2 py-2 text-muted hover:text-ink"
    >
      <svg viewBox="0 0 16 16" className="size-4" aria-hidden="true">
        <circle cx="8" cy="8" r="6.5" fill="none" stroke="currentColor" strokeWidth="1.4" />
        <path d="M8 1.5a6.5 6.5 0 0 1 0 13z" fill="currentColor" />
      </svg>
      Light or dark
    </button>
  );
}
