import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Font } from 'fontkit';
import type { FontMetrics } from '../../shared/scene/metrics/font-metrics';
import type { FontId } from '../../shared/scene/scene';
import { openFontFile, STATIC_FONT_FILES } from '../images/font-files';

/** Characters whose pairs are kerned in page lettering and journaling. */
const KERNED = [..."ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz.,-'’“”"];

/** Pairs are measured one by one, so nothing that joins or swaps letters may take part. */
const PAIR_FEATURES = { kern: true, liga: false, clig: false, calt: false, rlig: false, ccmp: false };

/** Reads a font's table out of `fonts/`: the text of the files beside `font-metrics.ts`. */
export function readFontMetrics(id: FontId): FontMetrics {
  const [latin, latinExt] = STATIC_FONT_FILES[id].map(openFontFile) as [Font, Font];
  return {
    unitsPerEm: latin.unitsPerEm,
    ascent: latin.ascent,
    descent: latin.descent,
    capHeight: latin.capHeight,
    advances: advanceRuns([latin, latinExt]),
    kerning: kerningOf(latin),
  };
}

function advanceRuns(fonts: readonly Font[]): Record<number, number[]> {
  const advances = new Map<number, number>();
  for (const font of fonts) {
    for (const codePoint of font.characterSet) {
      // Control characters and the noncharacter that ends a table are no text.
      if (codePoint < 0x20 || codePoint === 0xffff || advances.has(codePoint)) continue;
      advances.set(codePoint, font.glyphForCodePoint(codePoint).advanceWidth);
    }
  }
  const runs: Record<number, number[]> = {};
  let first = -1;
  for (const codePoint of [...advances.keys()].sort((a, b) => a - b)) {
    const run = runs[first];
    if (run && codePoint === first + run.length) run.push(advances.get(codePoint)!);
    else runs[(first = codePoint)] = [advances.get(codePoint)!];
  }
  return runs;
}

function kerningOf(font: Font): Record<string, Record<string, string>> {
  const kerning: Record<string, Record<string, string>> = {};
  for (const left of KERNED) {
    const byValue: Record<string, string> = {};
    for (const right of KERNED) {
      const { glyphs, positions } = font.layout(left + right, PAIR_FEATURES);
      const value = positions[0]!.xAdvance - glyphs[0]!.advanceWidth;
      if (value !== 0) byValue[value] = (byValue[value] ?? '') + right;
    }
    if (Object.keys(byValue).length > 0) kerning[left] = byValue;
  }
  return kerning;
}

function moduleText(id: FontId, metrics: FontMetrics): string {
  const name = id.toUpperCase().replaceAll('-', '_');
  return `import type { FontMetrics } from './font-metrics';

/** Made from fonts/${STATIC_FONT_FILES[id].join(' and fonts/')} by server/setup/make-font-metrics.ts. */
export const ${name}: FontMetrics = ${JSON.stringify(metrics, null, 1).replaceAll(/,\n\s+(?=-?\d+[,\n])/g, ', ')};
`;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  for (const id of Object.keys(STATIC_FONT_FILES) as FontId[]) {
    const file = new URL(`../../shared/scene/metrics/${id}.ts`, import.meta.url);
    writeFileSync(fileURLToPath(file), moduleText(id, readFontMetrics(id)));
  }
}
