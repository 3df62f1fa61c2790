import { z } from 'zod';
import { idSchema, instantSchema } from './common';

export const grantScopeSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('spread-link'), spreadId: idSchema, mayComment: z.boolean() }),
  z.strictObject({ kind: z.literal('workshop'), workshopId: idSchema, copyStudioId: idSchema.nullable() }),
  z.strictObject({ kind: z.literal('worktable'), spreadId: idSchema }),
]);
export const createGrantSchema = z.strictObject({
  id: idSchema,
  scope: grantScopeSchema,
  expiresAt: instantSchema.nullable(),
});
export const grantSchema = z.object({
  id: idSchema,
  scope: grantScopeSchema,
  expiresAt: instantSchema.nullable(),
  withdrawnAt: instantSchema.nullable(),
});
export const grantListSchema = z.object({ grants: z.array(grantSchema) });
/** The only time that the token is told. */
export const createdGrantSchema = grantSchema.extend({ token: z.string() });
/** Header in which a grant's token is sent. */
export const GRANT_HEADER = 'x-pairleaf-grant';
