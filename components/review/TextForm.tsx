'use client';

import { type FormEvent, useState } from 'react';
import { ui } from '@/lib/text/en/pages';
import { threads as words } from '@/lib/text/en/review';
import { Button } from '../ui/Button';
import { TextArea } from '../ui/Field';
import { useAct } from '../ui/useAct';

interface TextFormProps {
  readonly label: string;
  readonly submit: string;
  /** The typed text stays when this fails. */
  readonly onSend: (text: string) => Promise<unknown>;
  readonly onCancel?: () => void;
  readonly autoFocus?: boolean;
}

/** One paragraph to send. */
export function TextForm({ label, submit, onSend, onCancel, autoFocus }: TextFormProps) {
  const [text, setText] = useState('');
  const { busy, problem, setProblem, act } = useAct();
  const send = async (event: FormEvent) => {
    event.preventDefault();
    if (text.trim() === '') return setProblem({ message: words.emptyText, fields: {} });
    if (await act(() => onSend(text.trim()))) setText('');
  };
  return (
    <form onSubmit={send} className="grid gap-2" noValidate>
      <TextArea
        label={label}
        value={text}
        onChange={(event) => setText(event.target.value)}
        error={problem?.fields.text ?? problem?.message}
        maxLength={4000}
        autoFocus={autoFocus}
      />
      <div className="flex flex-wrap gap-2">
        <Button type="submit" weight="primary" disabled={busy}>
          {submit}
        </Button>
        {onCancel === undefined ? null : <Button onClick={onCancel}>{ui.cancel}</Button>}
      </div>
    </form>
  );
}
