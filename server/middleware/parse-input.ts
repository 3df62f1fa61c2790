import type { z } from 'zod';
import { AppError } from '../../shared/errors';

export interface FieldFault {
  readonly path: string;
  readonly message: string;
}

/**
 * @param where - `params`, `query` or `body`.
 * @throws AppError('invalid-input') whose data names every field that does not fit.
 */
export function parseInput(schema: z.ZodType | undefined, value: unknown, where: 'params' | 'query' | 'body'): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  throw new AppError('invalid-input', { where, fields: fieldFaults(parsed.error.issues) });
}

/** Every fault by its field; a key that is not known is a field of its own. */
export function fieldFaults(issues: readonly z.core.$ZodIssue[]): FieldFault[] {
  return issues.flatMap((issue): FieldFault[] => {
    const path = issue.path.map(String).join('.');
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ path: path ? `${path}.${key}` : key, message: 'there is no such field' }));
    }
    return [{ path, message: issue.message }];
  });
}
