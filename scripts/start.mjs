import { runMain } from './lib/failure.mjs';
import { serve } from './lib/serve.mjs';

// npm start: installs what is missing, builds what is stale, opens the database, serves the pages.
await runMain(() => serve('start'));
process.exit();
