import { eq, sql } from 'drizzle-orm';
import { mysqlTable } from 'drizzle-orm/mysql-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { createDatabase } from '../../server/db/client.ts';
import { exactText, json, moment, newId, uuid } from '../../server/db/columns.ts';
import { ERRNO, errnoOf } from '../../server/db/errors.ts';
import { migrate } from '../../server/db/migrate.ts';
import { inTransaction } from '../../server/db/transaction.ts';
import { freshDatabase, testDatabase, type TestDatabase } from '../support/database.ts';

const thing = mysqlTable('thing', {
  id: uuid().primaryKey(),
  word: exactText({ length: 20 }).notNull(),
  body: json<{ mm: number; text: string }>('body').notNull(),
  at: moment().notNull(),
});

let database: TestDatabase;
beforeAll(async () => {
  database = await testDatabase();
  await database.db.execute(sql`DROP TABLE IF EXISTS thing`);
  await database.db.execute(sql`CREATE TABLE thing (
    id char(36) CHARACTER SET ascii COLLATE ascii_bin PRIMARY KEY,
    word varchar(20) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
    body json NOT NULL, at datetime(3) NOT NULL)`);
  return () => database.db.execute(sql`DROP TABLE thing`);
});

const write = async (word: string, at = new Date()) => {
  const id = newId();
  await database.db.insert(thing).values({ id, word, body: { mm: 1.5875, text: '⅜ 林 👩🏽‍🦱' }, at });
  return id;
};
const read = async (id: string) => {
  const [row] = await database.db.select().from(thing).where(eq(thing.id, id));
  return row;
};

describe('columns', () => {
  it('give back a document exactly, a sixteenth of an inch and every script included', async () => {
    const id = await write('x');
    expect((await read(id))?.body).toEqual({ mm: 1.5875, text: '⅜ 林 👩🏽‍🦱' });
  });

  it('give back a moment to the millisecond, in summer time too, and keep it in UTC', async () => {
    const at = new Date('2025-07-01T23:59:59.987Z');
    const id = await write('x', at);
    expect((await read(id))?.at).toEqual(at);
    const [rows] = await database.db.execute(
      sql`SELECT CAST(at AS CHAR) AS kept, @@session.time_zone AS zone FROM thing WHERE id = ${id}`,
    );
    expect(rows).toMatchObject([{ kept: '2025-07-01 23:59:59.987', zone: '+00:00' }]);
  });

  it('hold two texts apart that differ in capitals, accents or trailing blanks', async () => {
    for (const word of ['aBc', 'AbC', 'é', 'e']) await write(word);
    const rows = await database.db.select().from(thing).where(eq(thing.word, 'AbC'));
    expect(rows).toHaveLength(1);
    expect(await database.db.select().from(thing).where(eq(thing.word, 'e'))).toHaveLength(1);
  });

  it('make ids that sort as they were made', () => {
    const ids = Array.from({ length: 500 }, newId);
    expect([...ids].sort()).toEqual(ids);
    expect(new Set(ids).size).toBe(500);
  });
});

describe('migrating', () => {
  it('is done once where several processes start together', async () => {
    const url = await freshDatabase('leeway_migrating');
    const processes = [1, 2, 3].map(() => createDatabase(url, { connections: 2 }));
    await Promise.all(processes.map((one) => migrate(one)));
    const [first] = processes;
    const [rows] = await first!.db.execute(
      sql`SELECT COUNT(*) AS n, COUNT(DISTINCT hash) AS d FROM __drizzle_migrations`,
    );
    const [{ n, d }] = rows as unknown as [{ n: number; d: number }];
    expect(n).toBe(d);
    expect(n).toBeGreaterThan(0);
    await Promise.all(processes.map((one) => one.close()));
  });
});

describe('transactions', () => {
  it('write all or nothing', async () => {
    const before = await database.db.$count(thing);
    const failing = inTransaction(database.db, async (tx) => {
      await tx.insert(thing).values({ id: newId(), word: 'x', body: { mm: 1, text: '' }, at: new Date() });
      throw new Error('changed my mind');
    });
    await expect(failing).rejects.toThrow('changed my mind');
    expect(await database.db.$count(thing)).toBe(before);
  });

  it('begin again where two lock each other out, and both succeed', async () => {
    const [a, b] = [await write('a'), await write('b')];
    let attempts = 0;
    let waiting = 0;
    let letGo: () => void = () => undefined;
    const bothHold = new Promise<void>((resolve) => (letGo = resolve));
    const swap = (first: string, second: string, word: string) =>
      inTransaction(database.db, async (tx) => {
        attempts += 1;
        await tx.update(thing).set({ word }).where(eq(thing.id, first));
        waiting += 1;
        if (waiting >= 2) letGo();
        await bothHold;
        await tx.update(thing).set({ word }).where(eq(thing.id, second));
      });
    await Promise.all([swap(a, b, 'one'), swap(b, a, 'two')]);
    expect(attempts).toBe(3);
    expect((await read(a))?.word).toBe((await read(b))?.word);
  });

  it('do not begin again for any other failure', async () => {
    const id = await write('x');
    let attempts = 0;
    const failing = inTransaction(database.db, async (tx) => {
      attempts += 1;
      await tx.insert(thing).values({ id, word: 'x', body: { mm: 1, text: '' }, at: new Date() });
    });
    const error: unknown = await failing.catch((reason: unknown) => reason);
    expect([errnoOf(error), attempts]).toEqual([ERRNO.duplicate, 1]);
  });
});
