import type { ExtractTablesWithRelations } from 'drizzle-orm';
import type { PgDatabase, PgQueryResultHKT, PgTransaction } from 'drizzle-orm/pg-core';
import type * as schema from './schema';

/** Either driver's database, or a transaction of it: a query does not care which. */
export type Db = PgDatabase<PgQueryResultHKT, typeof schema>;

/** What an act works in. Using the outer database inside one would wait on itself. */
export type Tx = PgTransaction<PgQueryResultHKT, typeof schema, ExtractTablesWithRelations<typeof schema>>;
