import { z } from 'zod';
import type { Patch } from '../model/patch';
import { idSchema, instantSchema, lineSchema, revisionSchema } from './common';
import { fieldFaults } from './field-faults';
import { matSchema, pageSchema, paneGroupSchema, schemeSchema, tableSchema } from './document';

const changeOf = <T extends z.ZodType>(value: T) => z.strictObject({ before: value.nullable(), after: value.nullable() });

const UUID = '[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}';

/** Which schema a document key's values have. */
const KEY_SCHEMAS: readonly [RegExp, z.ZodType][] = [
  [/^page\/(left|right)$/, changeOf(pageSchema)],
  [/^reveal$/, changeOf(z.int().nonnegative().max(40_640))],
  [/^table$/, changeOf(tableSchema)],
  [/^scheme$/, changeOf(schemeSchema)],
  [new RegExp(`^mat/${UUID}$`), changeOf(matSchema)],
  [new RegExp(`^panes/${UUID}$`), changeOf(paneGroupSchema)],
];

export const MAX_KEYS_PER_PATCH = 700;

/** A patch; every key is checked against the schema of its value, and every fault is named by its path. */
export const patchSchema = z.record(z.string().max(60), z.unknown()).transform((raw, ctx): Patch => {
  const entries = Object.entries(raw);
  if (entries.length > MAX_KEYS_PER_PATCH) ctx.addIssue({ code: 'custom', message: `at most ${MAX_KEYS_PER_PATCH} keys in one edit` });
  const patch: Record<string, unknown> = {};
  for (const [key, value] of entries) {
    const schema = KEY_SCHEMAS.find(([pattern]) => pattern.test(key))?.[1];
    if (!schema) {
      ctx.addIssue({ code: 'custom', path: [key], message: 'no such document key' });
      continue;
    }
    const parsed = schema.safeParse(value);
    if (parsed.success) patch[key] = parsed.data;
    else {
      for (const { path, message } of fieldFaults(parsed.error.issues)) {
        ctx.addIssue({ code: 'custom', path: [key, ...path.split('.').filter((part) => part !== '')], message });
      }
    }
  }
  return patch as Patch;
});

export const editSchema = z.strictObject({
  /** Made by the client; a repeat with the same id is answered the same and applied once. */
  id: idSchema,
  /** The command's id, such as `mats.move`. */
  command: z.string().min(1).max(60),
  patch: patchSchema,
});
export type Edit = z.infer<typeof editSchema>;

export const postEditsSchema = z.strictObject({
  baseRevision: revisionSchema,
  edits: z
    .array(editSchema)
    .min(1)
    .max(100)
    .check(({ value, issues }) => {
      const ids = value.map(({ id }) => id);
      ids.forEach((id, i) => {
        if (ids.indexOf(id) < i) issues.push({ code: 'custom', input: id, path: [i, 'id'], message: 'each edit needs an id of its own' });
      });
    }),
});
export type PostEdits = z.infer<typeof postEditsSchema>;

export const postEditsResponseSchema = z.object({
  /** The document's revision after the edits. */
  revision: revisionSchema,
  /** Edits by others between the base and these, in order, so that the client can catch up. */
  missed: z.array(z.lazy(() => loggedEditSchema)),
});
export type PostEditsResponse = z.infer<typeof postEditsResponseSchema>;

export const loggedEditSchema = z.object({
  id: idSchema,
  revision: revisionSchema,
  command: z.string(),
  userId: idSchema.nullable(),
  userName: lineSchema(120).nullable(),
  at: instantSchema,
  patch: patchSchema,
});
export type LoggedEdit = z.infer<typeof loggedEditSchema>;

/** Which part of the log: edits after a revision, oldest first. */
export const editQuerySchema = z.strictObject({
  after: z.coerce.number().int().nonnegative().default(0),
  limit: z.coerce.number().int().min(1).max(500).default(200),
});
export const editListSchema = z.object({ edits: z.array(loggedEditSchema), revision: revisionSchema });

/** `data` of a 409 `stale-revision` on a spread. */
export const staleSpreadSchema = z.object({
  revision: revisionSchema,
  /** Keys that both sides touched. */
  keys: z.array(z.string()),
  missed: z.array(loggedEditSchema),
});
export type StaleSpread = z.infer<typeof staleSpreadSchema>;
