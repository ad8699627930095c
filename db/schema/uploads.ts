import { bigint, boolean, check, index, integer, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, isSha256, positive, together } from './columns';

/** A file that somebody sent: a picture or a log. Its bytes are in the object storage under the hash; the same file sent twice is one row. */
export const upload = pgTable(
  'upload',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    /** Of the bytes as stored: a picture has been encoded anew by then. */
    sha256: text('sha256').notNull(),
    /** Found from the content, never taken from the name. */
    mediaType: text('media_type').notNull(),
    sizeBytes: bigint('size_bytes', { mode: 'number' }).notNull(),
    widthPx: integer('width_px'),
    heightPx: integer('height_px'),
    /** For a person to know it by; nothing is opened by it. */
    fileName: text('file_name').notNull(),
    /** Shown to members only; otherwise a share link shows it too. */
    isPrivate: boolean('is_private').notNull().default(true),
    uploadedBy: byUser('uploaded_by').notNull(),
    uploadedAt: at('uploaded_at').notNull(),
  },
  (table) => [
    unique('upload_in_workshop').on(table.id, table.workshopId),
    unique('upload_content').on(table.workshopId, table.sha256),
    check('upload_sha256', isSha256(table.sha256)),
    check('upload_sizes', positive(table.sizeBytes, table.widthPx, table.heightPx)),
    check('upload_pixels', together(table.widthPx, table.heightPx)),
    index('upload_workshop_idx').on(table.workshopId, table.uploadedAt),
  ],
);
