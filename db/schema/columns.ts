import { type SQL, sql } from 'drizzle-orm';
import { type AnyPgColumn, bigint, text, timestamp } from 'drizzle-orm/pg-core';

// What the tables have in common. It knows no table; belongs.ts does.

export const at = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

/** What something costs, in the currency's smallest unit (12.50 is 1250), and where the figure is from. `priceHolds` goes with it. */
export const price = () => ({
  priceMinor: bigint('price_minor', { mode: 'number' }),
  currency: text('currency'),
  priceSource: text('price_source'),
});

export const priceHolds = (table: { priceMinor: AnyPgColumn; currency: AnyPgColumn }): SQL =>
  sql`(${table.priceMinor} is null) = (${table.currency} is null) and ${table.priceMinor} >= 0 and ${table.currency} ~ '^[A-Z]{3}$'`;

const quoted = (words: readonly string[]): SQL => sql.raw(words.map((word) => `'${word}'`).join(', '));

export const oneOf = (column: AnyPgColumn, words: readonly string[]): SQL => sql`${column} in (${quoted(words)})`;

export const onlyOf = (column: AnyPgColumn, words: readonly string[]): SQL =>
  sql`${column} <@ array[${quoted(words)}]::text[]`;

export const filled = (column: AnyPgColumn): SQL => sql`length(btrim(${column})) > 0`;

export const isSha256 = (column: AnyPgColumn): SQL => sql`${column} ~ '^[0-9a-f]{64}$'`;

/** How many of the columns hold a value; to be compared. */
export const countOf = (...columns: readonly AnyPgColumn[]): SQL =>
  sql`num_nonnulls(${sql.join([...columns], sql`, `)})`;

/** Both hold a value, or neither does. */
export const together = (...columns: readonly AnyPgColumn[]): SQL =>
  sql`${countOf(...columns)} in (0, ${sql.raw(String(columns.length))})`;

/** None is under zero; one without a value is left alone. */
export const notNegative = (...columns: readonly AnyPgColumn[]): SQL =>
  sql.join(
    columns.map((column) => sql`${column} >= 0`),
    sql` and `,
  );

/** All are over zero; one without a value is left alone. */
export const positive = (...columns: readonly AnyPgColumn[]): SQL =>
  sql.join(
    columns.map((column) => sql`${column} > 0`),
    sql` and `,
  );
