import { eq, sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import {
  apiToken,
  benchReading,
  benchTest,
  buildPart,
  component,
  flight,
  job,
  layout,
  openPoint,
  printerProfile,
  shareLink,
  stock,
  upload,
  waiver,
  webhook,
  weighing,
} from '@/db/schema';
import type { Tx } from '@/db/types';
import { newId } from '@/server/context';
import { rolledBack } from '../support/db';
import { NOW } from '../support/people';
import {
  benchOf,
  buildRow,
  componentRow,
  flightRow,
  HASH,
  LATER,
  layoutOf,
  linkOf,
  pointOf,
  refused,
  type Shed,
  shed,
  tokenOf,
  waiverOf,
} from '../support/record';

describe('a layout', () => {
  it('is of a revision or of a draft save that exists, and one of them is the chosen one', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const put = (changes: Partial<typeof layout.$inferInsert>) => (db: Tx) =>
        db.insert(layout).values(layoutOf(at, changes));
      await refused(tx, 'layout_source', put({}));
      await refused(tx, 'layout_source', put({ revisionId: at.revisionId, draftVersion: 1 }));
      await refused(tx, 'layout_draft', put({ draftVersion: 2 }));
      for (const of of [{ revisionId: at.revisionId }, { draftVersion: 1 }]) {
        await put({ ...of, chosen: true })(tx);
        await put({ ...of, chosen: false, seed: 2 })(tx);
      }
      await refused(tx, 'layout_chosen_revision', put({ revisionId: at.revisionId, chosen: true }));
      await refused(tx, 'layout_chosen_draft', put({ draftVersion: 1, chosen: true }));
    }));
});

describe('a waiver', () => {
  it('says why, stands once a place, and may be given again when it was withdrawn', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const of = { revisionId: at.revisionId };
      const put = (changes: Partial<typeof waiver.$inferInsert>) => (db: Tx) =>
        db.insert(waiver).values(waiverOf(at, changes));
      await refused(tx, 'waiver_reason', put({ ...of, reason: '  ' }));
      await refused(tx, 'waiver_source', put({}));
      await put(of)(tx);
      await put({ ...of, placeKey: 'boom-2' })(tx);
      await put({ draftVersion: 1 })(tx);
      await refused(tx, 'waiver_revision_rule', put(of));
      await refused(tx, 'waiver_draft_rule', put({ draftVersion: 1 }));
      await refused(tx, 'waiver_withdrawn', (db) => db.update(waiver).set({ withdrawnAt: LATER }));
      await tx.update(waiver).set({ withdrawnAt: LATER, withdrawnBy: at.userId });
      await put(of)(tx);
      await put({ draftVersion: 1 })(tx);
    }));
});

describe('an open point', () => {
  it('has one source, and is answered as a whole by a revision of its own design', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const other = await shed(tx);
      const buildId = await buildRow(tx, at);
      const flightId = await flightRow(tx, { ...at, buildId });
      const put = (changes: Partial<typeof openPoint.$inferInsert>) => (db: Tx) =>
        db.insert(openPoint).values(pointOf(at, changes));
      await refused(tx, 'open_point_source', put({}));
      await refused(tx, 'open_point_source', put({ buildId, flightId }));
      await put({ flightId })(tx);
      await refused(tx, 'open_point_number', put({ buildId }));
      const answer = { answer: 'Larger fins.', answeredBy: at.userId, answeredAt: LATER };
      const set = (changes: Partial<typeof openPoint.$inferInsert>) => (db: Tx) => db.update(openPoint).set(changes);
      await refused(tx, 'open_point_answered', set(answer));
      await refused(tx, 'open_point_answer', set({ ...answer, answeredByRevisionId: other.revisionId }));
      await set({ ...answer, answeredByRevisionId: at.revisionId })(tx);
    }));
});

describe('a build', () => {
  it('ticks each step of a part once, and balances only as a whole', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const { workshopId, userId } = at;
      const buildId = await buildRow(tx, at);
      await refused(tx, 'build_number', (db) => buildRow(db, at));
      const tick = { workshopId, buildId, partKey: 'wing/p1/sheet/stbd', step: 'cut' };
      await tx.insert(buildPart).values({ id: newId(), ...tick });
      await refused(tx, 'build_part_step', (db) => db.insert(buildPart).values({ id: newId(), ...tick }));
      await refused(tx, 'build_part_ticked', (db) => db.update(buildPart).set({ tickedAt: NOW }));
      const put = (changes: Partial<typeof weighing.$inferInsert>) => (db: Tx) =>
        db.insert(weighing).values({
          ...{ id: newId(), workshopId, buildId, what: 'part', key: 'wing/p1/sheet/stbd', massG: 21.4 },
          ...{ weighedBy: userId, weighedAt: NOW },
          ...changes,
        });
      await put({})(tx);
      await put({ what: 'allUp', key: null, cgXMm: 48 })(tx);
      await refused(tx, 'weighing_cg', put({ cgXMm: 48 }));
      await refused(tx, 'weighing_key', put({ key: null }));
      await refused(tx, 'weighing_mass', put({ massG: -1 }));
    }));

  it('flies in ways that the list knows', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const buildId = await buildRow(tx, at);
      const flightId = await flightRow(tx, { ...at, buildId }, { behaviours: ['porpoises', 'tucks'] });
      await refused(tx, 'flight_number', (db) => flightRow(db, { ...at, buildId }));
      await refused(tx, 'flight_behaviours', (db) => db.execute(sql`update flight set behaviours = '{tucks,sings}'`));
      const [row] = await tx.select().from(flight).where(eq(flight.id, flightId));
      expect(row?.behaviours).toEqual(['porpoises', 'tucks']);
    }));
});

