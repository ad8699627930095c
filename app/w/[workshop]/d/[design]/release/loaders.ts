import { orNotFound } from '@/app/orNotFound';
import { figureRows } from '@/components/figures/rows';
import { changesBetween } from '@/components/release/changes';
import { may } from '@/lib/contract/roles';
import { analyse } from '@/lib/figures/analyse';
import { DECIDING } from '@/lib/figures/table';
import { draft } from '@/server/read/designs';
import { revision, revisions } from '@/server/read/revisions';
import { workshop } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

/** The draft as it stands, against the newest revision. */
export async function releasePage(workshopId: string, designId: string) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  const now = await orNotFound(draft(who, workshopId, designId));
  const list = await revisions(who, workshopId, designId);
  const newest = Math.max(0, ...list.map(({ number }) => number));
  const before = newest === 0 ? null : await revision(who, workshopId, designId, newest);
  const figures = analyse(now.airframe, { depth: 'live' });
  return {
    who,
    shop,
    draft: now,
    mayRelease: may(shop.roles, 'revision.release'),
    problems: figures.problems,
    rows: figureRows(figures, DECIDING),
    newest,
    before:
      before === null
        ? null
        : { rows: figureRows(before.figures, DECIDING), changes: changesBetween(before.airframe, now.airframe) },
  };
}
