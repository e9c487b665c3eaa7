import { customType } from 'drizzle-orm/mysql-core';

/** MariaDB fails on a comparison of an ASCII column with other text; with a "?" in it such text fits nothing. */
const inAscii = (value: string): string => value.replace(/[^\x20-\x7e]/g, '?');

/** Time-ordered UUID as text. */
export const id = customType<{ data: string; driverData: string }>({
  dataType: () => 'char(36) character set ascii collate ascii_bin',
  toDriver: inAscii,
});

/** A code that differs by case: the default collation would call "a1" and "A1" the same. */
export const code = customType<{ data: string; config: { length: number }; configRequired: true }>({
  dataType: (config) => `varchar(${config.length}) character set utf8mb4 collate utf8mb4_bin`,
});

/** 'YYYY-MM-DD', never a Date. */
export const day = customType<{ data: string }>({ dataType: () => 'date' });

/** 'YYYY-MM'. */
export const month = customType<{ data: string; driverData: string }>({
  dataType: () => 'char(7) character set ascii collate ascii_bin',
  toDriver: inAscii,
});

/** Whole units; signed, since UNSIGNED minus a larger number is an error. Safe integers only. */
export const units = customType<{ data: number; driverData: number | string }>({
  dataType: () => 'bigint',
  fromDriver: (value) => Number(value),
});

/** Decimal string with four decimals, enough for every minor unit of ISO 4217. */
export const amount = customType<{ data: string; driverData: string }>({
  dataType: () => 'decimal(19,4)',
});

/** Decimal string with six decimals: fees may be finer than the minor unit. */
export const rate = customType<{ data: string; driverData: string }>({
  dataType: () => 'decimal(19,6)',
});

/** UTC instant as 'YYYY-MM-DD HH:MM:SS.mmm' text in the driver, ISO 8601 in the program. */
export const instant = customType<{ data: string; driverData: string }>({
  dataType: () => 'datetime(3)',
  fromDriver: (value) => `${String(value).replace(' ', 'T')}Z`,
  toDriver: (value) => value.replace('T', ' ').replace('Z', ''),
});

/** JSON text, parsed on the way out. */
export const json = customType<{ data: unknown; driverData: string }>({
  dataType: () => 'longtext character set utf8mb4 collate utf8mb4_bin',
  fromDriver: (value) => JSON.parse(value) as unknown,
  toDriver: (value) => JSON.stringify(value),
});