describe('a bench test', () => {
  it('has one thruster, and readings that read something', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const propellerId = await componentRow(tx, at, { kind: 'propeller' });
      const fanId = await componentRow(tx, at, { kind: 'fan' });
      const buildId = await buildRow(tx, at);
      const put = (changes: Partial<typeof benchTest.$inferInsert>) => (db: Tx) =>
        db.insert(benchTest).values(benchOf(at, changes));
      await refused(tx, 'bench_test_one_thruster', put({ propellerId, fanId }));
      await refused(tx, 'bench_test_build_has_design', put({ buildId }));
      const benchTestId = newId();
      await put({ id: benchTestId, propellerId })(tx);
      const read = (changes: Partial<typeof benchReading.$inferInsert>) => (db: Tx) =>
        db.insert(benchReading).values({
          ...{ id: newId(), workshopId: at.workshopId, benchTestId, number: 1, leftOut: false, note: '' },
          ...changes,
        });
      await refused(tx, 'bench_reading_measured', read({ throttlePct: 50 }));
      await refused(tx, 'bench_reading_throttle', read({ throttlePct: 101, currentA: 9 }));
      await refused(tx, 'bench_reading_left_out', read({ currentA: 9, leftOut: true }));
      await read({ throttlePct: 100, currentA: 9.4, voltageV: 10.9 })(tx);
      await refused(tx, 'bench_reading_number', read({ currentA: 9 }));
    }));
});

describe('a component and its price', () => {
  it('have a name of their own in the list, figures by name, and a currency to the price', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      const id = await componentRow(tx, at, { name: 'outrunner 28 mm', priceMinor: 1450, currency: 'EUR' });
      const again = (db: Tx) => componentRow(db, at, { name: 'outrunner 28 mm' });
      await refused(tx, 'component_name', again);
      await tx.update(component).set({ archivedAt: LATER }).where(eq(component.id, id));
      await again(tx);
      await refused(tx, 'component_price', (db) => componentRow(db, at, { priceMinor: 1450 }));
      await refused(tx, 'component_price', (db) => componentRow(db, at, { priceMinor: -1, currency: 'EUR' }));
      await refused(tx, 'component_figures', (db) => db.execute(sql`update component set figures = '[1400]'`));
    }));
});

describe('stock', () => {
  it('is flat or long, of a material that goes with it, and a remnant has its outline', () =>
    rolledBack(async (tx) => {
      const { workshopId, userId } = await shed(tx);
      const put =
        (changes: Pick<typeof stock.$inferInsert, 'kind' | 'material'> & Partial<typeof stock.$inferInsert>) =>
        (db: Tx) =>
          db.insert(stock).values({
            ...{ id: newId(), workshopId, name: 'S', createdBy: userId, createdAt: NOW, updatedAt: NOW },
            ...changes,
          });
      const flat = { thicknessMm: 5, widthMm: 700, heightMm: 500, grain: 'alongWidth' as const };
      const long = { outerWidthMm: 6, outerHeightMm: 6, wallMm: 1, lengthMm: 1000, massPerMetreG: 25 };
      const sheet = { kind: 'sheet' as const, material: 'xps' as const };
      const tube = { kind: 'tube' as const, material: 'tube' as const };
      const outlineMm = [[0, 0] as const, [700, 0] as const, [0, 500] as const];
      await put({ ...sheet, ...flat })(tx);
      await put({ ...tube, ...long })(tx);
      await put({ ...sheet, ...flat, kind: 'remnant', outlineMm })(tx);
      await refused(tx, 'stock_outline', put({ ...sheet, ...flat, kind: 'remnant' }));
      await refused(tx, 'stock_outline', put({ ...sheet, ...flat, outlineMm }));
      await refused(tx, 'stock_is_flat_or_long', put({ ...sheet, ...flat, lengthMm: 1000 }));
      await refused(tx, 'stock_is_flat_or_long', put({ ...tube, ...long, outerHeightMm: null }));
      await refused(tx, 'stock_kind', put({ ...sheet, ...flat, material: 'rod' }));
      await refused(tx, 'stock_sizes', put({ ...sheet, ...flat, thicknessMm: 0 }));
      await refused(tx, 'stock_count', put({ ...sheet, ...flat, count: -1 }));
    }));
});

