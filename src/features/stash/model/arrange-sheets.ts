import { hexToOklch } from '#shared/colour/convert';
import { colorName } from '#shared/colour/name';
import { freeSheets, isLow, isPatterned, type StashSheet } from '#shared/model/stash';

export const SHOWS = ['all', 'solid', 'patterned', 'low'] as const;
export type Show = (typeof SHOWS)[number];
export const SORTS = ['name', 'colour', 'size', 'free', 'price', 'place'] as const;
export type Sort = (typeof SORTS)[number];

/** What of the stash is shown and in which order; it stands in the address. */
export interface Arrangement {
  readonly query: string;
  readonly show: Show;
  readonly sort: Sort;
  readonly isDescending: boolean;
}

/** The arrangement that an address asks for; what it does not say, or says wrongly, is as usual. */
export function readArrangement(params: URLSearchParams): Arrangement {
  const sort = params.get('sort') ?? '';
  const key = sort.replace(/^-/, '');
  return {
    query: params.get('q') ?? '',
    show: SHOWS.find((show) => show === params.get('show')) ?? 'all',
    sort: SORTS.find((known) => known === key) ?? 'name',
    isDescending: sort.startsWith('-'),
  };
}

/** The address of an arrangement; what is usual is left out. */
export function writeArrangement({ query, show, sort, isDescending }: Arrangement): URLSearchParams {
  const params = new URLSearchParams();
  if (query !== '') params.set('q', query);
  if (show !== 'all') params.set('show', show);
  if (sort !== 'name' || isDescending) params.set('sort', `${isDescending ? '-' : ''}${sort}`);
  return params;
}

/** The sheets that are to be shown, in order; equal ones keep the order of the stash. */
export function arrangeSheets(sheets: readonly StashSheet[], { query, show, sort, isDescending }: Arrangement): readonly StashSheet[] {
  const words = query.toLowerCase().split(/\s+/).filter(Boolean);
  const shown = sheets.filter((sheet) => isShown(sheet, show) && words.every((word) => textOf(sheet).includes(word)));
  const direction = isDescending ? -1 : 1;
  return shown.sort((a, b) => direction * compare(a, b, sort));
}

function isShown(sheet: StashSheet, show: Show): boolean {
  if (show === 'low') return isLow(sheet);
  return show === 'all' || isPatterned(sheet) === (show === 'patterned');
}

const textOf = ({ name, maker, texture, place, sides }: StashSheet): string =>
  [name, maker, texture, place, ...sides.map(({ hex }) => colorName(hex))].join(' ').toLowerCase();

/** Under this OKLCH chroma a colour stands with the neutrals, which come first, dark to light. */
const NEUTRAL_CHROMA = 0.03;

function compare(a: StashSheet, b: StashSheet, sort: Sort): number {
  switch (sort) {
    case 'name':
      return a.name.localeCompare(b.name);
    case 'place':
      return a.place.localeCompare(b.place);
    case 'free':
      return freeSheets(a) - freeSheets(b);
    case 'size':
      return a.width * a.height - b.width * b.height;
    case 'price':
      // What has no price counts as the dearest.
      return (a.price ?? Number.MAX_SAFE_INTEGER) - (b.price ?? Number.MAX_SAFE_INTEGER);
    case 'colour':
      return hueOrder(a) - hueOrder(b);
  }
}

/** Neutrals by lightness from −1 to 0, then hues in degrees. */
function hueOrder({ sides: [{ hex }] }: StashSheet): number {
  const [l, c, h] = hexToOklch(hex);
  return c < NEUTRAL_CHROMA ? l - 1 : h;
}
