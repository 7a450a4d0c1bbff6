import { AsyncLocalStorage } from 'node:async_hooks';
import type { Db } from './client.ts';
import { inTransaction } from './transaction.ts';

interface Ambient {
  tx: Db;
  failures: unknown[];
}

const current = new AsyncLocalStorage<Ambient>();

/**
 * The database as a library is given it that opens no transaction around what we add to its work: inside `inAmbient` every
 * query goes through that transaction, outside straight to the database.
 */
export function ambientDb(db: Db): Db {
  return new Proxy(db, {
    get(target, key) {
      const at = current.getStore()?.tx ?? target;
      const value: unknown = Reflect.get(at, key, at);
      return typeof value === 'function' ? (value.bind(at) as unknown) : value;
    },
  });
}

/**
 * Runs the work in one transaction, which `ambientDb` uses too. It reads what is committed at the moment of reading, so
 * that a token spent by another request meanwhile is seen as spent.
 */
export function inAmbient<T>(db: Db, work: (tx: Db) => Promise<T>): Promise<T> {
  return inTransaction(
    db,
    async (tx) => {
      const ambient: Ambient = { tx, failures: [] };
      const result = await current.run(ambient, () => work(tx));
      if (ambient.failures.length > 0) throw ambient.failures[0];
      return result;
    },
    { isolationLevel: 'read committed' },
  );
}

/** Work that the library would go on without: where it fails, the transaction around fails. */
export async function mustSucceed(work: () => Promise<unknown>): Promise<void> {
  try {
    await work();
  } catch (error) {
    current.getStore()?.failures.push(error);
    throw error;
  }
}
