import { colorName } from '#shared/colour/name';
import { gridOf } from '#shared/geometry/grid';
import type { Side } from '#shared/model/ids';
import type { SpreadDocument } from '#shared/model/spread';
import { overlaps } from '#shared/geometry/rects';
import { useComposer } from '@/features/composer/hooks/composer-context';
import { useRun } from '@/features/composer/hooks/use-run';
import { colorGroups } from '@/features/composer/model/color-groups';
import { LazyColorSheet } from './lazy-color-sheet';
import { NamedSwatch } from './named-swatch';
import { ActionPopover } from './popover';

const WANTED_STEPS = 6;

/** The first free square of the page, largest first: where "Add mat" puts a new one. Null when the page is full. */
export function freeSquare(doc: SpreadDocument, page: Side): { x: number; y: number; w: number; h: number } | null {
  const grid = gridOf(doc.format);
  const taken = doc.mats.filter((mat) => mat.page === page && !mat.laidOver).map((mat) => ({ x: mat.x, y: mat.y, width: mat.w, height: mat.h }));
  for (let size = WANTED_STEPS; size >= 2; size -= 1) {
    for (let y = 0; y + size <= grid.rows; y += 1) {
      for (let x = 0; x + size <= grid.columns; x += 1) {
        const square = { x, y, width: size, height: size };
        if (!taken.some((rect) => overlaps(rect, square))) return { x, y, w: size, h: size };
      }
    }
  }
  return null;
}

/** What can be done with one page as a whole. */
export function PageActions({ side }: { side: Side }) {
  const run = useRun();
  const doc = useComposer((state) => state.doc);
  const prints = useComposer((state) => state.prints);
  const page = doc.pages[side];
  if (!page) return null;
  const free = freeSquare(doc, side);
  const isBare = !doc.mats.some((mat) => mat.page === side);
  const word = side === 'left' ? 'Left page' : 'Right page';
  return (
    <div className="page-actions" role="toolbar" aria-label={word}>
      <b>{word}</b>
      <button
        type="button"
        className="mat-action"
        disabled={!free}
        title={free ? undefined : 'This page has no free place of two steps; move or resize a mat first'}
        onClick={() => free && run({ id: 'mats.add', args: { page: side, ...free, color: doc.scheme?.colors.main.hex } })}
      >
        Add mat
      </button>
      <ActionPopover label={<NamedSwatch color={page.color} />} name={`Colour of the ${side} page, ${colorName(page.color)}`}>
        <LazyColorSheet heading="Page colour" value={page.color} groups={colorGroups(doc, prints)} onChoose={(color) => run({ id: 'pages.setColor', args: { pages: [side], color } })} />
      </ActionPopover>
      <button type="button" className="mat-action" disabled={isBare} title={isBare ? 'This page has no mats' : 'Mirror this page left to right; pictures are never mirrored'} onClick={() => run({ id: 'pages.mirror', args: { page: side, axis: 'horizontal' } })}>
        Mirror across
      </button>
      <button type="button" className="mat-action" disabled={isBare} title={isBare ? 'This page has no mats' : 'Mirror this page top to bottom; pictures are never mirrored'} onClick={() => run({ id: 'pages.mirror', args: { page: side, axis: 'vertical' } })}>
        Mirror down
      </button>
      {side === 'left' && doc.pages.right && (
        <button type="button" className="mat-action" title="The left page becomes the right one, and the other way round" onClick={() => run({ id: 'pages.swap', args: {} })}>
          Swap pages
        </button>
      )}
    </div>
  );
}
