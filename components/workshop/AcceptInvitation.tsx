'use client';

import { useRouter } from 'next/navigation';
import { api } from '@/client/api';
import type { WorkshopSummary } from '@/lib/contract/answers';
import { invite as words } from '@/lib/text/en/pages';
import { Button } from '../ui/Button';
import { Notice } from '../ui/Notice';
import { apiPaths, paths } from '../ui/paths';
import { useAct } from '../ui/useAct';

/** One button: join. What stands in the way is said in the server's own words. */
export function AcceptInvitation({ token }: { readonly token: string }) {
  const router = useRouter();
  const { busy, problem, act } = useAct();
  const join = () =>
    act(async () => {
      const { data } = await api.post<WorkshopSummary>(apiPaths.accept(token));
      router.push(paths.workshop(data.id));
      router.refresh();
    });
  return (
    <div className="grid gap-4">
      {problem === null ? null : <Notice tone="bad" title={problem.message} live />}
      <div>
        <Button weight="primary" onClick={join} disabled={busy}>
          {words.accept}
        </Button>
      </div>
    </div>
  );
}
