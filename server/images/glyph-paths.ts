import type { Font } from 'fontkit';
import type { FontId } from '../../shared/scene/scene';
import { openFontFile, STATIC_FONT_FILES } from './font-files';

const openFonts = new Map<FontId, readonly Font[]>();
const paths = new Map<string, string>();

/**
 * A character's outline as SVG path data in font units, y upwards; empty for one that shows nothing.
 * Renderers of SVG on the server know no WOFF fonts, so text reaches them as outlines.
 */
export function glyphPath(font: FontId, character: string): string {
  const key = `${font} ${character}`;
  let path = paths.get(key);
  if (path === undefined) paths.set(key, (path = readPath(font, character.codePointAt(0)!)));
  return path;
}

function readPath(id: FontId, codePoint: number): string {
  let fonts = openFonts.get(id);
  if (!fonts) openFonts.set(id, (fonts = STATIC_FONT_FILES[id].map(openFontFile)));
  const font = fonts.find((candidate) => candidate.hasGlyphForCodePoint(codePoint));
  return font ? font.glyphForCodePoint(codePoint).path.toSVG() : '';
}
