import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Figures } from '@/lib/figures/types';
import type { Anchor, VerdictKind } from './bodies';
import type { Role } from './roles';

// Answers of the API. Times are ISO 8601 in UTC.

/** RFC 9457. `errors` holds one row a field. */
export interface ProblemDetails {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail?: string;
  readonly instance: string;
  readonly errors?: readonly {
    readonly path: string;
    readonly code: string;
    readonly message: string;
    readonly fix?: string;
  }[];
}

export interface WorkshopSummary {
  readonly id: string;
  readonly name: string;
  readonly roles: readonly Role[];
}
export interface MemberRow {
  readonly id: string;
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}
export interface InvitationRow {
  readonly id: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly invitedBy: string;
  readonly expiresAt: string;
}

/** Enough to draw a thumbnail: outlines in aircraft mm, plan view. */
export interface Thumbnail {
  readonly outlines: readonly (readonly (readonly [number, number])[])[];
}
export interface DesignSummary {
  readonly id: string;
  readonly name: string;
  readonly updatedAt: string;
  readonly latestRevision: {
    readonly number: number;
    readonly state: RevisionState;
    readonly releasedAt: string;
  } | null;
  readonly spanMm: number;
  readonly massG: number | null;
  readonly thumbnail: Thumbnail;
}
export type RevisionState = 'released' | 'goodToCut' | 'held';

export interface DraftAnswer {
  readonly designId: string;
  readonly designName: string;
  readonly version: number;
  readonly savedAt: string;
  readonly savedBy: string;
  readonly airframe: Airframe;
}

/** Answer to a draft save: the version that it became. */
export interface DraftSaved {
  readonly designId: string;
  readonly version: number;
  readonly savedAt: string;
  readonly savedBy: string;
}
/** A stale save or release: the problem carries the draft that stands now, so that nothing has to be thrown away. */
export interface StaleDraftProblem extends ProblemDetails {
  readonly current: DraftAnswer;
}

export interface RevisionSummary {
  readonly id: string;
  readonly number: number;
  readonly state: RevisionState;
  readonly reason: string;
  readonly expectedEffect: string;
  readonly releasedAt: string;
  readonly releasedBy: { readonly id: string; readonly name: string };
  readonly sha256: string;
  readonly openThreads: number;
}
export interface RevisionAnswer extends RevisionSummary {
  readonly designId: string;
  readonly designName: string;
  readonly airframe: Airframe;
  readonly figures: Figures;
}

export interface CommentRow {
  readonly id: string;
  readonly author: { readonly id: string; readonly name: string };
  readonly text: string;
  readonly createdAt: string;
}
export interface ThreadAnswer {
  readonly id: string;
  readonly number: number;
  readonly anchor: Anchor;
  readonly state: 'open' | 'closed';
  readonly closedBy: string | null;
  readonly comments: readonly CommentRow[];
}
export interface VerdictRow {
  readonly id: string;
  readonly verdict: VerdictKind;
  readonly note: string;
  readonly by: { readonly id: string; readonly name: string };
  /** False for a verdict on one's own release: it is kept and shown, and does not count. */
  readonly counts: boolean;
  readonly createdAt: string;
}
