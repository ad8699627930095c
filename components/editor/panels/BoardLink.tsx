'use client';

import type { Route } from 'next';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import type { MouseEvent, ReactNode } from 'react';
import { buttonClass, type Weight } from '@/components/ui/Button';
import { useBoard } from '../useBoard';

interface BoardLinkProps<T extends string> {
  readonly href: Route<T>;
  readonly weight?: Weight;
  readonly children: ReactNode;
}

/** A way on from the board. What is not saved yet is saved first, so that the next page shows it. */
export function BoardLink<T extends string>({ href, weight = 'bare', children }: BoardLinkProps<T>) {
  const board = useBoard();
  const router = useRouter();
  const leave = (event: MouseEvent<HTMLAnchorElement>) => {
    const { sync, save } = board.store.getState();
    const elsewhere = event.metaKey || event.ctrlKey || event.shiftKey || event.button !== 0;
    if (sync === null || save.kind === 'saved' || elsewhere) return;
    event.preventDefault();
    // A refusal stays on the board, which says why; the way on is open again once it is mended.
    sync.flush().then((saved) => {
      if (saved) router.push(href);
    });
  };
  return (
    <Link href={href} onClick={leave} className={buttonClass(weight)}>
      {children}
    </Link>
  );
}
