import type { DraftAnswer } from '@/lib/contract/answers';
import { texts } from '@/lib/text/en/server';
import { sha256 } from '../ids';
import { AppError } from '../problems';
import { etagOf } from './answers';

/** Validator of a draft save: its version in quotes. */
export const versionEtag = (version: number): string => etagOf(String(version));

/** Validator of what a reader gets: the version, and the design's name, which can change without a save. */
export const draftEtag = ({ version, designName }: DraftAnswer): string =>
  etagOf(`${version}.${sha256(designName).slice(0, 8)}`);

/** The version that a save is based on. Missing: 428 (RFC 6585). "*" would overwrite whatever is there, so it is no answer. */
export function baseVersionOf(headers: Headers): number {
  const ifMatch = headers.get('if-match');
  if (ifMatch === null) throw new AppError('precondition-required', texts.details.ifMatchMissing);
  const found = /^"([1-9]\d{0,8})(?:\.[0-9a-f]{8})?"$/.exec(ifMatch.trim());
  if (found?.[1] === undefined) throw new AppError('invalid', texts.details.ifMatchUnreadable);
  return Number(found[1]);
}
