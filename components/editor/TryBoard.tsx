'use client';

import { useEffect, useMemo, useState } from 'react';
import { Button, LinkButton } from '@/components/ui/Button';
import type { LayoutChoice } from '@/components/workshop/NewDesign';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { tryOut as texts } from '@/lib/text/en/board';
import { BoardFrame } from './BoardFrame';
import { readTry } from './state/keptTry';
import { keepTrying } from './state/trySync';
import { TryStart } from './TryStart';
import { BoardProvider, useBoard } from './useBoard';

/** The board without an account: choose a layout, shape it, keep it in this browser until there is an account. */
export function TryBoard({ layouts }: { readonly layouts: readonly LayoutChoice[] }) {
  const [airframe, setAirframe] = useState<Airframe | null>(null);
  const [kept, setKept] = useState<Airframe | string | null>(null);
  useEffect(() => {
    let gone = false;
    readTry().then(
      (found) => {
        if (!gone) setKept(found);
      },
      (error: unknown) => {
        if (!gone) setKept(String(error));
      },
    );
    return () => {
      gone = true;
    };
  }, []);
  if (airframe === null) {
    const start = ({ id, name }: LayoutChoice) => setAirframe(startFrom(id, name));
    return <TryStart layouts={layouts} kept={kept} onStart={start} onGoOn={setAirframe} />;
  }
  return <TrySheet airframe={airframe} onAgain={() => setAirframe(null)} />;
}

function TrySheet({ airframe, onAgain }: { readonly airframe: Airframe; readonly onAgain: () => void }) {
  const options = useMemo(
    () => ({ airframe, readOnly: false, save: { kind: 'off' }, system: 'metric' }) as const,
    [airframe],
  );
  return (
    <BoardProvider options={options}>
      <KeepHere />
      <BoardFrame
        title={airframe.name}
        standing={texts.lead}
        savedWords={texts.kept}
        lead={
          <LinkButton href="/" weight="bare">
            {texts.home}
          </LinkButton>
        }
        links={
          <>
            <Button onClick={onAgain}>{texts.again}</Button>
            <LinkButton href="/sign-up" weight="primary">
              {texts.signUp}
            </LinkButton>
          </>
        }
      />
    </BoardProvider>
  );
}

function KeepHere() {
  const board = useBoard();
  useEffect(() => keepTrying(board), [board]);
  return null;
}
