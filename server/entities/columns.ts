import type { ColumnOptions } from 'typeorm';

/** A moment in UTC to the millisecond; set by the service, so that no clock but the app's counts. */
export const instant = (name: string): ColumnOptions => ({ name, type: 'datetime', precision: 3 });

export const optionalInstant = (name: string): ColumnOptions => ({ ...instant(name), nullable: true });

/** A number of bytes. The driver reads a bigint as text; every size here is far below 2^53. */
export const bytes = (name: string): ColumnOptions => ({
  name,
  type: 'bigint',
  transformer: { to: (value: number) => value, from: (value: string) => Number(value) },
});

/** SHA-256 in small hexadecimal digits. */
export const sha256 = (name: string): ColumnOptions => ({ name, type: 'char', length: 64 });
