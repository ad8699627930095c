import { z } from 'zod';

// What the frozen artefacts of a file are checked with, in common.

const MAX_ENTRIES = 10_000;

export const mm = z.number().min(-100_000).max(100_000);
export const name = z.string().max(400);
export const point = z.tuple([mm, mm]);
export const point3 = z.tuple([z.number(), z.number(), z.number()]);
export const list = <T extends z.ZodType>(of: T) => z.array(of).max(MAX_ENTRIES);

export const problem = z.object({
  code: name,
  path: name,
  message: z.string().max(4000),
  fix: z.string().max(4000).optional(),
});
