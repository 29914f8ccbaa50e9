import { customType, timestamp, uuid } from 'drizzle-orm/pg-core';
import { uuidv7 } from 'uuidv7';

/** A time-ordered id (UUIDv7), so that records of different installations never collide. */
export const id = () =>
  uuid()
    .primaryKey()
    .$defaultFn(() => uuidv7());

/** An instant in UTC, to the microsecond of the database clock. */
export const instant = () => timestamp({ withTimezone: true, mode: 'date' });

export const bytea = customType<{ data: Uint8Array; driverData: Buffer }>({
  dataType: () => 'bytea',
  toDriver: (bytes) => Buffer.from(bytes),
  fromDriver: (bytes) => new Uint8Array(bytes),
});

export const tsvector = customType<{ data: string }>({ dataType: () => 'tsvector' });
