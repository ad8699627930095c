import { keptTry } from '@/client/kept';
import type { Airframe } from '@/lib/airframe/schema/airframe';

/**
 * The aircraft that a visitor drew in this browser, or the reason why it cannot be read; null when there is none.
 * The checker is large, so it is fetched only when there is something to check.
 */
export async function readTry(): Promise<Airframe | string | null> {
  const kept = keptTry();
  if (kept === null) return null;
  const { parseAirframe } = await import('@/lib/airframe/parse');
  const result = parseAirframe(kept);
  return result.ok ? result.value : (result.problems[0]?.message ?? '');
}
