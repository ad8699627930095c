'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';
import { api } from '@/client/api';
import { dropTry } from '@/client/kept';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { apiPaths, paths } from '@/components/ui/paths';
import { useAct } from '@/components/ui/useAct';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DesignSummary } from '@/lib/contract/answers';
import { tryOut as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { readTry } from './state/keptTry';

/** For a designer whose browser holds an aircraft drawn without an account: makes a design of it. Nothing is shown when there is none. */
export function BringTry({ workshopId }: { readonly workshopId: string }) {
  const router = useRouter();
  const [airframe, setAirframe] = useState<Airframe | null>(null);
  const { busy, problem, act } = useAct();
  useEffect(() => {
    let gone = false;
    readTry().then((found) => {
      if (!gone && found !== null && typeof found !== 'string') setAirframe(found);
    });
    return () => {
      gone = true;
    };
  }, []);
  if (airframe === null) return null;
  const bring = () =>
    act(async () => {
      const { data } = await api.post<DesignSummary>(apiPaths.designs(workshopId), { name: airframe.name, airframe });
      dropTry();
      // The way back must lead to a list that holds the new design.
      router.refresh();
      router.push(paths.board(workshopId, data.id));
    });
  return (
    <Notice tone="good" title={texts.bring}>
      <div className="grid justify-items-start gap-2">
        <p>{fill(texts.bringHint, { name: airframe.name })}</p>
        <Button weight="primary" disabled={busy} onClick={bring}>
          {texts.bringYes}
        </Button>
        {problem === null ? null : <p className="text-bad">{fill(texts.bringFailed, { message: problem.message })}</p>}
      </div>
    </Notice>
  );
}
