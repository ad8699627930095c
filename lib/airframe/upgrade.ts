import { ok, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { AIRFRAME_VERSION } from './schema/airframe';

type Step = (document: unknown) => unknown;

/** One step per version: STEPS.get(n) turns a document of version n into one of version n + 1. Steps are never removed: an old file opens for ever. */
const STEPS: ReadonlyMap<number, Step> = new Map();

const known = (version: number): boolean => Number.isInteger(version) && version >= 1 && version <= AIRFRAME_VERSION;

/**
 * Brings a document from one version to another, one step at a time; the same version gives the same document.
 * Refused for a version this program does not know and for the way back.
 */
export function upgrade(document: unknown, from: number, to: number): Result<unknown> {
  for (const version of [from, to]) {
    if (known(version)) continue;
    const newer = Number.isInteger(version) && version > AIRFRAME_VERSION;
    const words = newer ? texts.problems.versionNewer : texts.problems.versionUnknown;
    const message = fill(words, { got: String(version), known: AIRFRAME_VERSION });
    return refuse({ code: 'unknown-version', path: 'version', message });
  }
  if (to < from) {
    const message = fill(texts.problems.versionBack, { from, to });
    return refuse({ code: 'version-backwards', path: 'version', message });
  }
  let current = document;
  for (let version = from; version < to; version++) {
    const step = STEPS.get(version);
    if (!step) throw new RangeError(`no step from version ${version} to ${version + 1}`);
    current = step(current);
  }
  return ok(current);
}
