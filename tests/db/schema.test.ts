import { eq, sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import {
  apiToken,
  artefact,
  benchTest,
  build,
  component,
  design,
  flight,
  layout,
  membership,
  notification,
  openPoint,
  revision,
  shareLink,
  verdict,
  waiver,
  workshop,
} from '@/db/schema';
import type { Tx } from '@/db/types';
import { newId } from '@/server/context';
import { rolledBack, testDb } from '../support/db';
import { NOW } from '../support/people';
import {
  artefactRow,
  benchOf,
  buildRow,
  componentRow,
  designRow,
  flightRow,
  layoutOf,
  linkOf,
  noticeOf,
  pointOf,
  refused,
  releasedRow,
  shed,
  tokenOf,
  waiverOf,
} from '../support/record';

/** Tables that carry their workshop in the row; the rest reach it over their design or revision, or have none. */
const IN_WORKSHOP = [
  ...['membership', 'invitation', 'design', 'layout', 'open_point', 'waiver', 'build', 'build_part', 'weighing'],
  ...['flight', 'bench_test', 'bench_reading', 'component', 'stock', 'stock_coupon', 'printer_profile', 'upload'],
  ...['share_link', 'notification', 'job', 'api_token', 'webhook'],
];
const TABLES = [
  ...IN_WORKSHOP,
  ...['workshop', 'revision', 'artefact', 'draft_save', 'comment_thread', 'comment', 'verdict', 'print_log'],
  ...['mail_outbox', 'idempotency_key', 'audit_event'],
  ...['user', 'session', 'account', 'verification', 'rate_limit', 'throttle', 'seed_run'],
];

const rowsOf = async (query: ReturnType<typeof sql>): Promise<unknown[]> => {
  const answer = await (await testDb()).execute(query);
  if (typeof answer !== 'object' || answer === null || !('rows' in answer) || !Array.isArray(answer.rows))
    throw new RangeError('the driver answered without rows');
  return answer.rows;
};

describe('the tables', () => {
  it('are all there, and no other', async () => {
    const found = await rowsOf(
      sql`select table_name as name from information_schema.tables where table_schema = 'public' order by 1`,
    );
    expect(found).toEqual(TABLES.toSorted().map((name) => ({ name })));
  });

  it('that belong to a workshop say so in every row, and go with it', async () => {
    const columns = await rowsOf(
      sql`select table_name as name from information_schema.columns where table_schema = 'public' and column_name = 'workshop_id' and is_nullable = 'NO' order by 1`,
    );
    expect(columns).toEqual(IN_WORKSHOP.toSorted().map((name) => ({ name })));
    const cascades = await rowsOf(
      sql`select relname as name from pg_constraint join pg_class on pg_class.oid = conrelid where contype = 'f' and confrelid = 'workshop'::regclass and confdeltype = 'c' order by 1`,
    );
    expect(cascades).toEqual(columns);
  });

  it('keep every time with its zone', async () => {
    const times = await rowsOf(
      sql`select distinct data_type as kind from information_schema.columns where table_schema = 'public' and (data_type like 'time%' or data_type = 'date')`,
    );
    expect(times).toEqual([{ kind: 'timestamp with time zone' }]);
  });
});

describe('a revision', () => {
  it('may have a parent in another design, which then cannot be taken away', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const variant = await designRow(tx, at);
      await releasedRow(tx, { ...at, designId: variant }, { parentRevisionId: at.revisionId });
      await refused(tx, 'revision_parent_revision_id_revision_id_fk', (inner) =>
        inner.delete(design).where(eq(design.id, at.designId)),
      );
    }));

  it('has each number once, each artefact once, and verdicts in one order', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      await refused(tx, 'revision_number', (inner) => releasedRow(inner, at));
      await artefactRow(tx, at.revisionId);
      await refused(tx, 'artefact_revision_kind', (inner) => artefactRow(inner, at.revisionId));
      const given = (changes: Partial<typeof verdict.$inferInsert>) => ({
        ...{ id: newId(), revisionId: at.revisionId, userId: at.userId, number: 1, verdict: 'seen' as const },
        ...{ note: '', counts: true, createdAt: NOW },
        ...changes,
      });
      await tx.insert(verdict).values(given({}));
      await refused(tx, 'verdict_number', (inner) => inner.insert(verdict).values(given({ verdict: 'goodToCut' })));
      await refused(tx, 'verdict_hold_has_note', (inner) =>
        inner.insert(verdict).values(given({ number: 2, verdict: 'hold' })),
      );
    }));
});

