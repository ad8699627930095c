// Signs of the balance, 16 px: told apart by shape, not by colour alone.

/** Centre of gravity: a disc quartered light and dark, as drawing offices mark it. */
export const CgSign = () => (
  <svg viewBox="0 0 16 16" width="16" height="16" aria-hidden="true" className="block">
    <circle cx="8" cy="8" r="6.5" fill="var(--paper)" stroke="currentColor" strokeWidth="1.5" />
    <path d="M8 8V1.5A6.5 6.5 0 0 1 14.5 8zM8 8v6.5A6.5 6.5 0 0 1 1.5 8z" fill="currentColor" />
  </svg>
);

/** Neutral point: a triangle, the knife edge that the aircraft would balance its lift on. */
export const NpSign = () => (
  <svg viewBox="0 0 16 16" width="16" height="16" aria-hidden="true" className="block">
    <path d="M8 2.5 14 14H2z" fill="var(--paper)" stroke="currentColor" strokeWidth="1.5" />
  </svg>
);
