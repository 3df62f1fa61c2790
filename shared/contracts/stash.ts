import { z } from 'zod';
import { COLOR_SOURCES, MAX_PALETTE, SIDE_PATTERNS, type StashFacts, type StashSheet } from '../model/stash';
import { hexSchema, idSchema, lineSchema, revisionSchema, sizeSchema } from './common';

/** Most kinds of sheet in one stash. */
export const MAX_STASH_SHEETS = 5000;
export const MAX_CSV_BYTES = 1024 * 1024;

const countSchema = z.int().nonnegative().max(100_000);
/** A line that may be empty. */
const optionalLine = (max: number) => z.union([z.literal(''), lineSchema(max)]);

export const stashSideSchema = z.strictObject({
  hex: hexSchema,
  source: z.enum(COLOR_SOURCES),
  uncertainty: z.number().positive().max(100),
  pattern: z.enum(SIDE_PATTERNS),
  palette: z.array(hexSchema).max(MAX_PALETTE),
});

export const stashFactsSchema = z.strictObject({
  name: lineSchema(80),
  maker: optionalLine(80),
  texture: optionalLine(80),
  place: optionalLine(80),
  width: sizeSchema,
  height: sizeSchema,
  quantity: countSchema,
  lowAt: countSchema.nullable(),
  price: z.int().nonnegative().max(10_000_000).nullable(),
  sides: z.union([z.tuple([stashSideSchema]), z.tuple([stashSideSchema, stashSideSchema])]),
});

export const createStashSheetSchema = stashFactsSchema.extend({ id: idSchema });
export type CreateStashSheet = StashFacts & { readonly id: string };

export const updateStashSheetSchema = stashFactsSchema.partial().extend({
  /** The revision last seen; an older one than the server's is a 409. */
  baseRevision: revisionSchema,
});
export type UpdateStashSheet = Partial<StashFacts> & { readonly baseRevision: number };

/** What many sheets can be given at once; `quantityBy` adds to each one's own quantity. */
export const bulkStashSchema = z.strictObject({
  sheetIds: z.array(idSchema).min(1).max(500),
  change: stashFactsSchema
    .pick({ maker: true, texture: true, place: true, lowAt: true, price: true })
    .partial()
    .extend({ quantityBy: z.int().min(-1000).max(1000).optional() })
    .refine((change) => Object.keys(change).length > 0, 'say what to change'),
});
export type BulkStash = z.infer<typeof bulkStashSchema>;

export const stashSheetSchema = stashFactsSchema.extend({
  id: idSchema,
  studioId: idSchema,
  reserved: z.int().nonnegative(),
  revision: revisionSchema,
}) satisfies z.ZodType<StashSheet, unknown>;

export const stashListSchema = z.object({ sheets: z.array(stashSheetSchema) });

export const importStashSchema = z.strictObject({
  /** Made by the client: sending the same file again under it adds nothing twice. */
  id: idSchema,
  csv: z.string().max(MAX_CSV_BYTES),
});
export const importedStashSchema = z.object({
  added: z.int(),
  changed: z.int(),
  faults: z.array(z.object({ line: z.int(), message: z.string(), text: z.string() })),
  /** The file's first line, to put over the rows that were not taken. */
  heading: z.string(),
});
export type ImportedStash = z.infer<typeof importedStashSchema>;

/** Where the marks stand on the photo: centres and side, as shares of the upright picture's width and height. */
export const markSchema = z.strictObject({ x: z.number().min(0).max(1), y: z.number().min(0).max(1) });
export type Mark = z.infer<typeof markSchema>;
/** Side of a mark, as a share of the picture's shorter side. */
export const MARK_SIDE = 0.08;

export const colorReadingSchema = z.object({
  hex: hexSchema,
  uncertainty: z.number().positive(),
});
export type ColorReading = z.infer<typeof colorReadingSchema>;

/** Every sheet set aside for one spread; replaces what was set aside before. */
export const reserveStashSchema = z.strictObject({
  sheets: z
    .array(z.strictObject({ sheetId: idSchema, sheets: z.int().positive().max(10_000) }))
    .max(50)
    .refine((list) => new Set(list.map(({ sheetId }) => sheetId)).size === list.length, 'a sheet is named twice'),
});
export const reservationListSchema = z.object({
  reservations: z.array(z.object({ sheetId: idSchema, spreadId: idSchema, sheets: z.int().positive() })),
});
