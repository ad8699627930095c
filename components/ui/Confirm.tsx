'use client';

import { type ReactNode, useState } from 'react';
import { ui } from '@/lib/text/en/pages';
import { Button, type Weight } from './Button';
import { Dialog } from './Dialog';
import { Notice } from './Notice';
import { useAct } from './useAct';

interface ConfirmProps {
  readonly label: string;
  readonly title: string;
  readonly body: ReactNode;
  readonly confirm: string;
  readonly onConfirm: () => Promise<void>;
  readonly weight?: Weight;
}

/** A button for an act that can't be taken back: it asks once, and stays open with the reason when the act fails. */
export function Confirm({ label, title, body, confirm, onConfirm, weight = 'danger' }: ConfirmProps) {
  const [open, setOpen] = useState(false);
  const { busy, problem, act } = useAct();
  const confirmed = async () => {
    if (await act(onConfirm)) setOpen(false);
  };
  return (
    <>
      <Button weight={weight} onClick={() => setOpen(true)}>
        {label}
      </Button>
      <Dialog open={open} title={title} onClose={() => setOpen(false)}>
        <div>{body}</div>
        {problem === null ? null : <Notice tone="bad" title={problem.message} live />}
        <div className="flex flex-wrap gap-3">
          <Button weight="danger" onClick={confirmed} disabled={busy}>
            {confirm}
          </Button>
          <Button onClick={() => setOpen(false)}>{ui.cancel}</Button>
        </div>
      </Dialog>
    </>
  );
}
