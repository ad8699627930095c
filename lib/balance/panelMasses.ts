import type { ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Panel } from '@/lib/airframe/schema/surface';
import { signedArea } from '@/lib/geometry/polygons';
import type { Vec3 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/balance';
import { fill } from '@/lib/text/fill';
import type { MassLine } from './line';
import { onSides } from './sides';
import { type Plate, plate, scaleSpread } from './spread';

// Masses that go with a whole panel of a surface.

/** Coverings lie on both faces of the panel they are named on. */
export function coveringLines(
  airframe: Airframe,
  surfaces: readonly ResolvedSurface[],
  nameOf: (id: string) => string,
): MassLine[] {
  return surfaces.flatMap(({ surface, panels }) =>
    panels.flatMap((resolved): MassLine[] => {
      const { panel } = resolved;
      const covering = airframe.coverings.find(({ id }) => id === panel.coveringId);
      if (!covering) return [];
      const flat = panelPlate(resolved);
      const massG = (2 * flat.areaMm2 * covering.arealMassGm2) / 1e6;
      const line: MassLine = {
        key: `${surface.id}/${panel.id}/covering`,
        name: fill(texts.covering, { covering: covering.name, element: nameOf(surface.id) }),
        group: 'covering',
        basis: `covering/${covering.id}`,
        massG,
        at: flat.at,
        spread: scaleSpread(flat.spread, massG),
      };
      return onSides(line, surface.mirrored);
    }),
  );
}

/**
 * Panels that no part stands for, because their construction cannot be drawn yet: area times what their section is made of, so that the
 * aircraft is not taken for lighter than it will be.
 */
export function undevelopedLines(
  airframe: Airframe,
  surfaces: readonly ResolvedSurface[],
  parts: readonly Part[],
  nameOf: (id: string) => string,
): MassLine[] {
  const drawn = new Set(parts.flatMap(({ key }) => panelsOf(key)));
  return surfaces.flatMap(({ surface, panels }) =>
    panels.flatMap((resolved): MassLine[] => {
      const { panel } = resolved;
      const path = `${surface.id}/${panel.id}`;
      if (drawn.has(path)) return [];
      const flat = panelPlate(resolved);
      const massG = (flat.areaMm2 * sectionMassGm2(airframe, panel)) / 1e6;
      if (!(massG > 0)) return [];
      const line: MassLine = {
        key: `${path}/undrawn`,
        name: fill(texts.undrawn, { element: nameOf(surface.id), panel: panel.id }),
        group: 'foam',
        basis: `undrawn/${panel.materialId}`,
        massG,
        at: flat.at,
        spread: scaleSpread(flat.spread, massG),
      };
      return onSides(line, surface.mirrored);
    }),
  );
}

/** The panels that a part of a surface stands for, from its key: surface / panels joined by plus / what it is. */
function panelsOf(key: string): string[] {
  const [surface = '', panels = ''] = key.split('/');
  return panels.split('+').map((panel) => `${surface}/${panel}`);
}

/** Mass of a panel's section by its area seen from above, g/m2. */
function sectionMassGm2(airframe: Airframe, { section, materialId, rootChordMm, tipChordMm }: Panel): number {
  const sheet = airframe.materials.find(({ id }) => id === materialId);
  if (!sheet) return 0;
  const areal = (id: string) => airframe.materials.find((m) => m.id === id)?.arealMassGm2 ?? 0;
  switch (section.kind) {
    case 'flat':
      return sheet.arealMassGm2;
    case 'stepped':
      return (
        sheet.arealMassGm2 +
        section.layers.reduce((sum, { from, to, materialId: id }) => sum + (to - from) * areal(id), 0)
      );
    case 'folded':
      // Upper skin, lower skin as far as it goes, and a web as high as the section is thick.
      return sheet.arealMassGm2 * (1 + section.lowerTo + section.thicknessShare);
    case 'slab': {
      const meanThickness = Math.abs(signedArea(section.profile)) * ((rootChordMm + tipChordMm) / 2);
      return (sheet.arealMassGm2 / sheet.thicknessMm) * meanThickness;
    }
  }
}

/** A panel as a flat plate: sides along its root and tip chords, in axes along the chord and the panel. */
function panelPlate({ panel, root, tip }: ResolvedPanel): Plate {
  const shift = tip.le[0] - root.le[0];
  return plate(
    [
      [0, 0],
      [root.chordMm, 0],
      [shift + tip.chordMm, panel.lengthMm],
      [shift, panel.lengthMm],
    ],
    [],
    0,
    panelFrame(root.le, root.te, tip.le, panel.lengthMm),
  );
}

/** Axes of a panel for its mass: x aft, and the direction in which its leading edge leaves the x axis. Twist is left out: it moves no mass to speak of. */
function panelFrame(rootLe: Vec3, rootTe: Vec3, tipLe: Vec3, lengthMm: number) {
  const ey: Vec3 = [0, (tipLe[1] - rootLe[1]) / lengthMm, (tipLe[2] - rootLe[2]) / lengthMm];
  const size = Math.hypot(ey[1], ey[2]);
  const origin: Vec3 = [rootLe[0], (rootLe[1] + rootTe[1]) / 2, (rootLe[2] + rootTe[2]) / 2];
  return { origin, ex: [1, 0, 0] satisfies Vec3, ey: [0, ey[1] / size, ey[2] / size] satisfies Vec3 };
}
