import { board } from '@/lib/text/en/board';

/** Stands while the board, or a page below it, is fetched. */
export default function Loading() {
  return (
    <div className="film grid min-h-dvh place-items-center">
      <p role="status" className="bg-paper px-4 py-2 text-ink-soft">
        {board.fetching}
      </p>
    </div>
  );
}
