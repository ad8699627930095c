// What the benchmarks print, and whether a bar was missed.

const missed: string[] = [];

export const say = (line = ''): void => console.log(line);

/** A ratio against the most that it may be. */
export function bar(
  name: string,
  ratio: number,
  most: number,
  { goal, detail }: { readonly goal?: number; readonly detail?: string } = {},
): void {
  const holds = ratio <= most;
  if (!holds) missed.push(name);
  const said = [`at most ${most}`, ...(goal === undefined ? [] : [`goal ${goal}`]), ...(detail ? [detail] : [])];
  say(`  ${holds ? 'ok    ' : 'MISSED'} ${name}: ${ratio.toFixed(2)} (${said.join(', ')})`);
}

/** Names of the bars that were missed so far. */
export const missedBars = (): readonly string[] => missed;

/** Lines of columns, numbers to the right. */
export function table(rows: readonly (readonly string[])[]): void {
  const widths = (rows[0] ?? []).map((_, column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  for (const row of rows)
    say(
      `  ${row.map((cell, i) => (i === 0 ? cell.padEnd(widths[i] ?? 0) : cell.padStart(widths[i] ?? 0))).join('  ')}`,
    );
}
