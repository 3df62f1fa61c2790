import { SPREAD_STATES, type SpreadState, type SpreadSummary } from '#shared/contracts/albums';
import type { SpreadDocument } from '#shared/model/spread';

export const STATE_WORDS: Record<SpreadState, string> = {
  draft: 'Draft',
  'in-review': 'In review',
  approved: 'Approved',
  cut: 'Cut',
  mounted: 'Mounted',
};

/** How far a spread has come: 1 (draft) to 5 (mounted). */
export const stepsDone = (state: SpreadState): number => SPREAD_STATES.indexOf(state) + 1;

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

/** Prints that the document places, each counted once. */
export function placedPrintIds({ mats, panes }: SpreadDocument): ReadonlySet<string> {
  return new Set([
    ...mats.flatMap(({ content }) => (content.kind === 'print' ? [content.printId] : [])),
    ...panes.flatMap(({ content }) => (content === null ? [] : [content.printId])),
  ]);
}

/** The second line under a spread's name: what is still to do, or how much is on it. */
export function describeSpread(document: SpreadDocument): string {
  const { mats, table } = document;
  if (mats.length === 0) return table.length > 0 ? `No mats yet, ${counted(table.length, 'print', 'prints')} ready` : 'No mats yet';
  const bare = mats.filter(({ content }) => content.kind === 'bare').length;
  if (bare > 0) return `${counted(mats.length, 'mat', 'mats')}, ${bare} bare`;
  return counted(mats.length, 'mat', 'mats');
}

/** The line beside an album's title. */
export function describeAlbum(spreads: readonly SpreadSummary[]): string {
  const placed = new Set(spreads.flatMap(({ document }) => [...placedPrintIds(document)])).size;
  return `${counted(spreads.length, 'spread', 'spreads')}, ${counted(placed, 'print', 'prints')} placed.`;
}
