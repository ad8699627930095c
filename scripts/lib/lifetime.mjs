import { readFileSync } from 'node:fs';
import { endRunning } from './run.mjs';

const LOOK_MS = 1_000;

/** A process's name and its parent (proc(5), /proc/pid/stat); null where the system doesn't tell. */
function parentOf(pid) {
  try {
    const [, name, parent] = /^\d+ \((.*)\) \S (\d+) /s.exec(readFileSync(`/proc/${pid}/stat`, 'utf8')) ?? [];
    return { name, parent: Number(parent) };
  } catch {
    return null;
  }
}

/** Who runs this script, npm's shell left out: when that changes, the npm that runs it is gone. */
function runner() {
  const shell = parentOf(process.ppid);
  return shell?.name === 'sh' ? shell.parent : process.ppid;
}

/** Settles when this process is told to end: by signal, or because the npm that runs it is gone. */
export function untilTold() {
  return new Promise((resolve) => {
    const end = (why) => {
      endRunning();
      resolve(why);
    };
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => end(signal));
    if (process.env.npm_lifecycle_event === undefined) return;
    const npm = runner();
    setInterval(() => runner() !== npm && end('npm ended'), LOOK_MS).unref();
  });
}
