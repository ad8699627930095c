/** The divider of the house: a long-dash hairline with a small notch where the blade went in. */
export function ScoreLine({ className = '' }: { readonly className?: string }) {
  return (
    <svg height="8" className={`block w-full text-ink-soft ${className}`} aria-hidden="true">
      <path d="M0 2.5h3l3 4 3-4" fill="none" stroke="currentColor" />
      <line x1="9" y1="2.5" x2="100%" y2="2.5" stroke="currentColor" strokeDasharray="20 5" />
    </svg>
  );
}
