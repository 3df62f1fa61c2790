import { differenceWord } from '#shared/colour/difference-words';
import { isPatterned, UNCERTAINTY, type ColorSource, type SidePattern, type StashFacts, type StashSheet, type StashSide } from '#shared/model/stash';
import { COLOR_SOURCE_WORDS } from '#shared/words/en/stash';

export const PATTERN_WORDS: Readonly<Record<SidePattern, string>> = { plain: 'plain', stripe: 'striped', dot: 'dotted', check: 'checked', print: 'printed' };

/** How a colour is known, in words no finer than that: `typed in, close at best`. */
export function sureness({ source, uncertainty }: Pick<StashSide, 'source' | 'uncertainty'>): string {
  const word = differenceWord(0, uncertainty);
  return `${COLOR_SOURCE_WORDS[source]}, ${word === 'different' ? 'only a guess' : `${word} at best`}`;
}

/** `linen`, `striped, dotted on the back`. */
export function kindWords(sheet: Pick<StashSheet, 'sides' | 'texture'>): string {
  const [front, back] = sheet.sides;
  const look = isPatterned(sheet) ? PATTERN_WORDS[front.pattern] : 'solid';
  return [look, back && `${PATTERN_WORDS[back.pattern]} on the back`, sheet.texture].filter(Boolean).join(', ');
}

/** A side whose colour came to be known anew. */
export const withColor = (side: StashSide, hex: string, source: Exclude<ColorSource, 'photographed'>): StashSide => ({
  ...side,
  hex,
  source,
  uncertainty: UNCERTAINTY[source],
});

export const priceText = (price: number | null): string => (price === null ? '' : (price / 100).toFixed(2));

/** A price as typed, in hundredths; null for nothing, undefined for what is no price. */
export function readPrice(text: string): number | null | undefined {
  if (text.trim() === '') return null;
  return /^\d{1,6}([.,]\d{1,2})?$/.test(text.trim()) ? Math.round(Number(text.trim().replace(',', '.')) * 100) : undefined;
}

/** A count as typed; undefined for what is none. */
export const readCount = (text: string): number | undefined => (/^\d{1,5}$/.test(text.trim()) ? Number(text) : undefined);

export const PLAIN_SIDE: StashSide = { hex: '#e8e2d4', source: 'picked', uncertainty: UNCERTAINTY.picked, pattern: 'plain', palette: [] };

/** The facts of a sheet, without what the server adds. */
export const factsOf = ({ name, maker, texture, place, width, height, quantity, lowAt, price, sides }: StashFacts): StashFacts => ({
  name,
  maker,
  texture,
  place,
  width,
  height,
  quantity,
  lowAt,
  price,
  sides,
});
