import { z } from 'zod';
import { CUT_SIZE_KINDS, CUT_SIZE_STOCKS } from '../model/cut-size';
import { idSchema, lineSchema, sizeSchema } from './common';

export const cutSizeSchema = z.strictObject({
  id: idSchema,
  name: lineSchema(80),
  width: sizeSchema,
  height: sizeSchema,
  stock: z.enum(CUT_SIZE_STOCKS),
  kind: z.enum(CUT_SIZE_KINDS),
  sets: z.array(lineSchema(80)).max(20),
});
export const updateCutSizeSchema = cutSizeSchema.omit({ id: true }).partial();
export const cutSizeListSchema = z.object({ cutSizes: z.array(cutSizeSchema) });
