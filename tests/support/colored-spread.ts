import type { Hex } from '#shared/model/ids';
import { inches } from '#shared/model/length';
import type { Print, Swatch } from '#shared/model/print';
import type { Scheme, SchemeCharacter, SpreadDocument } from '#shared/model/spread';
import { hexToOklch } from '#shared/colour/convert';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent, printIdOf } from './builders';

export const swatch = (hex: Hex, share = 0.5): Swatch => ({ hex, oklch: hexToOklch(hex), share, role: 'area' });

/** A scheme of these colours, base, main, second and accent, that come from no print unless said. */
export const schemeOf = (character: SchemeCharacter, hexes: readonly [Hex, Hex, Hex, Hex], printIds: readonly string[] = []): Scheme => {
  const [base, main, second, accent] = hexes.map((hex) => ({ hex, printIds })) as [Scheme['colors']['base'], Scheme['colors']['base'], Scheme['colors']['base'], Scheme['colors']['base']];
  return { character, colors: { base, main, second, accent } };
};

/**
 * Four quarters on each page, filled, their card in these colours (left page's first, eight in all, numbered from
 * 1 on), each with a print of this palette.
 */
export function viewColored(cards: readonly Hex[], palette: readonly Hex[], parts: Partial<SpreadDocument> = {}) {
  const prints: Print[] = cards.map((_, i) =>
    buildPrint({ id: printIdOf(i + 1), paperWidth: inches(12), paperHeight: inches(12), imageWidth: 120, imageHeight: 120, palette: palette.map((hex) => swatch(hex)) }),
  );
  const mats = cards.map((color, i) =>
    buildMat({ id: matIdOf(i + 1), page: i < 4 ? 'left' : 'right', x: 11 * (i % 2), y: 11 * Math.floor((i % 4) / 2), w: 11, h: 11, color, content: printContent(prints[i]!) }),
  );
  return buildView({ doc: buildSpread({ mats, ...parts }), prints });
}
