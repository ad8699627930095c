import type { Airframe } from '../schema/airframe';
import type { Mount } from '../schema/common';
import type { Surface } from '../schema/surface';

// Stations are shares of a surface's whole length. When one panel changes its length they are restated, so that a control, a
// rib or a spar stays where it was on its own panel, and one that ended at a joint still ends there.

/** Turns an old station into the one at the same share of the same panel. */
export function restated(oldLengths: readonly number[], newLengths: readonly number[]): (station: number) => number {
  const whole = (lengths: readonly number[]) => lengths.reduce((sum, length) => sum + length, 0);
  const [oldWhole, newWhole] = [whole(oldLengths), whole(newLengths)];
  return (station) => {
    if (station <= 0 || station >= 1) return station;
    let run = station * oldWhole;
    let reached = 0;
    for (const [index, length] of oldLengths.entries()) {
      const next = newLengths[index] ?? length;
      if (run <= length) return Math.min(1, (reached + (run / length) * next) / newWhole);
      run -= length;
      reached += next;
    }
    return 1;
  };
}

type Restate = (station: number) => number;

const onSurface = (surface: Surface, move: Restate): Surface => ({
  ...surface,
  ribs: surface.ribs.map((rib) => ({ ...rib, station: move(rib.station) })),
  spars: surface.spars.map((spar) => ({ ...spar, from: move(spar.from), to: move(spar.to) })),
  cutouts: surface.cutouts.map((cutout) => ({
    ...cutout,
    outline: cutout.outline.map(([station, chordShare]): [number, number] => [move(station), chordShare]),
  })),
  controls: surface.controls.map((control) => ({
    ...control,
    from: move(control.from),
    to: move(control.to),
    ...(control.linkage ? { linkage: { ...control.linkage, hornStation: move(control.linkage.hornStation) } } : {}),
  })),
});

function onMounts<T extends { readonly mount: Mount }>(list: T[], surfaceId: string, move: Restate): T[] {
  const moved = list.map((element) => {
    const { mount } = element;
    if (mount.to !== surfaceId || Array.isArray(mount.at)) return element;
    return { ...element, mount: { ...mount, at: { ...mount.at, station: move(mount.at.station) } } };
  });
  return moved.some((element, index) => element !== list[index]) ? moved : list;
}

/** The document with one panel of a surface at another length; what stands on the surface stays on its panel. */
export function withPanelLength(airframe: Airframe, surfaceId: string, panelIndex: number, lengthMm: number): Airframe {
  const surface = airframe.surfaces.find(({ id }) => id === surfaceId);
  if (!surface) throw new RangeError(`no surface "${surfaceId}"`);
  const panels = surface.panels.map((panel, index) => (index === panelIndex ? { ...panel, lengthMm } : panel));
  if (panels.length === 1) {
    return { ...airframe, surfaces: airframe.surfaces.map((one) => (one === surface ? { ...one, panels } : one)) };
  }
  const lengths = (list: Surface['panels']) => list.map((panel) => panel.lengthMm);
  const move = restated(lengths(surface.panels), lengths(panels));
  const surfaces = airframe.surfaces.map((one) => (one === surface ? { ...onSurface(one, move), panels } : one));
  return {
    ...airframe,
    surfaces: onMounts(surfaces, surfaceId, move),
    bodies: onMounts(airframe.bodies, surfaceId, move),
    booms: onMounts(airframe.booms, surfaceId, move),
    drives: onMounts(airframe.drives, surfaceId, move),
    items: onMounts(airframe.items, surfaceId, move),
    gear: onMounts(airframe.gear, surfaceId, move),
  };
}
