import { z } from 'zod';
import type { CheckResult, RuleId } from '@/lib/checks/types';
import { texts } from '@/lib/text/en/checks';
import { QUANTITIES, type Quantity } from '@/lib/units/quantity';
import { list, name, point3 } from './frozenFields';

// What the check before cutting found, as it was frozen.

const text = z.string().max(4000);
const isKeyOf = (table: object, value: unknown): boolean => typeof value === 'string' && Object.hasOwn(table, value);

const measured = z.object({
  value: z.number(),
  quantity: z.custom<Quantity>((value) => isKeyOf(QUANTITIES, value), 'no such quantity'),
  least: z.number().optional(),
  most: z.number().optional(),
});

const check: z.ZodType<CheckResult> = z.object({
  ruleId: z.custom<RuleId>((value) => isKeyOf(texts.rules, value), 'no such rule'),
  elementId: name,
  path: name,
  at: point3,
  level: z.enum(['ok', 'watch', 'bad', 'note']),
  title: name,
  words: text,
  measured: measured.nullable(),
  fix: text.nullable(),
  source: name,
  waivable: z.boolean(),
  waived: text.nullable(),
});

export const checks = list(check);
