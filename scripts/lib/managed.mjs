import { fork } from 'node:child_process';

/**
 * Starts a module as a child process with a channel. The child ends itself when the channel breaks, so it never outlives
 * this process. `exited` answers { code, signal }; `stop(ask, deadlineMs)` asks it to end and kills it when it doesn't.
 */
export function manage(module, args, options) {
  const child = fork(module, args, options);
  const exited = new Promise((resolve) => {
    child.once('error', (error) => resolve({ code: 1, signal: null, error }));
    child.once('exit', (code, signal) => resolve({ code, signal }));
  });
  const stop = async (ask, deadlineMs) => {
    const timer = setTimeout(() => child.kill('SIGKILL'), deadlineMs);
    ask(child);
    const end = await exited;
    clearTimeout(timer);
    return end;
  };
  return { child, exited, stop };
}
