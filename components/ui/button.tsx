import type { ButtonHTMLAttributes } from 'react';

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  /** The one thing that the page is for. */
  main?: boolean;
  /** Low enough to stand in a line with a figure's words. */
  low?: boolean;
}

export function Button({ main = false, low = false, className = '', ...rest }: ButtonProps) {
  const look = main ? 'border-ink bg-ink text-paper' : 'border-rule bg-raised text-ink hover:border-muted';
  return (
    <button
      type="button"
      className={`rounded-md border px-2 ${low ? 'py-0.5' : 'py-1.5'} font-medium max-sm:text-[0.8125rem] sm:px-3 disabled:opacity-45 disabled:hover:border-rule ${look} ${className}`}
      {...rest}
    />
  );
}
