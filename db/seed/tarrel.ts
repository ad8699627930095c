import { handles, setHandle } from '@/lib/airframe/handles';
import type { Airframe } from '@/lib/airframe/schema/airframe';

// Three steps back from the example file to the aircraft it began as. All numbers are invented here.

/** Scales what handles hold, one after the other; a demo that does not reach its values is a fault. */
function scaled(airframe: Airframe, factors: Readonly<Record<string, number>>): Airframe {
  return Object.entries(factors).reduce((current, [id, factor]) => {
    const handle = handles(current).find((one) => one.id === id);
    if (handle === undefined) throw new RangeError(`the demo aircraft has no handle ${id}`);
    const value = Math.round(handle.value * factor);
    const { airframe: next, stopped } = setHandle(current, id, value);
    if (stopped !== null) throw new RangeError(`demo edit ${id} = ${value} stopped: ${stopped}`);
    return next;
  }, airframe);
}

/** Moves a pack with its whole bay, mm aft; the slide goes with it. */
function packMoved(airframe: Airframe, aftMm: number): Airframe {
  const items = airframe.items.map((item) => {
    if (item.kind !== 'pack' || !Array.isArray(item.mount.at)) return item;
    const [x, y, z] = item.mount.at;
    return { ...item, mount: { ...item.mount, at: [x + aftMm, y, z] satisfies [number, number, number] } };
  });
  return { ...airframe, items };
}

export interface TarrelSteps {
  /** Short booms, narrow tailplane, small fins, pack far aft. */
  readonly first: Airframe;
  readonly longerTail: Airframe;
  readonly largerFins: Airframe;
  /** The example file itself. */
  readonly packForward: Airframe;
}

/** The states of the design that its three revisions freeze, and the one before them. */
export function tarrelSteps(packForward: Airframe): TarrelSteps {
  const largerFins = packMoved(packForward, 23);
  const longerTail = scaled(largerFins, { 'fin/p1/length': 0.8, 'fin/p1/rootChord': 0.88, 'fin/p1/tipChord': 0.86 });
  const first = scaled(longerTail, { 'tail/p1/rootChord': 0.84, 'tail/p1/tipChord': 0.84, 'boom/length': 0.88 });
  return { first, longerTail, largerFins, packForward };
}
