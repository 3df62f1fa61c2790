import { z } from 'zod';
import type { SpreadDocument } from '../model/spread';
import { MAX_MATS, SCHEMA_VERSION } from '../model/spread';
import { hexSchema, idSchema, lineSchema, offsetSchema, sideSchema, sizeSchema, textSchema, turnsSchema } from './common';

export const JOURNALING_MAX = 4000;
export const LETTERING_MAX = 200;
/** Steps along either side of a page. */
export const MAX_STEPS = 400;

export const pageFormatSchema = z.strictObject({
  id: lineSchema(60),
  name: lineSchema(60),
  width: sizeSchema,
  height: sizeSchema,
  step: sizeSchema,
  gap: z.int().nonnegative().multipleOf(2),
  edge: z.enum(['margin', 'bleed']),
  minMargin: z.int().nonnegative(),
  unit: z.enum(['in', 'mm']),
});

const hiddenSchema = z.int().nonnegative().max(200_000);
export const bindingSchema = z.strictObject({
  singleFirst: z.boolean(),
  singleLast: z.boolean(),
  hiddenEdge: z.strictObject({ left: hiddenSchema, right: hiddenSchema }),
  gap: hiddenSchema,
  sleeves: z.boolean(),
});

const placementShape = {
  printId: idSchema,
  mode: z.enum(['window', 'whole']),
  x: offsetSchema,
  y: offsetSchema,
  turn: turnsSchema,
  scaledWidth: sizeSchema.nullable(),
  detailId: idSchema.nullable(),
};

export const contentSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('bare') }),
  z.strictObject({ kind: z.literal('print'), ...placementShape }),
  z.strictObject({ kind: z.literal('pane'), groupId: idSchema }),
  z.strictObject({ kind: z.literal('paper'), pattern: z.enum(['stripe', 'dot', 'check', 'plain']), color: hexSchema, ground: hexSchema }),
  z.strictObject({ kind: z.literal('lettering'), text: textSchema(LETTERING_MAX), color: hexSchema, letterHeight: sizeSchema }),
  z.strictObject({ kind: z.literal('journaling'), text: textSchema(JOURNALING_MAX), color: hexSchema, lineHeight: sizeSchema }),
  z.strictObject({ kind: z.literal('embellishment'), name: lineSchema(120), color: hexSchema }),
  z.strictObject({
    kind: z.literal('keepsake'),
    name: lineSchema(120),
    width: sizeSchema,
    height: sizeSchema,
    thickness: z.int().nonnegative().max(16_000),
    fragile: z.boolean(),
    acidic: z.boolean(),
  }),
]);

const revealSchema = z.int().nonnegative().max(40_640);
const stepsSchema = z.int().nonnegative().max(MAX_STEPS);

export const matSchema = z.strictObject({
  id: idSchema,
  page: sideSchema,
  x: stepsSchema,
  y: stepsSchema,
  w: z.int().positive().max(MAX_STEPS),
  h: z.int().positive().max(MAX_STEPS),
  z: z.int().min(-1_000_000).max(1_000_000),
  color: hexSchema,
  reveal: revealSchema.nullable(),
  inner: z.strictObject({ color: hexSchema, reveal: revealSchema }).nullable(),
  trueSize: z.strictObject({ width: sizeSchema, height: sizeSchema }).nullable(),
  laidOver: z.boolean(),
  focal: z.boolean(),
  content: contentSchema,
});

export const paneGroupSchema = z.strictObject({
  id: idSchema,
  matIds: z.array(idSchema).min(2).max(MAX_MATS),
  content: z.strictObject({ ...placementShape, mode: z.literal('window'), run: z.enum(['behind', 'apart']) }).nullable(),
});

export const pageSchema = z.strictObject({ color: hexSchema });

const schemeColorSchema = z.strictObject({ hex: hexSchema, printIds: z.array(idSchema).max(200) });
export const schemeSchema = z.strictObject({
  character: z.enum(['echo', 'quiet', 'lift']),
  colors: z.strictObject({ base: schemeColorSchema, main: schemeColorSchema, second: schemeColorSchema, accent: schemeColorSchema }),
});

export const tableSchema = z.array(idSchema).max(500);

/** The shape of a document; `findDocumentFaults` holds the rules that a shape cannot say. */
export const documentSchema = z.strictObject({
  schemaVersion: z.literal(SCHEMA_VERSION),
  format: pageFormatSchema,
  binding: bindingSchema,
  pages: z.strictObject({ left: pageSchema.nullable(), right: pageSchema.nullable() }),
  reveal: revealSchema,
  mats: z.array(matSchema).max(MAX_MATS),
  panes: z.array(paneGroupSchema).max(MAX_MATS),
  table: tableSchema,
  scheme: schemeSchema.nullable(),
}) satisfies z.ZodType<SpreadDocument, unknown>;
