import {
  type ComponentProps,
  type InputHTMLAttributes,
  type ReactNode,
  type TextareaHTMLAttributes,
  useId,
} from 'react';
import { BadIcon } from './icons';

const BOX =
  'block w-full rounded-cut border border-ink-soft bg-paper px-3 py-1.5 text-base text-ink min-h-9 bench:min-h-11 ' +
  'pointer-coarse:min-h-11 aria-invalid:border-bad aria-invalid:border-2 placeholder:text-ink-soft';

interface FieldText {
  readonly label: string;
  readonly hint?: string;
  readonly error?: string;
}

interface FrameProps extends FieldText {
  readonly id: string;
  readonly children: ReactNode;
}

/** Label above, control, hint, and the error at its place. */
function Frame({ id, label, hint, error, children }: FrameProps) {
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="text-sm font-[560]">
        {label}
      </label>
      {children}
      {hint === undefined ? null : (
        <p id={`${id}-hint`} className="text-sm text-ink-soft">
          {hint}
        </p>
      )}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
}

export function FieldError({ id, error }: { readonly id: string; readonly error?: string }) {
  if (error === undefined || error === '') return null;
  return (
    <p id={id} className="flex items-start gap-2 text-sm text-bad [&>svg]:mt-0.5">
      <BadIcon />
      {error}
    </p>
  );
}

/** What aria needs to know: which lines explain the control, and whether it is wrong. */
export const described = (id: string, { hint, error }: Partial<FieldText>) => {
  const ids = [hint === undefined ? '' : `${id}-hint`, error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return { 'aria-describedby': ids === '' ? undefined : ids, 'aria-invalid': error ? true : undefined };
};

export function TextField({ label, hint, error, ...rest }: FieldText & InputHTMLAttributes<HTMLInputElement>) {
  const id = useId();
  return (
    <Frame id={id} label={label} hint={hint} error={error}>
      <input id={id} className={BOX} {...described(id, { hint, error })} {...rest} />
    </Frame>
  );
}

export function TextArea({
  label,
  hint,
  error,
  rows = 3,
  ...rest
}: FieldText & TextareaHTMLAttributes<HTMLTextAreaElement>) {
  const id = useId();
  return (
    <Frame id={id} label={label} hint={hint} error={error}>
      <textarea id={id} rows={rows} className={BOX} {...described(id, { hint, error })} {...rest} />
    </Frame>
  );
}

export function Select({ label, hint, error, children, ...rest }: FieldText & ComponentProps<'select'>) {
  const id = useId();
  return (
    <Frame id={id} label={label} hint={hint} error={error}>
      <select id={id} className={BOX} {...described(id, { hint, error })} {...rest}>
        {children}
      </select>
    </Frame>
  );
}
