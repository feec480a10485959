/** The sign of the product: two levels and the stroke between them. Decorative; the name stands beside it. */
export function WordmarkSign({ className = 'h-5 w-7' }: { className?: string }) {
  return (
    <svg viewBox="0 0 28 20" aria-hidden="true" focusable="false" className={className} fill="none" strokeWidth={2.6}>
      <path d="M1.5 4h11M15.5 16h11" stroke="currentColor" strokeLinecap="square" />
      <path d="M9 19 19 1" className="stroke-madder" />
    </svg>
  );
}
