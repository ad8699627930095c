import Link from 'next/link';
import type { ReactNode } from 'react';
import { shell } from '@/lib/text/en/pages';
import type { PagePath } from './paths';
import { ScoreLine } from './ScoreLine';

export interface Crumb {
  readonly text: string;
  readonly href: PagePath;
}

interface PageProps {
  /** Name of who is signed in, or null. */
  readonly who: string | null;
  readonly trail?: readonly Crumb[];
  readonly title: ReactNode;
  /** Buttons and states beside the title. */
  readonly aside?: ReactNode;
  readonly lead?: ReactNode;
  /** Builders work on it with one hand: larger targets throughout. */
  readonly bench?: boolean;
  readonly narrow?: boolean;
  readonly children: ReactNode;
}

/** A page of the house: bar, trail, title, score line, content. The board does without. */
export function Page({ who, trail = [], title, aside, lead, bench, narrow, children }: PageProps) {
  const width = narrow ? 'max-w-[560px]' : 'max-w-[1240px]';
  return (
    <div data-bench={bench ? '' : undefined}>
      <Bar who={who} />
      <main id="content" className={`mx-auto grid gap-8 px-4 pt-6 pb-16 sm:px-6 ${width}`}>
        <header className="grid gap-3">
          {trail.length > 0 ? <Trail crumbs={trail} /> : null}
          <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3">
            <h1 className="min-w-0 text-xl md:text-2xl">{title}</h1>
            {aside === undefined ? null : <div className="flex flex-wrap items-center gap-x-3 gap-y-2">{aside}</div>}
          </div>
          <ScoreLine />
          {lead === undefined ? null : <div className="max-w-[68ch] text-ink-soft">{lead}</div>}
        </header>
        {children}
      </main>
    </div>
  );
}

export function Bar({ who }: { readonly who: string | null }) {
  const link = 'inline-flex min-h-11 items-center px-2 text-sm text-ink no-underline hover:underline';
  return (
    <div className="border-b border-rule bg-paper">
      <a href="#content" className="sr-only focus:not-sr-only">
        {shell.skip}
      </a>
      <nav aria-label={shell.main} className="mx-auto flex max-w-[1240px] items-center justify-between px-4 sm:px-6">
        <Link href="/" className="wordmark inline-flex min-h-11 items-center text-lg text-ink no-underline">
          {shell.wordmark}
        </Link>
        <div className="-mr-2 flex items-center gap-2">
          {who === null ? (
            <>
              <Link href="/sign-in" className={link}>
                {shell.signIn}
              </Link>
              <Link href="/sign-up" className={link}>
                {shell.signUp}
              </Link>
            </>
          ) : (
            <>
              <Link href="/w" className={link}>
                {shell.workshops}
              </Link>
              <Link href="/account" className={link} title={shell.account}>
                <span className="max-w-[16ch] truncate sm:max-w-none">{who}</span>
              </Link>
            </>
          )}
        </div>
      </nav>
    </div>
  );
}

function Trail({ crumbs }: { readonly crumbs: readonly Crumb[] }) {
  return (
    <nav aria-label={shell.breadcrumb}>
      <ol className="flex flex-wrap items-center gap-x-2 text-sm text-ink-soft">
        {crumbs.map(({ text, href }) => (
          <li key={href} className="flex items-center gap-2">
            <Link href={href} className="inline-flex min-h-6 items-center text-petrol bench:min-h-11">
              {text}
            </Link>
            <span aria-hidden="true">/</span>
          </li>
        ))}
      </ol>
    </nav>
  );
}

/** A part of a page under its own heading. */
export function Section({
  title,
  aside,
  children,
  id,
}: {
  readonly title: string;
  readonly aside?: ReactNode;
  readonly children: ReactNode;
  readonly id?: string;
}) {
  const headingId = id === undefined ? undefined : `${id}-title`;
  return (
    <section className="grid min-w-0 content-start gap-4" id={id} aria-labelledby={headingId}>
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-2">
        <h2 id={headingId} className="text-lg">
          {title}
        </h2>
        {aside}
      </div>
      {children}
    </section>
  );
}
