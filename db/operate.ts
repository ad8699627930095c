// What the start script needs of the database, bundled into dist/operate.mjs.
export { databaseConfig } from './address';
export { closeDb } from './client';
export { migrateDatabase } from './migrate';
export { isSeeded } from './seeded';
