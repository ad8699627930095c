import { spawn } from 'node:child_process';
import { root } from './root.mjs';

const running = new Set();

/** Ends what `run` has started and not yet seen the end of. */
export function endRunning() {
  for (const child of running) child.kill('SIGTERM');
}

/**
 * Runs a program in the checkout to its end. With `quiet` its output is kept and handed back instead of shown.
 * Answers { code, output }; a program that can't be started has code 127.
 */
export function run(program, args, { env = process.env, quiet = false } = {}) {
  return new Promise((resolve) => {
    const stdio = quiet ? ['ignore', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'];
    const child = spawn(program, args, { cwd: root, env, stdio });
    const output = [];
    child.stdout?.on('data', (bytes) => output.push(bytes));
    child.stderr?.on('data', (bytes) => output.push(bytes));
    running.add(child);
    const end = (code) => {
      running.delete(child);
      resolve({ code, output: Buffer.concat(output).toString('utf8') });
    };
    child.on('error', (error) => {
      output.push(Buffer.from(`${error.message}\n`));
      end(127);
    });
    child.on('close', (code) => end(code ?? 1));
  });
}

/** Runs a module with this Node. */
export const runNode = (args, options) => run(process.execPath, args, options);
