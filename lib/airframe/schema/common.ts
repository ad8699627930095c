import { z } from 'zod';
import { MAX_LENGTH_MM } from './limits';

export { MAX_LENGTH_MM } from './limits';

export const Id = z
  .string()
  .regex(/^[a-z][a-z0-9-]{0,31}$/, 'an id is 1 to 32 lower-case letters, digits or hyphens and begins with a letter');

/** Minus zero would print and hash differently from zero, so it becomes zero at the border. */
const number = () => z.number();
export const between = (min: number, max: number) => number().min(min).max(max);
export const lengthMm = (min = 0) => between(min, MAX_LENGTH_MM);
export const coordinateMm = between(-MAX_LENGTH_MM, MAX_LENGTH_MM);
export const share = between(0, 1);
export const angleDeg = (limit = 90) => between(-limit, limit);
export const massG = between(0, 50_000);
export const price = between(0, 1_000_000);
export const text = (max = 80) =>
  z
    .string()
    .trim()
    .min(1)
    .max(max)
    .refine((value) => value.isWellFormed(), 'text must be well-formed Unicode')
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are exactly what is refused
    .regex(/^[^\u0000-\u001f\u007f]*$/, 'text must not hold control characters');

export const Vec2Mm = z.tuple([coordinateMm, coordinateMm]);
export const Vec3Mm = z.tuple([coordinateMm, coordinateMm, coordinateMm]);

/** Where an element hangs. `at` is an offset from the parent's origin, or a place on a surface: share of its length from
 * root to tip, and share of the local chord. `end` picks the end of a boom or body (fore unless it says aft). */
export const Mount = z.strictObject({
  to: z.union([z.literal('datum'), Id]),
  at: z.union([Vec3Mm, z.strictObject({ station: share, chordShare: between(-1, 2) })]),
  end: z.enum(['fore', 'aft']).optional(),
});
export type Mount = z.infer<typeof Mount>;

/** Two angles of a thrust line or firewall: positive down and positive to the right. */
export const downRightDeg = z.tuple([angleDeg(30), angleDeg(30)]);
