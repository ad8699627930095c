import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { setUpSheet } from '@/lib/figures/setUp';
import type { Part } from '@/lib/parts/types';
import { bevelBlocks } from './bevelBlock';
import { boomJig } from './boomJig';
import { cgStand } from './cgStand';
import { dihedralProps } from './dihedral';
import { incidenceGauges } from './incidence';
import { mainSheet } from './source';
import { throwGauges } from './throwGauge';

/** What the aids of an aircraft are made for. */
export interface AidsFor {
  readonly airframe: Airframe;
  /** The aircraft's own parts, as developed. */
  readonly parts: readonly Part[];
  /** Aircraft axes; null where the figures have none: there is no stand then. */
  readonly firstFlightCgXMm: number | null;
}

/**
 * Gauges, props and jigs for this aircraft as flat parts of its main sheet, true size in mm, each only where this aircraft needs it: CG stand,
 * throw gauges, incidence gauges, dihedral props, bevel blocks, boom jig. They are no parts of the aircraft: their keys begin with "aid/" and
 * their frames say where they stand in use. A document that does not resolve has none.
 */
export function workshopAids({ airframe, parts, firstFlightCgXMm }: AidsFor): Part[] {
  const resolved = resolve(airframe);
  const setUp = setUpSheet(airframe);
  const material = mainSheet(airframe, parts);
  if (!resolved.ok || !setUp.ok || !material) return [];
  const source = { airframe, resolved: resolved.value, setUp: setUp.value, parts, material };
  return [
    ...(firstFlightCgXMm === null ? [] : cgStand(source, firstFlightCgXMm)),
    ...incidenceGauges(source),
    ...dihedralProps(source),
    ...boomJig(source),
    ...bevelBlocks(source),
    ...throwGauges(source),
  ];
}
