import type { Route } from 'next';
import Link from 'next/link';
import type { ButtonHTMLAttributes, ReactNode } from 'react';

export type Weight = 'primary' | 'plain' | 'bare' | 'danger';

const BASE =
  'inline-flex items-center justify-center gap-2 rounded-cut px-4 py-1.5 text-sm font-[560] no-underline transition-colors ' +
  'min-h-9 bench:min-h-11 pointer-coarse:min-h-11 disabled:cursor-not-allowed disabled:opacity-55';

const WEIGHTS: Record<Weight, string> = {
  primary: 'bg-petrol text-on-petrol hover:bg-[color-mix(in_srgb,var(--petrol)_86%,var(--ink))]',
  plain: 'border border-ink-soft bg-paper text-ink hover:border-ink hover:bg-board',
  bare: 'px-2 text-petrol underline decoration-rule hover:decoration-current',
  danger: 'border border-bad bg-paper text-bad hover:bg-[color-mix(in_srgb,var(--bad)_10%,var(--paper))]',
};

export const buttonClass = (weight: Weight, extra = ''): string => `${BASE} ${WEIGHTS[weight]} ${extra}`;

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  readonly weight?: Weight;
}

/** A push button; `type` is "button" unless it says "submit", so that no button sends a form by accident. */
export function Button({ weight = 'plain', type = 'button', className, ...rest }: ButtonProps) {
  return <button type={type} className={buttonClass(weight, className)} {...rest} />;
}

interface LinkButtonProps<T extends string> {
  readonly href: Route<T>;
  readonly weight?: Weight;
  readonly className?: string;
  readonly children: ReactNode;
  readonly 'aria-label'?: string;
}

/** A link that looks like a button: it goes somewhere and changes nothing. */
export function LinkButton<T extends string>({ href, weight = 'plain', className, ...rest }: LinkButtonProps<T>) {
  return <Link href={href} className={buttonClass(weight, className)} {...rest} />;
}

/** A plain link to a file that the browser keeps. */
export function DownloadLink({
  href,
  children,
  weight = 'primary',
}: {
  readonly href: string;
  readonly children: ReactNode;
  readonly weight?: Weight;
}) {
  return (
    <a href={href} download className={buttonClass(weight)}>
      {children}
    </a>
  );
}
