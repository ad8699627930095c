import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { guardData, isRecord, readText, withoutMinusZero } from './guard';
import { problemsOf } from './messages';
import { checkReferences } from './references';
import { checkRules } from './rules';
import { AIRFRAME_FORMAT, AIRFRAME_VERSION, type Airframe, AirframeShape } from './schema/airframe';

const words = texts.problems;
/** More than this at once is a wall, not a list. */
const MAX_PROBLEMS = 50;

const listed = (problems: readonly Problem[]): Result<never> => {
  if (problems.length <= MAX_PROBLEMS) return refuse(...problems);
  const count = problems.length - MAX_PROBLEMS;
  return refuse(...problems.slice(0, MAX_PROBLEMS), {
    code: 'more-problems',
    path: '',
    message: fill(words.more, { count }),
  });
};

const said = (value: unknown): string => JSON.stringify(value)?.slice(0, 60) ?? String(value);

/** What kind of document this is, before anything in it is judged: a file of another program deserves one sentence, not a hundred. */
function headProblem(document: Readonly<Record<string, unknown>>): Problem | null {
  const { format, version } = document;
  if (format === undefined) {
    return { code: 'missing-field', path: 'format', message: fill(words.formatMissing, { expected: AIRFRAME_FORMAT }) };
  }
  if (format !== AIRFRAME_FORMAT) {
    const message = fill(words.formatUnknown, { got: said(format), expected: AIRFRAME_FORMAT });
    return { code: 'unknown-format', path: 'format', message };
  }
  if (version === undefined) {
    return { code: 'missing-field', path: 'version', message: fill(words.versionMissing, { known: AIRFRAME_VERSION }) };
  }
  if (version === AIRFRAME_VERSION) return null;
  const newer = typeof version === 'number' && Number.isInteger(version) && version > AIRFRAME_VERSION;
  const message = fill(newer ? words.versionNewer : words.versionUnknown, {
    got: said(version),
    known: AIRFRAME_VERSION,
  });
  return { code: 'unknown-version', path: 'version', message };
}

/**
 * Plain data as an airframe, or every problem found with its path, what was expected and what to do.
 * Shape first, then ids and references, then what a sheet can be cut to: each only when the one before it holds.
 */
export function parseAirframe(input: unknown): Result<Airframe> {
  const unfit = guardData(input);
  if (unfit) return refuse(unfit);
  if (!isRecord(input)) {
    const got = Array.isArray(input) ? 'a list' : input === null ? 'null' : typeof input;
    return refuse({ code: 'not-an-object', path: '', message: fill(words.notAnObject, { got }) });
  }
  const head = headProblem(input);
  if (head) return refuse(head);
  const document = withoutMinusZero(input);
  const shaped = AirframeShape.safeParse(document);
  if (!shaped.success)
    return listed(shaped.error.issues.flatMap((issue) => problemsOf(issue, AirframeShape, document)));
  const references = checkReferences(shaped.data);
  if (references.length > 0) return listed(references);
  const rules = checkRules(shaped.data);
  return rules.length > 0 ? listed(rules) : ok(shaped.data);
}

/** The same from JSON text: at most 2 MB and 64 levels deep. */
export function parseAirframeText(text: string): Result<Airframe> {
  const data = readText(text);
  return data.ok ? parseAirframe(data.value) : data;
}
