import type { z } from 'zod';
import { fieldFaults } from '../../shared/contracts/field-faults';
import { AppError } from '../../shared/errors';

/** @throws AppError('invalid-input') whose data names every field that does not fit. */
export function parseInput(schema: z.ZodType | undefined, value: unknown, where: 'params' | 'query' | 'body'): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  throw new AppError('invalid-input', { where, fields: fieldFaults(parsed.error.issues) });
}
