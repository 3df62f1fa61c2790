import { z } from 'zod';
import type { SpreadDocument } from '../model/spread';
import { checkSettingsSchema } from './check-settings';
import { idSchema, instantSchema, lineSchema, revisionSchema } from './common';
import { bindingSchema, documentSchema, pageFormatSchema } from './document';
import { printSchema } from './prints';
import { trimSettingsSchema } from './accounts';

export const SPREAD_STATES = ['draft', 'in-review', 'approved', 'cut', 'mounted'] as const;
export type SpreadState = (typeof SPREAD_STATES)[number];

export const createAlbumSchema = z.strictObject({
  id: idSchema,
  title: lineSchema(120),
  formatId: z.string().min(1).max(60),
});
export type CreateAlbum = z.infer<typeof createAlbumSchema>;

export const updateAlbumSchema = z.strictObject({
  title: lineSchema(120).optional(),
  binding: bindingSchema.optional(),
  /** True puts the album with its spreads in the bin, false takes it out. */
  binned: z.boolean().optional(),
});
export type UpdateAlbum = z.infer<typeof updateAlbumSchema>;

export const albumSchema = z.object({
  id: idSchema,
  studioId: idSchema,
  title: z.string(),
  format: pageFormatSchema,
  binding: bindingSchema,
  spreadCount: z.int(),
  binned: z.boolean(),
});
export type Album = z.infer<typeof albumSchema>;

export const createSpreadSchema = z.strictObject({
  id: idSchema,
  title: lineSchema(120),
  /** A first or last leaf has a single page. */
  pages: z.enum(['both', 'left', 'right']).default('both'),
});
export type CreateSpread = z.infer<typeof createSpreadSchema>;

export const updateSpreadSchema = z.strictObject({
  title: lineSchema(120).optional(),
  position: z.int().nonnegative().optional(),
  /** True puts the spread in the bin, false takes it out. */
  binned: z.boolean().optional(),
});
export type UpdateSpread = z.infer<typeof updateSpreadSchema>;

export const spreadSummarySchema = z.object({
  id: idSchema,
  albumId: idSchema,
  studioId: idSchema,
  title: z.string(),
  position: z.int(),
  state: z.enum(SPREAD_STATES),
  revision: revisionSchema,
  updatedAt: instantSchema,
  binned: z.boolean(),
  document: documentSchema as z.ZodType<SpreadDocument>,
});
export type SpreadSummary = z.infer<typeof spreadSummarySchema>;

export const spreadListSchema = z.object({
  spreads: z.array(spreadSummarySchema),
  /** Every print that one of the spreads shows. */
  prints: z.array(printSchema),
});
export type SpreadList = z.infer<typeof spreadListSchema>;

/** All that Compose needs, in one answer. */
export const spreadDetailSchema = spreadSummarySchema.extend({
  albumTitle: z.string(),
  studioName: z.string(),
  unit: z.enum(['in', 'mm']),
  trim: trimSettingsSchema,
  /** Every print that the document names. */
  prints: z.array(printSchema),
  /** Copies of each of the studio's prints that its other live spreads use; prints that none uses are left out. */
  usedElsewhere: z.record(z.string(), z.int()),
  checks: checkSettingsSchema,
  may: z.object({ edit: z.boolean(), comment: z.boolean(), export: z.boolean() }),
});
export type SpreadDetail = z.infer<typeof spreadDetailSchema>;

/** Albums and spreads in the bin are listed on their own. */
export const binQuerySchema = z.strictObject({ binned: z.stringbool().default(false) });

export const albumListSchema = z.object({ albums: z.array(albumSchema) });
/** The shipped page formats first, then the studio's own. */
export const formatListSchema = z.object({ formats: z.array(pageFormatSchema) });
