import { PRINT_PPI, SCREEN_EXPORT_WIDTH_PX, type CreateExport } from '../contracts/exports';
import { toInches } from '../model/length';
import type { Size } from '../model/rect';

/**
 * Pixels of a preview picture: a fixed width for the screen, 300 for every inch of the pages to print.
 *
 * @param pages - a scene's size, in Lengths.
 */
export function exportPixels(pages: Size, size: CreateExport['size']): Size {
  const width = size === 'screen' ? SCREEN_EXPORT_WIDTH_PX : Math.round(toInches(pages.width) * PRINT_PPI);
  return { width, height: Math.round((width * pages.height) / pages.width) };
}
