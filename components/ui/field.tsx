import type { ReactNode } from 'react';

/** A label beside its control. */
export function Field({ label, children }: { label: string; children: ReactNode }) {
  return (
    // biome-ignore lint/a11y/noLabelWithoutControl: the control is the child
    <label className="flex min-w-0 flex-wrap items-center gap-x-2">
      <span className="text-[0.8125rem] text-muted">{label}</span>
      {children}
    </label>
  );
}

export const controlLook =
  'h-8 min-w-0 max-w-full rounded-md border border-rule bg-raised px-2 text-ink hover:border-muted';
