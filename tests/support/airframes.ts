import { setHandle } from '@/lib/airframe/handles';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';

/** A small aircraft to save and release; `span` tells one state from another. */
export function pusher(span?: number): Airframe {
  const airframe = startFrom('pusher', 'Test pusher');
  return span === undefined ? airframe : setHandle(airframe, 'wing/span', span).airframe;
}
