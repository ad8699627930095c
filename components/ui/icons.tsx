import type { ReactNode } from 'react';

/** One hand, one weight: 16 px, square ends, drawn here. */
export function Icon({ children, className = '' }: { readonly children: ReactNode; readonly className?: string }) {
  return (
    <svg
      viewBox="0 0 16 16"
      width="16"
      height="16"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      aria-hidden="true"
      className={`inline-block shrink-0 ${className}`}
    >
      {children}
    </svg>
  );
}

export const GoodIcon = () => (
  <Icon>
    <path d="M2.5 8.5 6 12l7.5-8" />
  </Icon>
);
export const WatchIcon = () => (
  <Icon>
    <path d="M8 2 14.5 13.5h-13zM8 6.5v3.2M8 11v1.3" />
  </Icon>
);
export const BadIcon = () => (
  <Icon>
    <path d="M5.2 1.75h5.6l3.45 3.45v5.6l-3.45 3.45H5.2L1.75 10.8V5.2zM5.5 5.5l5 5M10.5 5.5l-5 5" />
  </Icon>
);
export const SeenIcon = () => (
  <Icon>
    <path d="M1.5 8C4 4.2 12 4.2 14.5 8 12 11.8 4 11.8 1.5 8z" />
    <circle cx="8" cy="8" r="1.6" />
  </Icon>
);
export const FrozenIcon = () => (
  <Icon>
    <path d="M3 7h10v6.5H3zM5 7V4.8a3 3 0 0 1 6 0V7" />
  </Icon>
);
export const OpenMark = ({ className = '' }: { readonly className?: string }) => (
  <Icon className={className}>
    <path d="m6 3.5 4.5 4.5L6 12.5" />
  </Icon>
);
export const CommentIcon = () => (
  <Icon>
    <path d="M2 2.5h12v8H8.5L5 13.5v-3H2z" />
  </Icon>
);
