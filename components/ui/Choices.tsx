import { useId } from 'react';
import { described, FieldError } from './Field';

export interface Choice<T extends string> {
  readonly value: T;
  readonly label: string;
  readonly hint?: string;
}

interface ChoicesProps<T extends string> {
  readonly kind: 'checkbox' | 'radio';
  readonly name: string;
  readonly legend: string;
  readonly choices: readonly Choice<T>[];
  readonly chosen: readonly T[];
  /** Without it the fieldset keeps its own state and is read from the form. */
  readonly onChange?: (chosen: readonly T[]) => void;
  readonly error?: string;
  readonly hideLegend?: boolean;
}

/** A set of check boxes or radio buttons under one legend, each with a line that says what it means. */
export function Choices<T extends string>(props: ChoicesProps<T>) {
  const { kind, name, legend, choices, chosen, onChange, error, hideLegend } = props;
  const id = useId();
  const pick = (value: T, on: boolean) => {
    if (kind === 'radio') return [value];
    return choices.map((choice) => choice.value).filter((each) => (each === value ? on : chosen.includes(each)));
  };
  return (
    <fieldset className="grid gap-1" {...described(id, { error })}>
      <legend className={hideLegend ? 'sr-only' : 'mb-1 text-sm font-[560]'}>{legend}</legend>
      {choices.map(({ value, label, hint }) => {
        const state = onChange
          ? { checked: chosen.includes(value), onChange: (on: boolean) => onChange(pick(value, on)) }
          : { defaultChecked: chosen.includes(value) };
        return (
          <label key={value} className="flex items-start gap-3 py-1 bench:py-2.5 pointer-coarse:py-2.5">
            <input
              type={kind}
              name={name}
              value={value}
              className="mt-1 size-4 shrink-0"
              {...state}
              onChange={state.onChange ? (event) => state.onChange(event.target.checked) : undefined}
            />
            <span>
              {label}
              {hint === undefined ? null : <span className="block text-sm text-ink-soft">{hint}</span>}
            </span>
          </label>
        );
      })}
      <FieldError id={`${id}-error`} error={error} />
    </fieldset>
  );
}
