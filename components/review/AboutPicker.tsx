'use client';

import type { Ref } from 'react';
import type { Anchor } from '@/lib/contract/bodies';
import { threads as words } from '@/lib/text/en/review';
import { Select } from '../ui/Field';
import { anchorOfChoice, type Subjects } from './anchors';

interface AboutPickerProps {
  readonly subjects: Subjects;
  readonly draft: Anchor | null;
  readonly onChoose: (anchor: Anchor | null) => void;
  readonly ref?: Ref<HTMLSelectElement>;
}

/** The way to a comment without a pointer: everything it can be about, in one list. */
export function AboutPicker({ subjects, draft, onChoose, ref }: AboutPickerProps) {
  const value = draft?.key !== undefined && draft.kind !== 'point' ? `${draft.kind}:${draft.key}` : '';
  return (
    <Select
      ref={ref}
      label={words.about}
      value={value}
      onChange={(event) => onChoose(anchorOfChoice(event.target.value))}
    >
      <option value="">{words.aboutNone}</option>
      <optgroup label={words.groupElements}>
        {subjects.elements.map(({ id, name }) => (
          <option key={id} value={`element:${id}`}>
            {name}
          </option>
        ))}
      </optgroup>
      {subjects.parts.length === 0 ? null : (
        <optgroup label={words.groupParts}>
          {subjects.parts.map(({ key, name }) => (
            <option key={key} value={`part:${key}`}>
              {name}
            </option>
          ))}
        </optgroup>
      )}
      <optgroup label={words.groupFigures}>
        {subjects.figures.map(({ id, name }) => (
          <option key={id} value={`figure:${id}`}>
            {name}
          </option>
        ))}
      </optgroup>
    </Select>
  );
}
