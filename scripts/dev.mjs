import { runMain } from './lib/failure.mjs';
import { serve } from './lib/serve.mjs';

// npm run dev: as npm start, but the pages are compiled as they are asked for and load again after an edit.
await runMain(() => serve('dev'));
process.exit();
