import { ensureBundles } from './lib/bundle.mjs';
import { ensureDependencies } from './lib/dependencies.mjs';
import { runMain } from './lib/failure.mjs';
import { ensurePages } from './lib/pages.mjs';

const say = (line) => console.log(line);

// npm run build: everything that npm start would build, without starting it.
await runMain(async () => {
  await ensureDependencies(say);
  await ensureBundles();
  await ensurePages(say);
});
