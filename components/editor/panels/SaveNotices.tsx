'use client';

import type { ReactNode } from 'react';
import { Button, LinkButton } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { figures as figureTexts, save as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import type { SaveState } from '../state/saver';
import { useBoard, useBoardState } from '../useBoard';
import { downloadAirframe } from './download';

const Acts = ({ children }: { readonly children: ReactNode }) => (
  <div className="mt-1 flex flex-wrap items-center gap-2">{children}</div>
);

/** What a person has to know or choose about saving. Nothing is shown while all is well. */
export function SaveNotices() {
  const board = useBoard();
  const save = useBoardState((state) => state.save);
  const notice = useBoardState((state) => state.notice);
  return (
    <div className="grid gap-px empty:hidden">
      <SaveTrouble save={save} />
      {notice === null ? null : (
        <Notice tone="watch" live>
          <span className="flex flex-wrap items-center justify-between gap-x-4">
            {notice}
            <Button weight="bare" onClick={() => board.store.setState({ notice: null })}>
              {texts.dismiss}
            </Button>
          </span>
        </Notice>
      )}
    </div>
  );
}

function SaveTrouble({ save }: { readonly save: SaveState }) {
  const board = useBoard();
  const sync = useBoardState((state) => state.sync);
  const mine = (
    <Button onClick={() => downloadAirframe(board.store.getState().history.present)}>{texts.downloadMine}</Button>
  );
  switch (save.kind) {
    case 'off':
    case 'saved':
    case 'waiting':
    case 'saving':
      return null;
    case 'offline':
      return (
        <Notice tone="watch" live>
          {texts.offline}
          <Acts>
            <Button onClick={() => sync?.retry()}>{texts.retry}</Button>
            {mine}
          </Acts>
        </Notice>
      );
    case 'signedOut':
      return (
        <Notice tone="watch" live>
          {texts.signedOut}
          <Acts>
            <LinkButton href="/sign-in">{texts.signIn}</LinkButton>
            {mine}
          </Acts>
        </Notice>
      );
    case 'stale':
      return (
        <Notice tone="bad" live>
          {fill(texts.stale, { by: save.theirs.savedBy })}
          <Acts>
            <Button weight="primary" onClick={() => sync?.take(save.theirs)}>
              {texts.takeTheirs}
            </Button>
            <span className="text-ink-soft">{texts.takeTheirsHint}</span>
            {mine}
          </Acts>
        </Notice>
      );
    case 'refused':
      return (
        <Notice tone="bad" live>
          {fill(texts.refused, { title: save.problem.detail ?? save.problem.title })}
          <ul className="list-disc pl-5">
            {save.problem.errors?.map(({ path, message, fix }) => (
              <li key={`${path} ${message}`}>
                {fill(figureTexts.field, { message: fix === undefined ? message : `${message} ${fix}`, path })}
              </li>
            ))}
          </ul>
          <Acts>{mine}</Acts>
        </Notice>
      );
  }
}
