import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { CheckResult } from '@/lib/checks/types';
import type { Figures } from '@/lib/figures/types';
import type { SheetLayout } from '@/lib/layout/types';
import type { Problem } from '@/lib/numerics/result';
import type { Development } from '@/lib/parts/types';
import type { PlanRevision } from './drawing';
import type { Manifest } from './manifest';

// What the server asks of the bundled command line (`dist/cli.mjs job`): one JobRequest as JSON on standard input, one JobAnswer as JSON on
// standard output. A document with a fault is an answer with `ok: false` and exit code 0; any other exit code is a fault of the program.

/** What is frozen at a release. A plan printed later is drawn from it, never from a new computation. */
export interface Frozen {
  readonly figures: Figures;
  readonly development: Development;
  readonly layout: SheetLayout;
  /** What the check before cutting found; earlier engines had none. */
  readonly checks?: readonly CheckResult[];
}

export type JobRequest =
  | { readonly kind: 'freeze'; readonly airframe: Airframe }
  | {
      readonly kind: 'plan';
      readonly airframe: Airframe;
      readonly paper: string;
      readonly frozen?: Frozen;
      readonly revision?: PlanRevision;
    };

export type JobAnswer =
  | { readonly ok: true; readonly kind: 'freeze'; readonly engine: string; readonly frozen: Frozen }
  | { readonly ok: true; readonly kind: 'plan'; readonly pdfBase64: string; readonly manifest: Manifest }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** The file that `…/export` gives: the command line prints the same bytes from it as the server does. */
export interface ExportFile {
  readonly revision?: PlanRevision;
  readonly airframe: Airframe;
  readonly frozen?: Frozen;
}