describe('what is removed', () => {
  it('takes along what was only drawn', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      await tx.insert(layout).values(layoutOf(at, { draftVersion: 1 }));
      await tx.insert(waiver).values(waiverOf(at, { revisionId: at.revisionId }));
      await tx.delete(design).where(eq(design.id, at.designId));
      expect(await tx.select().from(layout).where(eq(layout.workshopId, at.workshopId))).toEqual([]);
      expect(await tx.select().from(waiver).where(eq(waiver.workshopId, at.workshopId))).toEqual([]);
    }));

  it('is never a release with its frozen artefacts, not even with the whole workshop', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      await artefactRow(tx, at.revisionId);
      const key = 'artefact_revision_id_revision_id_fk';
      await refused(tx, key, (inner) => inner.delete(revision).where(eq(revision.id, at.revisionId)));
      await refused(tx, key, (inner) => inner.delete(design).where(eq(design.id, at.designId)));
      await refused(tx, key, (inner) => inner.delete(workshop).where(eq(workshop.id, at.workshopId)));
      await tx.delete(artefact).where(eq(artefact.revisionId, at.revisionId));
      await tx.delete(workshop).where(eq(workshop.id, at.workshopId));
      expect(await tx.select().from(revision).where(eq(revision.id, at.revisionId))).toEqual([]);
    }));

  it('is not what somebody built, flew or measured, unless the workshop goes as a whole', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const buildId = await buildRow(tx, at);
      await refused(tx, 'build_design', (inner) => inner.delete(design).where(eq(design.id, at.designId)));
      await refused(tx, 'build_revision', (inner) => inner.delete(revision).where(eq(revision.id, at.revisionId)));
      const flightId = await flightRow(tx, { ...at, buildId });
      const motorId = await componentRow(tx, at);
      await tx.insert(benchTest).values(benchOf(at, { motorId, buildId, designId: at.designId }));
      await tx.insert(openPoint).values(pointOf(at, { flightId }));
      await refused(tx, 'open_point_flight', (inner) => inner.delete(flight).where(eq(flight.id, flightId)));
      await refused(tx, 'bench_test_motor', (inner) => inner.delete(component).where(eq(component.id, motorId)));
      await tx.delete(workshop).where(eq(workshop.id, at.workshopId));
      for (const table of [build, flight, benchTest, component, openPoint])
        expect(await tx.select().from(table).where(eq(table.workshopId, at.workshopId))).toEqual([]);
    }));

  it('with a membership: its tokens and notifications', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      await tx.insert(apiToken).values(tokenOf(at, {}));
      await tx.insert(notification).values(noticeOf(at, {}));
      await tx.delete(membership).where(eq(membership.userId, at.userId));
      expect(await tx.select().from(apiToken).where(eq(apiToken.userId, at.userId))).toEqual([]);
      expect(await tx.select().from(notification).where(eq(notification.userId, at.userId))).toEqual([]);
    }));
});

describe('another workshop', () => {
  it('cannot be pointed into', () =>
    rolledBack(async (tx) => {
      const here = await shed(tx);
      const there = await shed(tx);
      const buildId = await buildRow(tx, there);
      const motorId = await componentRow(tx, there);
      const foreignDesign = { ...here, designId: there.designId };
      const foreignRevision = { revisionId: there.revisionId };
      const tries: [string, (inner: Tx) => Promise<unknown>][] = [
        ['layout_design', (db) => db.insert(layout).values(layoutOf(foreignDesign, { draftVersion: 1 }))],
        ['layout_revision', (db) => db.insert(layout).values(layoutOf(here, foreignRevision))],
        ['waiver_revision', (db) => db.insert(waiver).values(waiverOf(here, foreignRevision))],
        ['build_design', (db) => buildRow(db, { ...foreignDesign, ...foreignRevision }, { number: 2 })],
        ['build_revision', (db) => buildRow(db, { ...here, ...foreignRevision })],
        ['flight_build', (db) => flightRow(db, { ...foreignDesign, buildId })],
        ['flight_build_design', (db) => flightRow(db, { ...here, workshopId: there.workshopId, buildId })],
        ['bench_test_motor', (db) => db.insert(benchTest).values(benchOf(here, { motorId }))],
        ['open_point_build', (db) => db.insert(openPoint).values(pointOf(here, { buildId }))],
        ['share_link_revision', (db) => db.insert(shareLink).values(linkOf(here, foreignRevision))],
        ['api_token_member', (db) => db.insert(apiToken).values(tokenOf({ ...here, userId: there.userId }, {}))],
        [
          'notification_member',
          (db) => db.insert(notification).values(noticeOf({ ...here, userId: there.userId }, {})),
        ],
      ];
      for (const [constraint, write] of tries) await refused(tx, constraint, write);
    }));
});
