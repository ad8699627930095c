import { analyse } from '@/lib/figures/analyse';
import { newMemory } from '@/lib/figures/memory';
import { bareSolve, lay } from './bareSolve';
import { type Drag, drags } from './drags';
import type { Example } from './examples';
import { bar, say } from './report';
import { medians, type Timed, timed, timeOf } from './timing';

/** The figures over assembly and both solves of the same lattice. */
const MOST = { live: 1.5, full: 4 } as const;
/** Unknowns that the bars are meant for. */
const USUAL = [90, 140] as const;
/** Long enough to be compiled before it is timed: at the first moves of a handle everything is slower. */
const ROUNDS = { warmUp: 200, rounds: 61 } as const;

/**
 * What the figures cost beyond the lattice's own solution, for each example, as the board's worker works them out: with its memory, on
 * documents that change a little from call to call. Live: at every move of a handle. Full: once the handle rests, the document that was
 * live last; and after a change that was typed in. Without a memory, for the first call on a page, it is only told.
 */
export async function analyseBench(examples: readonly Example[], unitMs: number): Promise<void> {
  say(
    'Figures over assembly and both solves of the same lattice, documents changing from call to call, with the memory',
  );
  for (const { name, airframe, input } of examples) {
    const lattice = lay(input);
    const bare = timed(() => bareSolve(lattice, input));
    /** Each thing by itself beside the bare solution: on a board nothing else runs between two moves of a handle. */
    const ratio = async (what: string, thing: Timed, most?: number) => {
      const times = await medians({ bare, thing }, ROUNDS);
      const [unit, time] = [timeOf(times, 'bare'), timeOf(times, 'thing')];
      const shown = `${name}, ${what}`;
      const ms = `${time.toFixed(2)} ms over ${unit.toFixed(2)} ms`;
      if (most === undefined) say(`  told   ${shown}: ${(time / unit).toFixed(2)} (${ms}, no bar)`);
      else bar(shown, time / unit, most, { detail: ms });
      return unit;
    };
    const usual = lattice.count >= USUAL[0] && lattice.count <= USUAL[1];
    say(`${name}: ${lattice.count} unknowns${usual ? '' : ` (usual: ${USUAL[0]} to ${USUAL[1]})`}`);
    const moves = drags(airframe);
    for (const drag of moves) await ratio(`live, ${drag.name} dragged`, live(drag), MOST.live);
    const [shape] = moves;
    if (!shape) throw new RangeError('nothing to drag');
    await ratio(`full, ${shape.name} at rest`, atRest(shape), MOST.full);
    await ratio(`full, ${shape.name} typed in`, typed(shape), MOST.full);
    await ratio(
      'live without memory',
      timed(() => void analyse(airframe, { depth: 'live' })),
    );
    const unit = await ratio(
      'full without memory',
      timed(() => void analyse(airframe, { depth: 'full' })),
    );
    say(`  assembly and both solves: ${(unit / unitMs).toFixed(2)} units`);
  }
}

/** Goes round the documents of a drag for ever. */
function round({ documents }: Drag) {
  let next = 0;
  return () => {
    const document = documents[next++ % documents.length];
    if (!document) throw new RangeError('a drag has documents');
    return document;
  };
}

function live(drag: Drag): Timed {
  const [next, memory] = [round(drag), newMemory()];
  return timed(() => void analyse(next(), { depth: 'live', memory }));
}

/** All figures of a changed document straight away. */
function typed(drag: Drag): Timed {
  const [next, memory] = [round(drag), newMemory()];
  return timed(() => void analyse(next(), { depth: 'full', memory }));
}

/** All figures of a document that the handle was let go on: its live figures, which came first, are not in the time. */
function atRest(drag: Drag): Timed {
  const [next, memory] = [round(drag), newMemory()];
  return () => {
    const document = next();
    analyse(document, { depth: 'live', memory });
    const resting = timed(() => void analyse(document, { depth: 'full', memory }));
    return resting();
  };
}
