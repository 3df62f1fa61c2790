import { z } from 'zod';
import { ERROR_CODES } from '../errors';

/** A UUID; small digits, so that two spellings are one id. */
export const idSchema = z.uuid().toLowerCase();
export const hexSchema = z.string().regex(/^#[0-9a-f]{6}$/, 'a colour is # and six small hexadecimal digits');
/** A length that a thing can have: above nothing, and under 10 m. */
export const sizeSchema = z.int().positive().max(1_600_000);
/** A place or a signed distance. */
export const offsetSchema = z.int().min(-1_600_000).max(1_600_000);
export const turnsSchema = z.union([z.literal(0), z.literal(1), z.literal(2), z.literal(3)]);
export const sideSchema = z.enum(['left', 'right']);
export const dateSchema = z.iso.date();
export const instantSchema = z.iso.datetime();
export const revisionSchema = z.int().nonnegative();
/** A place in a list that people put in order; a list is never this long. */
export const positionSchema = z.int().nonnegative().max(1_000_000);

/**
 * What no text keeps: halves of characters, which no database and no file name takes, and marks that turn the
 * reading direction, which can disguise a name.
 */
const UNFIT = /[\p{Cs}\u200e\u200f\u202a-\u202e\u2066-\u2069]/gu;

/**
 * A line of text as people type it: trimmed, in Unicode's composed form, without control characters. Reading a
 * result once more changes nothing: an edit is held against the text that was stored.
 */
export const lineSchema = (max: number) =>
  z
    .string()
    .transform((text) => text.replace(UNFIT, '').replace(/\p{Cc}/gu, '').normalize('NFC').trim())
    .pipe(z.string().min(1).max(max));

/** Several lines of text; may be empty. */
export const textSchema = (max: number) =>
  z
    .string()
    .transform((text) => text.replace(UNFIT, '').replace(/(?!\n)\p{Cc}/gu, '').normalize('NFC'))
    .pipe(z.string().max(max));

/** RFC 9457 problem details; `code` is what a client reads, `fields` names every field that did not fit. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  instance: z.string().optional(),
  code: z.enum(ERROR_CODES),
  fields: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  data: z.record(z.string(), z.unknown()).optional(),
});
export type Problem = z.infer<typeof problemSchema>;

export const pageQuerySchema = z.strictObject({
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(100),
});
