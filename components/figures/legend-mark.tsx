import type { ReactNode } from 'react';

const marks = {
  'line-rain': <path d="M0 6H16" className="stroke-rain" strokeWidth="2.4" />,
  'line-trail': <path d="M0 6H16" className="stroke-rain" strokeWidth="1" opacity="0.6" />,
  'line-plum': <path d="M0 6H16" className="stroke-plum" strokeWidth="1.8" />,
  'line-rust': <path d="M0 6H16" className="stroke-rust" strokeWidth="1.4" />,
  dot: <circle cx="8" cy="6" r="5" className="fill-rain" />,
  diamond: <path d="M8 1l5 5l-5 5l-5 -5z" className="stroke-rust" strokeWidth="1.2" fill="none" />,
};

/** One entry of a legend: the mark as the figure draws it, and what it stands for. */
export function LegendMark({ mark, children }: { mark: keyof typeof marks; children: ReactNode }) {
  return (
    <span className="inline-flex items-center gap-1.5">
      <svg viewBox="0 0 16 12" className="h-3 w-4" aria-hidden="true">
        {marks[mark]}
      </svg>
      {children}
    </span>
  );
}
