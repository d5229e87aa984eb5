import type { ColumnOptions } from 'typeorm';

/** Column settings that every entity shares, so that lengths and types are written once. */
export const instantColumn = { type: 'datetime', precision: 6 } as const satisfies ColumnOptions;
/** SHA-256 as lower-case hex. */
export const sha256Column = {
  type: 'char',
  length: 64,
  charset: 'ascii',
  collation: 'ascii_bin',
} as const satisfies ColumnOptions;

/** A word from a closed list; compared byte by byte. */
export function codeColumn(length: number): ColumnOptions & { type: 'varchar' } {
  return { type: 'varchar', length, charset: 'ascii', collation: 'ascii_bin' };
}
