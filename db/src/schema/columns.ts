import { sql } from "drizzle-orm";
import { customType, datetime, varchar } from "drizzle-orm/mysql-core";

/** MariaDB's native 16-byte `uuid`; read and written as a lower-case string. */
export const uuid = customType<{ data: string; driverData: string }>({ dataType: () => "uuid" });

/** A SHA-256 as 64 hex digits, compared byte by byte. */
export const hex64 = customType<{ data: string; driverData: string }>({
  dataType: () => "char(64) character set ascii collate ascii_bin",
});

/** Text that must come back byte for byte, such as the text that was hashed. */
export const exactText = customType<{ data: string; driverData: string }>({
  dataType: () => "mediumtext character set utf8mb4 collate utf8mb4_bin",
});

/** A short code of ours, such as a role or a state: ASCII, compared byte by byte. */
export const code = customType<{ data: string; driverData: string; config: { length: number } }>({
  dataType: (config) => `varchar(${config?.length ?? 40}) character set ascii collate ascii_bin`,
});

/** A moment, UTC, to the millisecond. */
export const moment = (name: string) => datetime(name, { mode: "date", fsp: 3 });

/** The id of a row, made by the caller (UUIDv7). */
export const id = () => uuid("id").primaryKey();

/** When a row was made; the caller passes its clock. */
export const createdAt = () => moment("created_at").notNull();

export const name = (column = "name") => varchar(column, { length: 120 });
export const email = () => varchar("email", { length: 254 });

/** The present moment by the database's clock. */
export const now = sql`utc_timestamp(3)`;
