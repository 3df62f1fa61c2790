import { z } from 'zod';
import { ROLES } from '../model/people';
import { idSchema, lineSchema } from './common';

/** Long enough to resist guessing (NIST SP 800-63B asks for at least 8); the upper limit keeps hashing cheap for the server. */
export const PASSWORD_MIN = 10;
export const PASSWORD_MAX = 200;

export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .pipe(z.email().max(254));

export const signInSchema = z.strictObject({ email: emailSchema, password: z.string().min(1).max(PASSWORD_MAX) });
export type SignIn = z.infer<typeof signInSchema>;

export const signUpSchema = z.strictObject({
  email: emailSchema,
  password: z.string().min(PASSWORD_MIN).max(PASSWORD_MAX),
  name: lineSchema(120),
  studioName: lineSchema(120),
});
export type SignUp = z.infer<typeof signUpSchema>;

export const trimSettingsSchema = z.strictObject({
  tolerance: z.int().nonnegative().max(2_000),
  finestMark: z.int().positive().max(2_000),
});

export const studioSchema = z.object({
  id: idSchema,
  name: z.string(),
  role: z.enum(ROLES),
  unit: z.enum(['in', 'mm']),
  trim: trimSettingsSchema,
});
export type Studio = z.infer<typeof studioSchema>;

export const updateStudioSchema = z.strictObject({
  name: lineSchema(120).optional(),
  unit: z.enum(['in', 'mm']).optional(),
  trim: trimSettingsSchema.optional(),
});

/** Who is signed in, with the studios that they belong to. */
export const sessionSchema = z.object({
  user: z.object({ id: idSchema, name: z.string(), email: z.string() }),
  studios: z.array(studioSchema),
  mode: z.enum(['demo', 'production']),
});
export type Session = z.infer<typeof sessionSchema>;

export const memberSchema = z.object({ userId: idSchema, name: z.string(), role: z.enum(ROLES) });
export type Member = z.infer<typeof memberSchema>;

export const memberListSchema = z.object({ members: z.array(memberSchema) });

/** What anyone may know of the server. The demo's accounts exist, and are told, in demo mode only. */
export const healthSchema = z.object({
  status: z.literal('ok'),
  mode: z.enum(['demo', 'production']),
  demoAccounts: z.array(z.object({ role: z.enum(ROLES), email: z.string(), password: z.string() })).optional(),
});
