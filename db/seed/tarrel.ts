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

/** Moves a pack with its whole bay, mm aft: slide, hatch and the former behind it go with it. */
function bayMoved(airframe: Airframe, aftMm: number): Airframe {
  const items = airframe.items.map((item) => {
    if (item.kind !== 'pack' || !Array.isArray(item.mount.at)) return item;
    const [x, y, z] = item.mount.at;
    return { ...item, mount: { ...item.mount, at: [x + aftMm, y, z] satisfies [number, number, number] } };
  });
  const bodies = airframe.bodies.map((body) => ({
    ...body,
    formers: body.formers.map((one) => (one.role === 'former' ? { ...one, xMm: one.xMm + aftMm } : one)),
    openings: body.openings.map((one) =>
      one.purpose === 'hatch' ? { ...one, fromX: one.fromX + aftMm, toX: one.toX + aftMm } : one,
    ),
  }));
  return { ...airframe, items, bodies };
}

export interface TarrelSteps {
  /** Short booms, narrow tailplane, small fins, pack far aft: its CG lies behind its range. */
  readonly first: Airframe;
  /** In its range by little. */
  readonly longerTail: Airframe;
  /** The fins' weight puts the CG a little behind the range. */
  readonly largerFins: Airframe;
  /** The example file itself. */
  readonly packForward: Airframe;
}

/** The states of the design that its three revisions freeze, and the one before them. */
export function tarrelSteps(packForward: Airframe): TarrelSteps {
  const largerFins = bayMoved(packForward, 20);
  const longerTail = scaled(largerFins, { 'fin/p1/length': 0.8, 'fin/p1/rootChord': 0.72, 'fin/p1/tipChord': 0.72 });
  const first = scaled(bayMoved(longerTail, 14), {
    'tail/p1/rootChord': 0.84,
    'tail/p1/tipChord': 0.84,
    'boom/length': 0.88,
  });
  return { first, longerTail, largerFins, packForward };
}
