import { contentSchema } from '../contracts/document';
import type { Content } from '../model/spread';

/**
 * The content just as the server will store it (texts in composed form, without control characters), or
 * null where it does not fit. Otherwise the next edit's `before` would differ from what the server holds.
 */
export function storedContent(content: Content): Content | null {
  const parsed = contentSchema.safeParse(content);
  return parsed.success ? parsed.data : null;
}
