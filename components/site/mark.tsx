/** Fine rain: three slanted strokes, each a little fainter than the one before. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg
      viewBox="0 0 24 24"
      className={className}
      aria-hidden="true"
      fill="none"
      strokeWidth="2.2"
      strokeLinecap="round"
    >
      <path d="M3 17 8 4" className="stroke-rain" />
      <path d="M10 20 15 7" className="stroke-rain" strokeOpacity="0.7" />
      <path d="M17.5 17 21 8" className="stroke-rain" strokeOpacity="0.45" />
    </svg>
  );
}
