import { mkdtempSync, rmSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { Client, Pool } from 'pg';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { socketConfig } from '../address';
import { type Gateway, openGateway } from './gateway';
import { Turns } from './turns';

let database: PGlite;
let gateway: Gateway;
let pool: Pool;
let socket: string;
let synchronised = 0;
let room = true;
const faults: unknown[] = [];

beforeAll(async () => {
  database = await PGlite.create();
  await database.exec('create table entry (id int primary key, note text)');
}, 60_000);
afterAll(() => database.close());

beforeEach(async () => {
  socket = join(mkdtempSync(join(tmpdir(), 'foldspar-gateway-')), '.s.PGSQL.5432');
  await database.exec('delete from entry');
  synchronised = 0;
  room = true;
  const shared = {
    backend: database,
    turns: new Turns(),
    idleLimitMs: 300,
    hasRoom: async () => room,
    synchronise: async () => {
      synchronised += 1;
    },
  };
  gateway = await openGateway(socket, shared, (error) => faults.push(error));
  pool = new Pool({ ...socketConfig(socket), max: 8 });
  pool.on('error', () => undefined);
});
afterEach(async () => {
  await pool.end();
  await gateway.close();
  rmSync(dirname(socket), { recursive: true, force: true });
  expect(faults).toEqual([]);
});

async function client(): Promise<Client> {
  const opened = new Client(socketConfig(socket));
  opened.on('error', () => undefined);
  await opened.connect();
  return opened;
}
const count = async (): Promise<number> =>
  (await database.query<{ n: number }>('select count(*)::int n from entry')).rows[0]?.n ?? -1;
/** A moment in which everybody else gets to run. */
const pause = () => new Promise<void>((resolve) => setImmediate(resolve));

describe('many clients on one backend', () => {
  it('keeps queries of a pool of 8 apart while transactions are open', async () => {
    const one = async (i: number): Promise<boolean> => {
      if (i % 4 !== 0) {
        const text = i % 2 ? 'select $1::int as v, $2::text as w' : 'select $1::int * 2 as d, $1::int as v';
        const { rows } = await pool.query(text, i % 2 ? [i, 'x'] : [i]);
        return rows[0]?.v === i;
      }
      const own = await pool.connect();
      try {
        await own.query('begin');
        await own.query('insert into entry values ($1, $2)', [i, `note ${i}`]);
        await pause();
        const { rows } = await own.query('select count(*)::int as n from entry where note = $1', [`note ${i}`]);
        await own.query(i % 8 === 0 ? 'commit' : 'rollback');
        return rows[0]?.n === 1;
      } finally {
        own.release();
      }
    };
    const right = await Promise.all(Array.from({ length: 400 }, (_, i) => one(i)));
    expect(right.filter((ok) => !ok)).toEqual([]);
    expect(await count()).toBe(50);
  }, 30_000);

  it('loses no update: each of 200 transactions reads, waits and writes', async () => {
    await pool.query("insert into entry values (1, '0')");
    const addOne = async () => {
      const own = await pool.connect();
      await own.query('begin');
      const { rows } = await own.query('select note from entry where id = 1');
      await pause();
      await own.query('update entry set note = $1 where id = 1', [String(Number(rows[0]?.note) + 1)]);
      await own.query('commit');
      own.release();
    };
    await Promise.all(Array.from({ length: 200 }, addOne));
    expect((await pool.query('select note from entry')).rows).toEqual([{ note: '200' }]);
  }, 30_000);

  it('lets nobody see what is not committed', async () => {
    const writer = await client();
    await writer.query('begin');
    await writer.query("insert into entry values (1, 'half')");
    const seen = pool.query('select count(*)::int as n from entry');
    await pause();
    await writer.query('rollback');
    expect((await seen).rows).toEqual([{ n: 0 }]);
    await writer.end();
  });

  it('answers an error and goes on', async () => {
    await expect(pool.query('select $1::int / 0', [1])).rejects.toMatchObject({ code: '22012' });
    await expect(pool.query('selec $1', [1])).rejects.toMatchObject({ code: '42601' });
    expect((await pool.query('select $1::int as v', [7])).rows).toEqual([{ v: 7 }]);
  });

  it('carries a text of a megabyte both ways', async () => {
    const text = 'ä'.repeat(1_000_000);
    expect((await pool.query('select $1::text as t', [text])).rows).toEqual([{ t: text }]);
  });
});

describe('clients that leave or keep silent', () => {
  it('undoes what a client left open and lets the next one in', async () => {
    const leaver = await client();
    await leaver.query('begin');
    await leaver.query("insert into entry values (1, 'left')");
    const next = pool.query("insert into entry values (2, 'next')");
    await leaver.end();
    await next;
    expect((await pool.query('select id from entry')).rows).toEqual([{ id: 2 }]);
  });

  it('undoes what a client left open whose connection broke in the middle of a query', async () => {
    const raw = connect(socket);
    const parse = Buffer.from('P\0\0\0\x10\0select 1\0\0\0', 'latin1');
    const startup = Buffer.from('\0\0\0\x18\0\x03\0\0user\0postgres\0\0', 'latin1');
    startup.writeInt32BE(startup.length, 0);
    parse.writeInt32BE(parse.length - 1, 1);
    raw.write(startup);
    await new Promise((resolve) => raw.once('data', resolve));
    raw.write(parse);
    await pause();
    raw.destroy();
    expect((await pool.query('select $1::int as v', [3])).rows).toEqual([{ v: 3 }]);
  });

  it('rolls back a transaction that says nothing, tells its client and lets the others in', async () => {
    const silent = await client();
    const told = new Promise<Error>((resolve) => silent.on('error', resolve));
    await silent.query('begin');
    await silent.query("insert into entry values (1, 'silent')");
    expect((await pool.query('select count(*)::int as n from entry')).rows).toEqual([{ n: 0 }]);
    expect(await told).toMatchObject({ code: '25P03' });
  });
});

describe('what must be on the disk', () => {
  it('is there before the client hears of its commit, and a read waits for nothing', async () => {
    await pool.query('select 1');
    await pool.query('select count(*) from entry where id = $1', [1]);
    expect(synchronised).toBe(0);
    await pool.query('insert into entry values ($1, $2)', [1, 'one']);
    expect(synchronised).toBe(1);
    const own = await client();
    await own.query('begin');
    await own.query('update entry set note = $1', ['two']);
    expect(synchronised).toBe(1);
    await own.query('commit');
    expect(synchronised).toBe(2);
    await own.end();
  });

  it('is refused as disk_full when there is too little room, with reading still possible', async () => {
    room = false;
    await expect(pool.query("insert into entry values (1, 'one')")).rejects.toMatchObject({ code: '53100' });
    await expect(pool.query('insert into entry values ($1, $2)', [1, 'one'])).rejects.toMatchObject({ code: '53100' });
    expect((await pool.query('select count(*)::int as n from entry where id = $1', [1])).rows).toEqual([{ n: 0 }]);
    const own = await client();
    await own.query('begin');
    await expect(own.query('insert into entry values ($1, $2)', [2, 'two'])).rejects.toMatchObject({ code: '53100' });
    await expect(own.query('select 1')).rejects.toMatchObject({ code: '25P02' });
    await own.query('rollback');
    room = true;
    await own.query('insert into entry values ($1, $2)', [3, 'three']);
    await own.end();
    expect(await count()).toBe(1);
  });
});
