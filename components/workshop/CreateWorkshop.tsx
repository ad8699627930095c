'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { api } from '@/client/api';
import type { WorkshopSummary } from '@/lib/contract/answers';
import { ui, workshops as words } from '@/lib/text/en/pages';
import { Button } from '../ui/Button';
import { TextField } from '../ui/Field';
import { apiPaths, paths } from '../ui/paths';
import { useAct } from '../ui/useAct';

/** Name a workshop and walk in. */
export function CreateWorkshop() {
  const router = useRouter();
  const [name, setName] = useState('');
  const { busy, problem, setProblem, act } = useAct();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (name.trim() === '') return setProblem({ message: '', fields: { name: ui.required } });
    await act(async () => {
      const { data } = await api.post<WorkshopSummary>(apiPaths.workshops, { name: name.trim() });
      router.push(paths.workshop(data.id));
      router.refresh();
    });
  };
  return (
    <form onSubmit={submit} className="grid max-w-[420px] gap-3" noValidate>
      <TextField
        label={words.name}
        hint={words.nameHint}
        value={name}
        maxLength={80}
        onChange={(event) => setName(event.target.value)}
        error={problem?.fields.name ?? problem?.message}
        required
      />
      <div>
        <Button type="submit" weight="primary" disabled={busy}>
          {words.made}
        </Button>
      </div>
    </form>
  );
}