describe('a printer profile', () => {
  it('is confirmed as a whole or not at all', () =>
    rolledBack(async (tx) => {
      const { workshopId, userId } = await shed(tx);
      const profile = {
        ...{ id: newId(), workshopId, name: 'Inkjet', drawnXMm: 100, drawnYMm: 100 },
        ...{ measuredXMm: 98.4, measuredYMm: 98.5, measuredBy: userId, measuredAt: NOW },
      };
      await tx.insert(printerProfile).values(profile);
      await refused(tx, 'printer_profile_name', (db) => db.insert(printerProfile).values({ ...profile, id: newId() }));
      await refused(tx, 'printer_profile_confirmed', (db) => db.update(printerProfile).set({ confirmedXMm: 98.4 }));
      await refused(tx, 'printer_profile_sizes', (db) => db.update(printerProfile).set({ measuredXMm: 0 }));
    }));
});

describe('a way in from outside', () => {
  it('is kept as a hash that exists once', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      await tx.insert(shareLink).values(linkOf(at, {}));
      await tx.insert(apiToken).values(tokenOf(at, {}));
      await refused(tx, 'share_link_token_hash_unique', (db) => db.insert(shareLink).values(linkOf(at, {})));
      await refused(tx, 'api_token_token_hash_unique', (db) => db.insert(apiToken).values(tokenOf(at, {})));
      const plain = { tokenHash: 'plain-token' };
      await refused(tx, 'share_link_token_hash', (db) => db.insert(shareLink).values(linkOf(at, plain)));
      await refused(tx, 'api_token_hash', (db) => db.insert(apiToken).values(tokenOf(at, plain)));
    }));

  it('ends after it began, and may do something', () =>
    rolledBack(async (tx) => {
      const at = await shed(tx);
      await refused(tx, 'share_link_expires', (db) => db.insert(shareLink).values(linkOf(at, { expiresAt: NOW })));
      await refused(tx, 'api_token_scopes', (db) => db.insert(apiToken).values(tokenOf(at, { scopes: [] })));
      const hook = {
        ...{ id: newId(), workshopId: at.workshopId, url: 'https://hooks.example.test/in', secret: 's' },
        ...{ events: ['revision.release'], createdBy: at.userId, createdAt: NOW, failures: 0 },
      };
      await refused(tx, 'webhook_address', (db) => db.insert(webhook).values({ ...hook, url: 'file:///etc/passwd' }));
      await refused(tx, 'webhook_events', (db) => db.insert(webhook).values({ ...hook, events: [] }));
      await tx.insert(webhook).values(hook);
      await refused(tx, 'webhook_url', (db) => db.insert(webhook).values({ ...hook, id: newId() }));
    }));
});

describe('an upload', () => {
  it('is one row for one content, within a workshop', () =>
    rolledBack(async (tx) => {
      const file = ({ workshopId, userId }: Shed, changes: Partial<typeof upload.$inferInsert> = {}) => ({
        ...{ id: newId(), workshopId, sha256: HASH, mediaType: 'image/png', sizeBytes: 10, widthPx: 2, heightPx: 2 },
        ...{ fileName: 'a.png', uploadedBy: userId, uploadedAt: NOW },
        ...changes,
      });
      const here = await shed(tx);
      await tx.insert(upload).values(file(here));
      await tx.insert(upload).values(file(await shed(tx)));
      await refused(tx, 'upload_content', (db) => db.insert(upload).values(file(here)));
      const other = { sha256: 'b'.repeat(64) };
      await refused(tx, 'upload_sizes', (db) => db.insert(upload).values(file(here, { ...other, sizeBytes: 0 })));
      await refused(tx, 'upload_pixels', (db) => db.insert(upload).values(file(here, { ...other, widthPx: null })));
      const [row] = await tx.select().from(upload).where(eq(upload.workshopId, here.workshopId));
      expect(row?.isPrivate).toBe(true);
    }));
});

describe('a job', () => {
  it('runs under a process, ends with a time, and fails with a reason', () =>
    rolledBack(async (tx) => {
      const { workshopId, userId } = await shed(tx);
      await tx.insert(job).values({
        ...{ id: newId(), workshopId, kind: 'plan', state: 'queued', input: {}, inputHash: HASH, progress: 0 },
        ...{ progressNote: '', requestedBy: userId, createdAt: NOW, attempts: 0 },
      });
      const set = (changes: Partial<typeof job.$inferInsert>) => (db: Tx) => db.update(job).set(changes);
      await refused(tx, 'job_running', set({ state: 'running', startedAt: NOW }));
      await set({ state: 'running', startedAt: NOW, workerId: 'w', aliveAt: NOW })(tx);
      await refused(tx, 'job_progress', set({ progress: 1.01 }));
      await refused(tx, 'job_finished', set({ state: 'done' }));
      await refused(tx, 'job_failure', set({ state: 'failed', finishedAt: LATER }));
      await set({ state: 'failed', finishedAt: LATER, failure: 'ran out of memory' })(tx);
    }));
});
