import { colorName } from '#shared/colour/name';
import type { Hex } from '#shared/model/ids';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';

/**
 * The colours at hand: the scheme's, those already on the spread besides, and those of its prints, one of each name:
 * the words are no finer than the eye at a craft table.
 */
export function colorGroups(doc: SpreadDocument, prints: ReadonlyMap<string, Print>): { name: string; colors: Hex[] }[] {
  const unique = (colors: Hex[], max: number): Hex[] => [...new Set(colors)].slice(0, max);
  const ofScheme = doc.scheme ? unique(Object.values(doc.scheme.colors).map((color) => color.hex), 4) : [];
  const onSpread = [...doc.mats.flatMap((mat) => [mat.color, ...(mat.inner ? [mat.inner.color] : [])]), doc.pages.left?.color, doc.pages.right?.color];
  const shown = new Set([...doc.mats.flatMap((mat) => (mat.content.kind === 'print' ? [mat.content.printId] : [])), ...doc.table]);
  const fromPrints = [...shown].flatMap((id) => prints.get(id)?.palette ?? []).sort((a, b) => b.share - a.share);
  return [
    { name: 'Scheme', colors: ofScheme },
    { name: 'On this spread', colors: unique(onSpread.filter((color): color is Hex => color !== undefined && !ofScheme.includes(color)), 12) },
    { name: 'In the photos', colors: oneOfEachName(fromPrints.map((swatch) => swatch.hex)).slice(0, 16) },
  ];
}

function oneOfEachName(colors: readonly Hex[]): Hex[] {
  const names = new Set<string>();
  return colors.filter((color) => names.size < names.add(colorName(color)).size);
}
