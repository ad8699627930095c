import { spawn } from 'node:child_process';
import path from 'node:path';
import type { JobAnswer, JobRequest } from '@/lib/plan/job';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { queued } from './engine/queue';
import { AppError } from './problems';

/** A whole plan of the largest example takes a few seconds; what takes longer than this has gone wrong. */
const TIMEOUT_SECONDS = 60;
const MEMORY_MB = 512;
/** A plan of the largest document is under 20 MB as base64. */
const MAX_ANSWER_BYTES = 64 * 1024 * 1024;

const cli = (): string => path.join(/* turbopackIgnore: true */ process.cwd(), 'dist', 'cli.mjs');

/**
 * Runs one job of the chain in a process of its own: the bundled command line, so that the server gives the same bytes as it does.
 * Stopped by signal after a minute or when the request is aborted; memory is capped by flag. Never call it inside a transaction.
 * `by` is the person it is for, of whose jobs only so many may stand at once.
 */
export function runEngine(request: JobRequest, signal?: AbortSignal, by?: string): Promise<JobAnswer> {
  return queued(() => fork(request, signal), { signal, by });
}

function fork(request: JobRequest, signal: AbortSignal | undefined): Promise<JobAnswer> {
  return new Promise((resolve, reject) => {
    // The environment holds the server's secrets; the job needs none of it.
    const child = spawn(process.execPath, [`--max-old-space-size=${MEMORY_MB}`, cli(), 'job'], {
      env: { NODE_ENV: 'production' },
      stdio: ['pipe', 'pipe', 'pipe'],
    });
    const out: Buffer[] = [];
    let outBytes = 0;
    let complaint = '';
    let ended: AppError | null = null;
    const stop = (reason: AppError) => {
      ended ??= reason;
      child.kill('SIGKILL');
    };
    const late = fill(texts.details.engineTimedOut, { seconds: TIMEOUT_SECONDS });
    const timer = setTimeout(() => stop(new AppError('engine-failed', late)), TIMEOUT_SECONDS * 1000);
    const onAbort = () => stop(new AppError('busy', texts.details.busy));
    signal?.addEventListener('abort', onAbort, { once: true });
    if (signal?.aborted) onAbort();

    child.stdout.on('data', (chunk: Buffer) => {
      outBytes += chunk.length;
      if (outBytes > MAX_ANSWER_BYTES) stop(failed(`answer over ${MAX_ANSWER_BYTES} bytes`));
      else out.push(chunk);
    });
    child.stderr.on('data', (chunk: Buffer) => {
      complaint = (complaint + chunk.toString('utf8')).slice(0, 2000);
    });
    // A child that dies early closes its end; its exit code tells why.
    child.stdin.on('error', (error) => {
      complaint = `${complaint} ${error.message}`;
    });
    const finish = (act: () => void) => {
      clearTimeout(timer);
      signal?.removeEventListener('abort', onAbort);
      act();
    };
    child.on('error', (error) => finish(() => reject(failed(error.message))));
    child.on('close', (code) =>
      finish(() => {
        if (ended !== null) reject(ended);
        else if (code !== 0) reject(failed(`exit ${code}: ${complaint}`));
        else settle(Buffer.concat(out).toString('utf8'), resolve, reject);
      }),
    );
    child.stdin.end(JSON.stringify(request));
  });
}

function settle(text: string, resolve: (answer: JobAnswer) => void, reject: (error: AppError) => void): void {
  try {
    resolve(JSON.parse(text));
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    reject(failed(`unreadable answer: ${text.slice(0, 200)}`));
  }
}

/** The cause goes to the log; the caller learns that nothing was changed. */
function failed(cause: string): AppError {
  console.error(JSON.stringify({ level: 'error', where: 'engine', cause }));
  return new AppError('engine-failed', texts.details.engineFailed);
}
