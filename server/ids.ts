import { createHash } from 'node:crypto';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

/** What is not an id can name nothing, and never reaches the database. */
export const isId = (value: string): boolean => UUID.test(value);

/** Number of a revision as it stands in a URL, or null. */
export const revisionNumber = (value: string): number | null => (/^[1-9]\d{0,8}$/.test(value) ? Number(value) : null);

/** sha256 as 64 hexadecimal digits. */
export const sha256 = (value: string | Uint8Array): string => createHash('sha256').update(value).digest('hex');
