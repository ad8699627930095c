import { pathToFileURL } from 'node:url';
import { bundleCli } from './bundle-cli.mjs';

// Bundles the command line when its sources have changed, then runs it in this process.
await import(pathToFileURL(await bundleCli()).href);
