import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import type { Airframe } from '../schema/airframe';
import type { Panel, Surface } from '../schema/surface';

/** A number of the document that can be dragged on the plan or typed. */
export interface Handle {
  /** "wing/p1/length", "wing/span", "boom/length", "wing/aileron/from", "pack/x". */
  readonly id: string;
  readonly elementId: string;
  readonly label: string;
  readonly unit: 'mm' | 'deg' | 'share';
  readonly value: number;
  readonly min: number;
  readonly max: number;
  readonly step: number;
  /** Where it stands in plan, starboard side, mm. */
  readonly at: Vec2;
  /** Unit vector in plan along which dragging raises the value. */
  readonly direction: Vec2;
  /** Change of the value per mm dragged along `direction`, where the handle stands now. */
  readonly perMm: number;
}

/** A handle with what it does and why it stops. */
export interface Grip {
  readonly handle: Handle;
  readonly atMin: string;
  readonly atMax: string;
  readonly set: (value: number) => Airframe;
}

export const AFT: Vec2 = [1, 0];
export const FORE: Vec2 = [-1, 0];
export const OUT: Vec2 = [0, 1];

/** A panel steeper than this shows too little of its length in plan to be dragged by it; its handles follow x. */
export const UPRIGHT_COS = 0.2;

export const inPlan = ([x, y]: Vec3): Vec2 => [x, y];

/** The document with one surface changed; every other part is shared with the old one. */
export function withSurface(airframe: Airframe, id: string, change: (surface: Surface) => Surface): Airframe {
  return { ...airframe, surfaces: airframe.surfaces.map((surface) => (surface.id === id ? change(surface) : surface)) };
}

/** The document with some panels of a surface changed, by index. */
export function withPanels(airframe: Airframe, id: string, change: (panel: Panel, index: number) => Panel): Airframe {
  return withSurface(airframe, id, (surface) => ({ ...surface, panels: surface.panels.map(change) }));
}
