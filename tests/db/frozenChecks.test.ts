import { and, eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { artefact } from '@/db/schema';
import { compute } from '@/scripts/cli/chain';
import { createDesign } from '@/server/acts/createDesign';
import { releaseRevision } from '@/server/acts/releaseRevision';
import { packFrozen } from '@/server/artefacts';
import { exportIn } from '@/server/read/revisions';
import { pusher } from '../support/airframes';
import { rolledBack } from '../support/db';
import { scene } from '../support/people';

const WHY = { reason: 'First.', expectedEffect: 'Flies.', draftVersion: 1 };

describe('the check before cutting', () => {
  it('is frozen with the parts, and absent from a revision that was released without it', () =>
    rolledBack(async (tx) => {
      const { designer } = await scene(tx);
      const { context, member } = designer;
      const { id } = await createDesign(context, member, { name: 'Pip', airframe: pusher(620) });
      const { id: revisionId } = await releaseRevision(context, member, id, WHY);
      const { frozen } = await exportIn(tx, member, id, 1);
      const computed = compute(pusher(620));
      expect(computed.checks?.length).toBeGreaterThan(3);
      expect(frozen.checks).toEqual(computed.checks);
      expect(frozen.development).toEqual(JSON.parse(JSON.stringify(computed.development)));

      const earlier = await packFrozen({ ...computed, checks: undefined });
      const parts = earlier.find(({ kind }) => kind === 'parts');
      if (parts === undefined) throw new RangeError('no parts were packed');
      const row = and(eq(artefact.revisionId, revisionId), eq(artefact.kind, 'parts'));
      await tx.update(artefact).set({ body: parts.body }).where(row);
      const read = (await exportIn(tx, member, id, 1)).frozen;
      expect('checks' in read).toBe(false);
      expect(read.development).toEqual(frozen.development);
    }));
});
