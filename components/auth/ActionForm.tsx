'use client';

import { useActionState } from 'react';
import { ui } from '@/lib/text/en/pages';
import { Button, type Weight } from '../ui/Button';
import { TextField } from '../ui/Field';
import { Notice } from '../ui/Notice';
import { BLANK, type FormAction } from './formState';

export interface FieldSpec {
  readonly name: string;
  readonly label: string;
  readonly type: 'text' | 'email' | 'password';
  readonly autoComplete: string;
  readonly hint?: string;
  readonly maxLength?: number;
  readonly value?: string;
}

interface ActionFormProps {
  readonly action: FormAction;
  readonly fields: readonly FieldSpec[];
  readonly submit: string;
  readonly hidden?: Readonly<Record<string, string>>;
  readonly weight?: Weight;
}

/** A form that the server answers. It is sent and answered without script as well. */
export function ActionForm({ action, fields, submit, hidden = {}, weight = 'primary' }: ActionFormProps) {
  const [state, send, pending] = useActionState(action, BLANK);
  return (
    <form action={send} className="grid gap-4" noValidate>
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      {state.message === undefined ? null : <Notice tone={state.message.tone} title={state.message.text} live />}
      {fields.map(({ value, ...field }) => (
        <TextField
          key={field.name}
          {...field}
          defaultValue={state.values[field.name] ?? value}
          error={state.fields[field.name]}
          required
        />
      ))}
      <div>
        <Button type="submit" weight={weight} disabled={pending}>
          {pending ? ui.working : submit}
        </Button>
      </div>
    </form>
  );
}
