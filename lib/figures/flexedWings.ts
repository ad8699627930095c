import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { halfWing, type WingStrip } from '@/lib/structure/halfWing';
import type { Stiffness } from '@/lib/structure/moduli';
import { type Flexibility, flexibilityOf } from '@/lib/structure/twist';

/** A half wing at one stiffness of its stock. */
export interface Flexed {
  readonly strips: readonly WingStrip[];
  readonly flexibility: Flexibility;
}
export type FlexedOf = (surface: ResolvedSurface, stiffness: Stiffness) => Flexed;

/** Half wings, each worked out once for all figures that want it. */
export function flexedWings(airframe: Airframe): FlexedOf {
  const wings = new Map<number, (stiffness: Stiffness) => Flexed>();
  return (surface, stiffness) => {
    const wing =
      wings.get(surface.index) ??
      remembered((at: Stiffness) => {
        const strips = halfWing(airframe, surface, at);
        return { strips, flexibility: flexibilityOf(strips) };
      });
    wings.set(surface.index, wing);
    return wing(stiffness);
  };
}

/** Works a thing out at a stiffness when it is first asked for, and keeps it. */
export function remembered<T>(make: (stiffness: Stiffness) => T): (stiffness: Stiffness) => T {
  const made = new Map<Stiffness, T>();
  return (stiffness) => {
    const thing = made.get(stiffness) ?? make(stiffness);
    made.set(stiffness, thing);
    return thing;
  };
}
