import { texts } from '@/lib/text/en/airframe';
import type { Airframe } from '../schema/airframe';
import { delta } from './delta';
import { pusher } from './pusher';
import { tailless } from './tailless';
import { trainer } from './trainer';

export interface StartingLayout {
  readonly id: string;
  readonly name: string;
  readonly what: string;
}

const BUILDERS: ReadonlyMap<string, (name: string) => Airframe> = new Map([
  ['trainer', trainer],
  ['pusher', pusher],
  ['tailless', tailless],
  ['delta', delta],
]);

/** The layouts a design may start from, easiest first. All of flat sheet. */
export const startingLayouts: readonly StartingLayout[] = [
  { id: 'trainer', name: texts.layouts.trainerName, what: texts.layouts.trainerWhat },
  { id: 'pusher', name: texts.layouts.pusherName, what: texts.layouts.pusherWhat },
  { id: 'tailless', name: texts.layouts.taillessName, what: texts.layouts.taillessWhat },
  { id: 'delta', name: texts.layouts.deltaName, what: texts.layouts.deltaWhat },
];

/** A new airframe from a starting layout. The name is taken as it is: `parseAirframe` judges it. Throws RangeError for a layout that is not listed. */
export function startFrom(layoutId: string, name: string): Airframe {
  const build = BUILDERS.get(layoutId);
  if (!build) throw new RangeError(`no starting layout "${layoutId}"`);
  return build(name);
}
