'use client';

import { type ReactNode, useEffect, useId, useRef } from 'react';
import { ui } from '@/lib/text/en/pages';
import { Button } from './Button';

interface DialogProps {
  readonly open: boolean;
  readonly title: string;
  readonly onClose: () => void;
  readonly children: ReactNode;
  readonly wide?: boolean;
}

/** The browser's own modal dialog: it keeps focus inside, Escape closes it, focus returns to what opened it. */
export function Dialog({ open, title, onClose, children, wide = false }: DialogProps) {
  const box = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = box.current;
    if (!dialog) return;
    if (open && !dialog.open) dialog.showModal();
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={box}
      aria-labelledby={titleId}
      onClose={onClose}
      className={`m-auto w-[calc(100vw-32px)] rounded-cut border border-ink-soft bg-paper p-0 text-ink ${wide ? 'max-w-[880px]' : 'max-w-[480px]'}`}
    >
      {open ? (
        <div className="grid gap-4 p-5">
          <div className="flex items-start justify-between gap-4">
            <h2 id={titleId} className="text-lg">
              {title}
            </h2>
            <Button weight="bare" onClick={onClose}>
              {ui.close}
            </Button>
          </div>
          {children}
        </div>
      ) : null}
    </dialog>
  );
}
