import type { Problem } from '@/lib/numerics/result';

/** Exit code for input that a person can mend. */
export const BAD_INPUT = 2;

/** One line a problem: path in the document, what was expected, what to do. */
export function reportProblems(problems: readonly Problem[]): number {
  for (const { path, message, fix } of problems) {
    process.stderr.write(`${path ? `${path}: ` : ''}${message}${fix ? ` (${fix})` : ''}\n`);
  }
  return BAD_INPUT;
}

/** Usage and other plain sentences. */
export function complain(sentence: string): number {
  process.stderr.write(`${sentence}\n`);
  return BAD_INPUT;
}

/** Writes all of a text to standard output and waits until it has been taken: a pipe may be slower than the program. */
export function print(text: string): Promise<void> {
  return new Promise((resolve, reject) => {
    process.stdout.write(text, (error) => (error ? reject(error) : resolve()));
  });
}
