import { writeFileSync } from 'node:fs';
import { join } from 'node:path';

const FILE = 'demo-sign-ins.txt';

export const signInsPath = (folder) => join(folder, FILE);

/** One line a person: name, address, password, roles, with tabs between. */
export const signInLines = (signIns) =>
  signIns.map(({ name, email, password, roles }) => [name, email, password, roles.join(' ')].join('\t')).join('\n');

/** Keeps the demo's sign-ins where only the owner of the data folder reads them. Answers with the text. */
export function keepSignIns(folder, signIns) {
  const text = signInLines(signIns);
  writeFileSync(signInsPath(folder), `${text}\n`, { mode: 0o600 });
  return text;
}
