import { customType, datetime } from 'drizzle-orm/mysql-core';
import { v7 } from 'uuid';

/**
 * A UUIDv7 as text, compared byte by byte: the server's default collation would hold `aBc` equal to `AbC`.
 * Both ends of a foreign key must have this type, or MariaDB refuses it with errno 150.
 */
export const uuid = customType<{ data: string; driverData: string }>({
  dataType: () => 'char(36) CHARACTER SET ascii COLLATE ascii_bin',
});

/** A fresh id: UUIDv7, so that ids made later sort later and land at the end of the index. */
export const newId = (): string => v7();

/** Text compared byte by byte: tokens, hashes, addresses, keys. Never for what a person searches. */
export const exactText = customType<{ data: string; driverData: string; config: { length: number } }>({
  dataType: (config) => `varchar(${String(config?.length ?? 255)}) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin`,
});

/** A document. MariaDB's JSON is a checked text, which the driver may hand over unparsed. */
export const json = <T extends object>(name?: string) =>
  customType<{ data: T; driverData: string | T }>({
    dataType: () => 'json',
    toDriver: (value) => JSON.stringify(value),
    fromDriver: (value) => (typeof value === 'string' ? (JSON.parse(value) as T) : value),
  })(name ?? '');

/** A moment in UTC, to the millisecond. DATETIME, since TIMESTAMP ends in 2038 and shifts with the session's zone. */
export const moment = (name?: string) => datetime(name ?? '', { mode: 'date', fsp: 3 });
