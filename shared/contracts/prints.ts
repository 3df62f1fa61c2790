import { z } from 'zod';
import type { Print } from '../model/print';
import { dateSchema, hexSchema, idSchema, lineSchema, pageQuerySchema, positionSchema, revisionSchema, sizeSchema, turnsSchema } from './common';

export const MAX_UPLOAD_BYTES = 50 * 1024 * 1024;
export const MAX_PIXELS = 100_000_000;
export const MAX_FILES_AT_ONCE = 200;
export const TITLE_MAX = 120;

const pxSchema = z.int().min(-200_000).max(200_000);
const pxSizeSchema = z.int().positive().max(200_000);

export const pxRectSchema = z.strictObject({ x: pxSchema, y: pxSchema, width: pxSizeSchema, height: pxSizeSchema });

export const marksSchema = z.strictObject({
  noUp: z.boolean(),
  oneOfAKind: z.boolean(),
  borrowedUntil: dateSchema.nullable(),
  instantFilm: z.boolean(),
  digital: z.boolean(),
});

export const detailSchema = z.strictObject({ id: idSchema, name: lineSchema(TITLE_MAX), rect: pxRectSchema });
export const faceSchema = z.strictObject({ rect: pxRectSchema, facing: z.enum(['left', 'right', 'ahead']).optional() });
export const horizonSchema = z.strictObject({ x1: pxSchema, y1: pxSchema, x2: pxSchema, y2: pxSchema });

export const swatchSchema = z.object({
  hex: hexSchema,
  oklch: z.tuple([z.number(), z.number(), z.number()]),
  share: z.number().positive().max(1),
  role: z.enum(['vibrant', 'muted', 'dark-vibrant', 'dark-muted', 'light-vibrant', 'light-muted', 'area']),
});

export const rasterSchema = z.object({ width: z.int().positive(), height: z.int().positive(), data: z.string() });

/** What a person can set on a print; a key that is left out stays as it is. */
export const updatePrintSchema = z.strictObject({
  /** The revision last seen; an older one than the server's is a 409. */
  baseRevision: revisionSchema,
  title: lineSchema(TITLE_MAX).optional(),
  pileId: idSchema.nullable().optional(),
  position: positionSchema.optional(),
  paperWidth: sizeSchema.optional(),
  paperHeight: sizeSchema.optional(),
  turns: turnsSchema.optional(),
  copies: z.int().min(1).max(99).optional(),
  marks: marksSchema.partial().optional(),
  paperRect: pxRectSchema.optional(),
  keepZone: pxRectSchema.nullable().optional(),
  details: z.array(detailSchema).max(12).optional(),
  faces: z.array(faceSchema).max(60).optional(),
  horizon: horizonSchema.nullable().optional(),
  /** True puts the print in the bin, false takes it out; refused while a spread uses it. */
  binned: z.boolean().optional(),
});
export type UpdatePrint = z.infer<typeof updatePrintSchema>;

export const printSchema = z.object({
  id: idSchema,
  studioId: idSchema,
  pileId: idSchema.nullable(),
  position: z.int(),
  title: z.string(),
  paperWidth: z.int(),
  paperHeight: z.int(),
  turns: turnsSchema,
  copies: z.int(),
  marks: marksSchema,
  imageWidth: z.int(),
  imageHeight: z.int(),
  paperRect: pxRectSchema,
  keepZone: pxRectSchema.nullable(),
  details: z.array(detailSchema),
  faces: z.array(faceSchema),
  horizon: horizonSchema.nullable(),
  palette: z.array(swatchSchema),
  raster: rasterSchema,
  revision: revisionSchema,
}) satisfies z.ZodType<Print, unknown>;

/** Answer to an upload: the print, and whether the studio already had this very file. */
export const uploadedPrintSchema = z.object({ print: printSchema, known: z.boolean() });
export type UploadedPrint = z.infer<typeof uploadedPrintSchema>;

export const printListSchema = z.object({ prints: z.array(printSchema), nextCursor: z.string().nullable() });

export const pileSchema = z.object({
  id: idSchema,
  studioId: idSchema,
  name: z.string(),
  position: z.int(),
  sharedWithContributors: z.boolean(),
});
export type Pile = z.infer<typeof pileSchema>;

/** `pileId` and `binned` choose; prints in the bin are listed on their own. */
export const printQuerySchema = pageQuerySchema.extend({ pileId: idSchema.optional(), binned: z.stringbool().default(false) });

export const pileListSchema = z.object({ piles: z.array(pileSchema) });

export const createPileSchema = z.strictObject({ id: idSchema, name: lineSchema(80) });
export const updatePileSchema = z.strictObject({
  name: lineSchema(80).optional(),
  position: positionSchema.optional(),
  sharedWithContributors: z.boolean().optional(),
});

/** Sizes in which the server serves pictures: longest side in px. */
export const PICTURE_SIZES = { small: 320, medium: 800, large: 1600 } as const;
export type PictureSize = keyof typeof PICTURE_SIZES;
export const pictureParamsSchema = z.strictObject({ printId: idSchema, size: z.enum(['small', 'medium', 'large']) });

/** The address of a print's picture, upright as the EXIF says (the print's own `turns` are not applied). */
export const pictureUrl = (printId: string, size: PictureSize): string => `/api/pictures/${printId}/${size}`;
