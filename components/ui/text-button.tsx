import type { ButtonHTMLAttributes } from 'react';

/** A button that is a word: for what is at hand everywhere and asks for no attention. */
export function TextButton({ className = '', ...rest }: ButtonHTMLAttributes<HTMLButtonElement>) {
  return (
    <button
      type="button"
      className={`py-1 text-muted underline decoration-rule underline-offset-4 hover:text-ink hover:decoration-ink aria-expanded:text-ink disabled:opacity-50 disabled:hover:text-muted ${className}`}
      {...rest}
    />
  );
}
