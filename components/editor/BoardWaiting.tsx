import { sheet as texts } from '@/lib/text/en/board';

/** The empty film while the board is fetched. */
export const BoardWaiting = () => (
  <div className="film grid min-h-dvh place-items-center">
    <p role="status" className="bg-paper px-4 py-2 text-ink-soft">
      {texts.loading}
    </p>
  </div>
);
