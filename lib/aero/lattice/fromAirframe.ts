import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control, Surface } from '@/lib/airframe/schema/surface';
import { flatSurface } from '../flatSections';
import type { LatticeControl, LatticeSurface } from './types';

// From the document to the lattice: which surfaces, how fine, and where their controls turn it.

/** Strips from root to tip, and rows along the chord: neutral points within 0.3 % of the chord of the finest lattice in our tests. */
const MESH = {
  /** Six rows: without a tail the wing alone damps and trims, and that takes a fine chord. */
  wing: { strips: 12, rows: 6 },
  stabiliser: { strips: 6, rows: 4 },
  fin: { strips: 5, rows: 4 },
} as const;
/** Strips of the shortest of several wings. */
const LEAST_STRIPS = 4;

/** Lengths in mm. Surfaces that stand on the centre plane only count in the antisymmetric case. */
export interface AirframeLattice {
  readonly surfaces: readonly LatticeSurface[];
  readonly controls: readonly LatticeControl[];
}

/** The lattice of a whole airframe. Section shapes other than flat are laid as flat: what they lift by themselves is not in it. */
export function airframeLattice(airframe: Airframe, resolved: ResolvedAirframe): AirframeLattice {
  const surfaces: LatticeSurface[] = [];
  const controls: LatticeControl[] = [];
  const flats = resolved.surfaces.map((r) => ({ surface: r.surface, flat: flatSurface(airframe, resolved, r) }));
  const longestWing = flats.reduce(
    (most, { surface, flat }) => (isWing(surface) ? Math.max(most, flat.lengthMm) : most),
    0,
  );
  for (const { surface, flat } of flats) {
    surfaces.push({
      id: surface.id,
      sections: flat.sections,
      mirrored: surface.mirrored,
      ...meshOf(surface, flat.lengthMm / longestWing),
    });
    const station = (share: number) => (flat.carriedMm + share * (flat.lengthMm - flat.carriedMm)) / flat.lengthMm;
    for (const control of surface.controls)
      controls.push({
        id: controlKey(surface, control),
        surfaceId: surface.id,
        from: station(control.from),
        to: station(control.to),
        chordShare: control.kind === 'allMoving' ? [1, 1] : control.chordShare,
      });
  }
  return { surfaces, controls };
}

/** Controls have ids within their surface; the lattice wants one for all. */
export const controlKey = (surface: Surface, control: Control): string => `${surface.id}/${control.id}`;

const isWing = ({ role }: Surface) => role === 'wing';
const isStabiliser = ({ role }: Surface) => role === 'tailplane' || role === 'foreplane' || role === 'vtail';

function meshOf(surface: Surface, shareOfLongestWing: number): { strips: number; rows: number } {
  if (isWing(surface)) {
    const { rows, strips } = MESH.wing;
    return { rows, strips: Math.max(LEAST_STRIPS, Math.round(strips * shareOfLongestWing)) };
  }
  return isStabiliser(surface) ? MESH.stabiliser : MESH.fin;
}
