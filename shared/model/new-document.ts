import { millimetres } from './length';
import type { Binding, PageFormat } from './page-format';
import { SCHEMA_VERSION, type SpreadDocument } from './spread';
import { DEFAULT_REVEAL } from './trim-settings';

/** White card; nobody has chosen a colour yet. */
export const NEW_PAGE_COLOR = '#ffffff';

/**
 * A bare spread.
 *
 * The reveal starts at 1/8 in, or at 3 mm where the format reads millimetres, because 1/8 in stands on
 * no metric ruler.
 *
 * @param pages - a first or last leaf has a single page.
 */
export function newDocument(format: PageFormat, binding: Binding, pages: 'both' | 'left' | 'right'): SpreadDocument {
  const page = { color: NEW_PAGE_COLOR };
  return {
    schemaVersion: SCHEMA_VERSION,
    format,
    binding,
    pages: { left: pages === 'right' ? null : page, right: pages === 'left' ? null : page },
    reveal: format.unit === 'mm' ? millimetres(3) : DEFAULT_REVEAL,
    mats: [],
    panes: [],
    table: [],
    scheme: null,
  };
}
