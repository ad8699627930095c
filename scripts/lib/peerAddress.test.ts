import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import { expect, it } from 'vitest';

// Asks itself twice, once with an address of its choice, and prints what arrived.
const PROGRAM = `
  import { createServer } from 'node:http';
  const server = createServer((request, response) => response.end(request.headers['x-forwarded-for']));
  server.listen(0, '127.0.0.1', async () => {
    const ask = async (headers) => (await fetch('http://127.0.0.1:' + server.address().port, { headers })).text();
    console.log(JSON.stringify([await ask({}), await ask({ 'x-forwarded-for': '198.51.100.7' })]));
    server.close();
    server.closeAllConnections();
  });
`;

it('writes down who is at the other end, after whatever the request claims', async () => {
  const preload = path.join(import.meta.dirname, 'peerAddress.mjs');
  const args = ['--import', preload, '--input-type=module', '--eval', PROGRAM];
  const { stdout } = await promisify(execFile)(process.execPath, args);
  expect(JSON.parse(stdout)).toEqual(['127.0.0.1', '198.51.100.7, 127.0.0.1']);
});
