'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import { type DraftPlace, useDraft } from '@/client/drafts';
import { QueryProvider } from '@/client/query';
import { paths } from '@/components/ui/paths';
import type { DesignSummary, DraftAnswer } from '@/lib/contract/answers';
import { header as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { BoardFrame } from './BoardFrame';
import { BoardLink } from './panels/BoardLink';
import { type DraftSync, syncDraft, watchDraft } from './state/draftSync';
import { BoardProvider, useBoard, useBoardState } from './useBoard';

export interface BoardProps {
  readonly place: DraftPlace;
  readonly draft: DraftAnswer;
  readonly latest: DesignSummary['latestRevision'];
  readonly may: { readonly save: boolean; readonly release: boolean; readonly print: boolean };
}

/** How often a newer draft is looked for while nothing is being done. */
const LOOK_EVERY_MS = 5_000;

/** The building board of one design's draft. */
export function Board(props: BoardProps) {
  const { draft, may } = props;
  const options = useMemo(
    () =>
      ({
        airframe: draft.airframe,
        readOnly: !may.save,
        save: { kind: may.save ? 'saved' : 'off' },
        system: 'metric',
      }) as const,
    [draft, may.save],
  );
  return (
    <QueryProvider>
      <BoardProvider options={options}>
        <DraftTie place={props.place} draft={draft} />
        <BoardFrame
          title={draft.designName}
          standing={<Standing latest={props.latest} />}
          lead={<BoardLink href={paths.workshop(props.place.workshopId)}>{texts.back}</BoardLink>}
          links={<Links {...props} />}
          savedWords={may.save ? undefined : texts.readOnly}
        />
      </BoardProvider>
    </QueryProvider>
  );
}

/** Ties the board to the draft on the server and looks for newer ones. It shows nothing itself. */
function DraftTie(props: Pick<BoardProps, 'place' | 'draft'>) {
  const board = useBoard();
  // The draft that the board began with: one that the page brings later comes in by the same way as everybody else's.
  const [{ place, draft }] = useState(props);
  const tie = useRef<DraftSync | null>(null);
  const busy = useBoardState(({ gesture, save }) => gesture !== null || (save.kind !== 'saved' && save.kind !== 'off'));
  const { data } = useDraft(place, { everyMs: LOOK_EVERY_MS, paused: busy });
  useEffect(() => {
    const made = board.readOnly ? watchDraft(board, draft) : syncDraft(board, place, draft);
    tie.current = made;
    return () => made.stop();
  }, [board, place, draft]);
  useEffect(() => {
    if (data !== undefined) tie.current?.arrived(data);
  }, [data]);
  return null;
}

function Standing({ latest }: Pick<BoardProps, 'latest'>) {
  const released =
    latest === null
      ? texts.noRevision
      : fill(texts.latest, { number: latest.number, state: texts.states[latest.state] });
  return (
    <>
      {texts.draft} · {released}
    </>
  );
}

function Links({ place, latest, may }: BoardProps) {
  const { workshopId, designId } = place;
  return (
    <>
      {latest === null ? null : (
        <BoardLink href={paths.review(workshopId, designId, latest.number)}>{texts.review}</BoardLink>
      )}
      <BoardLink href={paths.revisions(workshopId, designId)}>{texts.revisions}</BoardLink>
      {may.print ? <BoardLink href={paths.printDraft(workshopId, designId)}>{texts.print}</BoardLink> : null}
      {may.release ? (
        <BoardLink href={paths.release(workshopId, designId)} weight="primary">
          {texts.release}
        </BoardLink>
      ) : null}
    </>
  );
}
