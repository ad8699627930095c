import { z } from 'zod';
import { ROLES } from './roles';

// Bodies that the API takes. The same schemas check a form in the browser and the request on the server.

// biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are exactly what is refused
const CONTROL = /[\u0000-\u001f\u007f]/;
// biome-ignore lint/suspicious/noControlCharactersInRegex: a paragraph keeps its line breaks and tabs
const CONTROL_IN_PARAGRAPH = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;

const filled = (max: number) =>
  z
    .string()
    .trim()
    .min(1, 'must not be empty')
    .max(max)
    .refine((value) => value.isWellFormed(), 'text must be well-formed Unicode');
const line = (max: number) =>
  filled(max).refine((value) => !CONTROL.test(value), 'text must not hold control characters');
const paragraph = (max: number) =>
  filled(max).refine((value) => !CONTROL_IN_PARAGRAPH.test(value), 'text must not hold control characters');

/** As a paragraph, but it may be left empty. */
const remark = (max: number) =>
  z
    .string()
    .trim()
    .max(max)
    .refine((value) => value.isWellFormed(), 'text must be well-formed Unicode')
    .refine((value) => !CONTROL_IN_PARAGRAPH.test(value), 'text must not hold control characters');

export const RoleSet = z
  .array(z.enum(ROLES))
  .min(1)
  .max(ROLES.length)
  .refine((roles) => new Set(roles).size === roles.length, 'each role once');

/** What a person calls themselves. It stands in mails and on prints. */
export const PersonName = line(80);

export const CreateWorkshop = z.strictObject({ name: line(80) });
export const RenameWorkshop = z.strictObject({ name: line(80) });
export const SetRoles = z.strictObject({ roles: RoleSet });
export const CreateInvitation = z.strictObject({ email: z.email().max(254), roles: RoleSet });

/** A starting layout by its id, or an airframe document (checked by `parseAirframe`). */
export const CreateDesign = z.union([
  z.strictObject({ name: line(80), layout: z.string().max(40) }),
  z.strictObject({ name: line(80), airframe: z.unknown() }),
]);
export const RenameDesign = z.strictObject({ name: line(80) });

export const SaveDraft = z.strictObject({ airframe: z.unknown() });
export const ReleaseRevision = z.strictObject({
  reason: paragraph(2000),
  expectedEffect: paragraph(2000),
  /** Version of the draft that is released; a newer one is refused so that nobody releases what they have not seen. */
  draftVersion: z.number().int().min(1),
});

export const ANCHOR_KINDS = ['point', 'element', 'part', 'figure', 'sheet', 'rule'] as const;
export const Anchor = z
  .strictObject({
    kind: z.enum(ANCHOR_KINDS),
    /** Element id, part key, figure id, sheet id or rule id. */
    key: line(200).optional(),
    view: z.enum(['plan', 'side', 'front', 'parts']).optional(),
    /** In the view's own axes, aircraft mm. */
    mm: z.tuple([z.number().min(-20_000).max(20_000), z.number().min(-20_000).max(20_000)]).optional(),
    /** Share along the element's length and chord, so that a pin follows its element. */
    shares: z.tuple([z.number().min(-5).max(5), z.number().min(-5).max(5)]).optional(),
  })
  .refine((anchor) => anchor.kind !== 'point' || (anchor.view !== undefined && anchor.mm !== undefined), {
    path: ['mm'],
    message: 'a point needs its view and its place in it',
  })
  .refine((anchor) => anchor.kind === 'point' || anchor.key !== undefined, {
    path: ['key'],
    message: 'say which element, part, figure, sheet or rule is meant',
  });
export type Anchor = z.infer<typeof Anchor>;

export const CreateThread = z.strictObject({ anchor: Anchor, text: paragraph(4000) });
export const SetThreadState = z.strictObject({ state: z.enum(['open', 'closed']) });
export const CreateComment = z.strictObject({ text: paragraph(4000) });

export const VERDICTS = ['goodToCut', 'hold', 'seen'] as const;
export type VerdictKind = (typeof VERDICTS)[number];
export const GiveVerdict = z
  .strictObject({ verdict: z.enum(VERDICTS), note: remark(2000).default('') })
  .refine((body) => body.verdict !== 'hold' || body.note.length > 0, {
    path: ['note'],
    message: 'say what has to change first',
  });
