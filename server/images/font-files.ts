import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import * as fontkit from 'fontkit';
import type { Font } from 'fontkit';
import type { FontId } from '../../shared/scene/scene';

/**
 * The static fonts that pictures and documents are drawn with, per script: the same glyphs as the
 * web's variable files at weight 400. Latin is asked first.
 */
export const STATIC_FONT_FILES: Readonly<Record<FontId, readonly [latin: string, latinExt: string]>> = {
  'young-serif': ['young-serif-latin-400-normal.woff', 'young-serif-latin-ext-400-normal.woff'],
  atkinson: ['atkinson-hyperlegible-next-latin-400-normal.woff', 'atkinson-hyperlegible-next-latin-ext-400-normal.woff'],
  'atkinson-italic': ['atkinson-hyperlegible-next-latin-400-italic.woff', 'atkinson-hyperlegible-next-latin-ext-400-italic.woff'],
};

const FONTS_FOLDER = new URL('../../fonts/', import.meta.url);

/** Opens one file of `fonts/`. @throws Error where it is missing or holds a collection. */
export function openFontFile(name: string): Font {
  const font = fontkit.create(readFileSync(fileURLToPath(new URL(name, FONTS_FOLDER))));
  if ('fonts' in font) throw new Error(`fonts/${name} is a collection of fonts; one single font is expected`);
  return font;
}
