import { z } from 'zod';
import { AppError } from '../../shared/errors';

/** Where a page of a list ended: rows are in the order of their making, and of their ids within a moment. */
export interface Cursor {
  readonly at: Date;
  readonly id: string;
}

const cursorSchema = z.tuple([z.iso.datetime(), z.uuid()]);

export const writeCursor = ({ at, id }: Cursor): string => Buffer.from(`${at.toISOString()} ${id}`).toString('base64url');

/** @throws AppError('invalid-input') for text that `writeCursor` did not make. */
export function readCursor(text: string): Cursor {
  const parsed = cursorSchema.safeParse(Buffer.from(text, 'base64url').toString('utf8').split(' '));
  if (!parsed.success) {
    throw new AppError('invalid-input', { where: 'query', fields: [{ path: 'cursor', message: 'take the cursor from the page before' }] });
  }
  return { at: new Date(parsed.data[0]), id: parsed.data[1] };
}
