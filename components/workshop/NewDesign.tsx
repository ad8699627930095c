'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { api } from '@/client/api';
import type { DesignSummary } from '@/lib/contract/answers';
import type { Vec2 } from '@/lib/numerics/vec';
import { ui, designs as words } from '@/lib/text/en/pages';
import { Thumbnail } from '../thumbnail/Thumbnail';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { TextField } from '../ui/Field';
import { Notice } from '../ui/Notice';
import { apiPaths, paths } from '../ui/paths';
import { useAct } from '../ui/useAct';

export interface LayoutChoice {
  readonly id: string;
  readonly name: string;
  readonly what: string;
  readonly outlines: readonly (readonly Vec2[])[];
}

interface NewDesignProps {
  readonly workshopId: string;
  readonly layouts: readonly LayoutChoice[];
}

/** Pick a starting layout by its picture, give it a name, and go to the board. */
export function NewDesign({ workshopId, layouts }: NewDesignProps) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button weight="primary" onClick={() => setOpen(true)}>
        {words.newDesign}
      </Button>
      <Dialog open={open} title={words.newDesign} onClose={() => setOpen(false)} wide>
        <NewDesignForm workshopId={workshopId} layouts={layouts} />
      </Dialog>
    </>
  );
}

function NewDesignForm({ workshopId, layouts }: NewDesignProps) {
  const router = useRouter();
  const [layout, setLayout] = useState(layouts[0]?.id ?? '');
  const [name, setName] = useState('');
  const { busy, problem, setProblem, act } = useAct();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (name.trim() === '') return setProblem({ message: '', fields: { name: ui.required } });
    await act(async () => {
      const { data } = await api.post<DesignSummary>(apiPaths.designs(workshopId), { name: name.trim(), layout });
      // The way back must lead to a list that holds the new design.
      router.refresh();
      router.push(paths.board(workshopId, data.id));
    });
  };
  return (
    <form onSubmit={submit} className="grid gap-5" noValidate>
      <LayoutPicker layouts={layouts} chosen={layout} onChoose={setLayout} />
      <TextField
        label={words.name}
        hint={words.nameHint}
        value={name}
        maxLength={80}
        onChange={(event) => setName(event.target.value)}
        error={problem?.fields.name}
        required
      />
      {problem === null || problem.message === '' ? null : <Notice tone="bad" title={problem.message} live />}
      <div>
        <Button type="submit" weight="primary" disabled={busy}>
          {words.make}
        </Button>
      </div>
    </form>
  );
}

interface LayoutPickerProps {
  readonly layouts: readonly LayoutChoice[];
  readonly chosen: string;
  readonly onChoose: (layoutId: string) => void;
}

/** Layouts by their pictures. */
function LayoutPicker({ layouts, chosen, onChoose }: LayoutPickerProps) {
  return (
    <fieldset>
      <legend className="mb-2 text-sm font-[560]">{words.layout}</legend>
      <div className="grid gap-3 sm:grid-cols-2 md:grid-cols-4">
        {layouts.map((each) => (
          <label
            key={each.id}
            className="grid cursor-pointer content-start gap-2 rounded-cut border border-rule p-2 has-checked:border-2 has-checked:border-tape has-checked:p-[7px] has-focus-visible:outline-2 has-focus-visible:outline-petrol"
          >
            <Thumbnail outlines={each.outlines} label="" />
            <span className="flex items-start gap-2 text-sm">
              <input
                type="radio"
                name="layout"
                value={each.id}
                checked={chosen === each.id}
                onChange={() => onChoose(each.id)}
                className="mt-1 shrink-0"
              />
              <span>
                <span className="font-[560]">{each.name}</span>
                <span className="dense block text-ink-soft">{each.what}</span>
              </span>
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
