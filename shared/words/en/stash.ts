import type { Difference } from '../../colour/difference-words';
import type { ReadingRefusal } from '../../colour/white-balance';
import type { ErrorData } from '../../errors';
import type { ColorSource } from '../../model/stash';

/** How a sheet compares with a colour. */
export const DIFFERENCE_PHRASES: Readonly<Record<Difference, string>> = {
  indistinguishable: 'indistinguishable',
  close: 'close',
  near: 'near',
  different: 'different',
};

export const COLOR_SOURCE_WORDS: Readonly<Record<ColorSource, string>> = {
  picked: 'picked by eye',
  typed: 'typed in',
  photographed: 'read from a photo',
};

/** `1 sheet`, `4 sheets`. */
export const sheetCount = (count: number): string => `${count} ${count === 1 ? 'sheet' : 'sheets'}`;

const READING_REFUSALS: Readonly<Record<ReadingRefusal, string>> = {
  'patch-clipped': 'The white or grey patch is over-exposed, so nothing can be compared with it: photograph it again a little darker.',
  'patch-dark': 'The white or grey patch is almost black: move its mark onto the patch, or photograph with more light.',
  'patch-uneven': 'The mark for the white or grey patch lies on something uneven: move it onto the bare patch, out of shadows.',
  'sheet-uneven': 'The mark for the sheet lies on something uneven: move it onto one colour of the sheet, out of shadows and glare.',
  'patch-coloured': 'The white or grey patch is strongly coloured: move its mark onto something white or grey.',
};

export const readingRefusalSentence = ({ reason }: ErrorData): string =>
  READING_REFUSALS[reason as ReadingRefusal] ?? 'The colour cannot be read from this photo: photograph the sheet beside a white or grey patch.';

/** Which sheets are too few, by how many are free. */
export function stashShortSentence({ sheets }: ErrorData): string {
  const list = Array.isArray(sheets) ? (sheets as readonly { readonly name: string; readonly wanted: number; readonly free: number }[]) : [];
  const parts = list.slice(0, 3).map(({ name, wanted, free }) => `“${name}” (${wanted} wanted, ${free} free)`);
  if (parts.length === 0) return 'Other spreads have reserved these sheets: take fewer, or release them there first.';
  return `There are not enough free sheets of ${parts.join(', ')}${list.length > 3 ? ` and ${list.length - 3} more` : ''}: other spreads have reserved the rest.`;
}
