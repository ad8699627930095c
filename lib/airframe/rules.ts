import type { Problem } from '@/lib/numerics/result';
import { resolve } from './resolve';
import { checkBody } from './rules/body';
import { checkControls } from './rules/control';
import { checkStock } from './rules/stock';
import { checkSurface } from './rules/surface';
import type { Airframe } from './schema/airframe';

/** Everything that shape and references allow and no sheet can be cut to. Assumes that both hold. */
export function checkRules(airframe: Airframe): Problem[] {
  const resolved = resolve(airframe);
  if (!resolved.ok) return [...resolved.problems];
  return [
    ...resolved.value.surfaces.flatMap((surface) => [
      ...checkSurface(surface, airframe),
      ...checkControls(surface, airframe),
    ]),
    ...airframe.bodies.flatMap(checkBody),
    ...checkStock(airframe, resolved.value),
  ];
}
