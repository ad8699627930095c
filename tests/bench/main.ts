import { analyseBench } from './analyseBench';
import { examples } from './examples';
import { factorBench } from './factorBench';
import { missedBars, say } from './report';
import { sizeBench } from './sizeBench';

// Ratios in one run; milliseconds depend on the machine and are only printed. Ends with code 1 when a bar is missed.

const unitMs = await factorBench();
say();
const all = examples();
await analyseBench(all, unitMs);
say();
await sizeBench(all, unitMs);
say();
const missed = missedBars();
say(missed.length === 0 ? 'All bars hold.' : `Missed: ${missed.join('; ')}`);
process.exitCode = missed.length === 0 ? 0 : 1;
