import { FolderInUse } from './lock';
import { type Embedded, serveEmbedded } from './serve';

// The database's own process. Its parent starts it with a channel, tells it when to end, and asks now and then whether it
// still answers; when the channel breaks, the parent is gone and this process ends too.

export const EXIT_IN_USE = 3;

const [folder, socket] = process.argv.slice(2);
if (folder === undefined || socket === undefined) throw new RangeError('usage: database.mjs FOLDER SOCKET');

// A terminal sends these to every process at once. The parent ends the pages first and this process last.
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => undefined);

const fail = (error: unknown): never => {
  if (error instanceof FolderInUse) {
    console.error(error.message);
    process.exit(EXIT_IN_USE);
  }
  console.error('The embedded database failed:', error);
  process.exit(1);
};

async function end(opening: Promise<Embedded>): Promise<void> {
  await (await opening).close();
  process.exit(0);
}

const opening = serveEmbedded({ folder, socket, onFault: fail });
process.on('message', (message) => {
  if (message === 'ping') process.send?.('pong');
  if (message === 'stop') end(opening).catch(fail);
});
process.on('disconnect', () => end(opening).catch(fail));
opening.then(() => process.send?.('ready'), fail);
