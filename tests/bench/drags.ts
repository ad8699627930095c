import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Mount } from '@/lib/airframe/schema/common';
import type { Surface } from '@/lib/airframe/schema/surface';

// Documents as a dragged handle sends them to the figures: each another copy, a little different from the one before.

const STEPS = 24;
const STEP_MM = 0.5;
const STEP_SHARE = 0.001;

export interface Drag {
  readonly name: string;
  readonly documents: readonly Airframe[];
}

/** Three handles: one moves the lattice and the wing's parts, one only masses, one the wing's parts and what its control does. */
export function drags(airframe: Airframe): Drag[] {
  const along = (name: string, move: (step: number) => Airframe): Drag => ({
    name,
    documents: Array.from({ length: STEPS }, (_, step) => structuredClone(move(step))),
  });
  return [
    along('tip chord of the wing', (step) => withTip(airframe, step * STEP_MM)),
    along('pack', (step) => withPack(airframe, step * STEP_MM)),
    along('hinge', (step) => withHinge(airframe, step * STEP_SHARE)),
  ];
}

function withSurface(airframe: Airframe, has: (surface: Surface) => boolean, change: (surface: Surface) => Surface) {
  const index = airframe.surfaces.findIndex(has);
  if (index < 0) throw new RangeError(`${airframe.name} has no such surface`);
  return { ...airframe, surfaces: airframe.surfaces.map((s, i) => (i === index ? change(s) : s)) };
}

const withTip = (airframe: Airframe, byMm: number): Airframe =>
  withSurface(
    airframe,
    ({ role }) => role === 'wing',
    (wing) => ({
      ...wing,
      panels: wing.panels.map((panel, i) =>
        i === wing.panels.length - 1 ? { ...panel, tipChordMm: panel.tipChordMm + byMm } : panel,
      ),
    }),
  );

const withHinge = (airframe: Airframe, by: number): Airframe =>
  withSurface(
    airframe,
    ({ controls }) => controls.some(({ kind }) => kind !== 'allMoving'),
    (surface) => ({
      ...surface,
      controls: surface.controls.map((control) => ({
        ...control,
        chordShare: [control.chordShare[0] + by, control.chordShare[1] + by],
      })),
    }),
  );

function withPack(airframe: Airframe, byMm: number): Airframe {
  const index = airframe.items.findIndex(({ kind }) => kind === 'pack');
  if (index < 0) throw new RangeError(`${airframe.name} has no pack`);
  return {
    ...airframe,
    items: airframe.items.map((item, i) => (i === index ? { ...item, mount: aft(item.mount, byMm) } : item)),
  };
}

/** A mount moved aft by its own offset. */
function aft(mount: Mount, byMm: number): Mount {
  if (!Array.isArray(mount.at)) throw new RangeError('a pack that stands on a surface is not moved along x');
  const [x, y, z] = mount.at;
  return { ...mount, at: [x + byMm, y, z] };
}
