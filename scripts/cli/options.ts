import { ok, type Result, refuse } from '@/lib/numerics/result';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';

const words = plan.cli;

export interface SheetsOptions {
  readonly file: string;
  readonly paper: string;
  readonly out: string;
  /** Print the workshop aids as well: stand, gauges, props and jigs, on sheets of their own. */
  readonly aids: boolean;
}

const bad = (message: string): Result<never> => refuse({ code: 'bad-option', path: '', message });

/** `FILE --paper ID --out DIR --aids`, options in any order. */
export function readSheetsOptions(args: readonly string[]): Result<SheetsOptions> {
  const values = new Map<string, string>();
  const files: string[] = [];
  let aids = false;
  for (let i = 0; i < args.length; i++) {
    const arg = args[i] ?? '';
    if (!arg.startsWith('--')) {
      files.push(arg);
      continue;
    }
    if (arg === '--aids') {
      aids = true;
      continue;
    }
    if (arg !== '--paper' && arg !== '--out') return bad(fill(words.unknownOption, { option: arg }));
    const value = args[++i];
    if (value === undefined || value.startsWith('--')) return bad(fill(words.optionWithoutValue, { option: arg }));
    values.set(arg, value);
  }
  const [file, ...rest] = files;
  const out = values.get('--out');
  if (file === undefined || rest.length > 0) return bad(fill(words.usageSheets, { papers: 'a4|letter' }));
  if (out === undefined) return bad(fill(words.missingOption, { option: '--out' }));
  return ok({ file, out, paper: values.get('--paper') ?? 'a4', aids });
}
