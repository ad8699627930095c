'use client';

import { useState } from 'react';
import { FigureList } from '@/components/figures/FigureList';
import { figureRows } from '@/components/figures/rows';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { WatchIcon } from '@/components/ui/icons';
import { header, figures as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { useBoard, useBoardState } from '../useBoard';
import { FigureCell } from './FigureCell';
import { FigureExplained } from './FigureExplained';
import { figureName, STRIP_IDS, type StripId } from './readings';

type Open = StripId | 'all' | 'remarks';

const isFigure = (open: Open | null): open is StripId => open !== null && open !== 'all' && open !== 'remarks';

/** At the foot, always in sight: the figures that decide; each opens, and all the others are one click away. */
export function FiguresStrip() {
  const [open, setOpen] = useState<Open | null>(null);
  const close = () => setOpen(null);
  return (
    <section aria-label={texts.title} className="border-t border-ink-soft bg-paper">
      <div className="grid grid-cols-2 sm:grid-cols-3 md:grid-cols-5 lg:grid-cols-[repeat(9,minmax(0,1fr))]">
        {STRIP_IDS.map((id) => (
          <FigureCell key={id} id={id} onOpen={setOpen} />
        ))}
      </div>
      <Foot onOpen={setOpen} />
      <Dialog open={open === 'all'} title={texts.more} onClose={close} wide>
        <AllFigures />
      </Dialog>
      <Dialog open={open === 'remarks'} title={texts.remarks} onClose={close} wide>
        <Remarks />
      </Dialog>
      <Dialog open={isFigure(open)} title={isFigure(open) ? figureName(open) : ''} onClose={close}>
        {isFigure(open) ? <FigureExplained id={open} /> : null}
      </Dialog>
    </section>
  );
}

/** The ways to everything else, and why there are no figures when there are none. */
function Foot({ onOpen }: { readonly onOpen: (open: Open) => void }) {
  const count = useBoardState((state) => state.settled?.problems.length ?? 0);
  const fault = useBoardState((state) => state.figuresFault);
  return (
    <div className="flex flex-wrap items-center gap-x-4 border-t border-rule px-2 text-sm">
      <Button weight="bare" onClick={() => onOpen('all')}>
        {texts.more}
      </Button>
      {count === 0 ? null : (
        <Button weight="bare" data-testid="remarks" onClick={() => onOpen('remarks')}>
          <WatchIcon />
          {fill(texts.remarkCount, { count })}
        </Button>
      )}
      <span className="text-xs text-ink-soft">{texts.estimate}</span>
      {fault === null ? null : (
        <p role="alert" className="text-bad">
          {fill(texts.failed, { message: fault })}
        </p>
      )}
    </div>
  );
}

/** What the figures remark about the airframe, each with the field it is about. */
function Remarks() {
  const problems = useBoardState((state) => state.settled?.problems ?? null);
  return (
    <ul className="grid list-disc gap-2 pl-5">
      {problems?.map(({ code, path, message, fix }) => (
        <li key={`${code} ${path} ${message}`}>
          {message} {path === '' ? null : <code className="figure text-sm text-ink-soft">{path}</code>}
          {fix === undefined ? null : <span className="block text-sm text-ink-soft">{fix}</span>}
        </li>
      ))}
    </ul>
  );
}

/** What the figures count: theories that can be left out, to see what they do. */
function Counted() {
  const board = useBoard();
  const corrections = useBoardState((state) => state.corrections);
  return (
    <fieldset className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm">
      <legend className="float-left pr-2 text-ink-soft">{texts.counts}</legend>
      {COUNTS.map(([key, name]) => (
        <label key={key} className="flex min-h-6 items-center gap-1.5 bench:min-h-11">
          <input
            type="checkbox"
            checked={corrections[key]}
            onChange={(event) => board.setCorrections({ ...corrections, [key]: event.target.checked })}
          />
          {name}
        </label>
      ))}
      <span className="text-xs text-ink-soft">{texts.countNote}</span>
    </fieldset>
  );
}

const COUNTS = [
  ['bodies', texts.countBodies],
  ['propellers', texts.countPropellers],
] as const;

/** Every figure of the draft under its heading, with its curves, in the units of the board. */
function AllFigures() {
  const board = useBoard();
  const settled = useBoardState((state) => state.settled);
  const system = useBoardState((state) => state.system);
  if (settled === null) return <p>{texts.working}</p>;
  const other = system === 'metric' ? 'imperial' : 'metric';
  const label = fill(header.units, { system: header[system], other: header[other] });
  return (
    <div className="grid grid-cols-1 gap-3">
      <Button className="figure justify-self-start" aria-label={label} onClick={() => board.setSystem(other)}>
        {header[system]}
      </Button>
      <Counted />
      <FigureList rows={figureRows(settled, undefined, system)} charts={settled.charts} system={system} />
    </div>
  );
}
