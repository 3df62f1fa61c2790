import { useState } from 'react';
import { useNavigate, useOutletContext } from 'react-router-dom';
import type { SpreadDetail } from '#shared/contracts/albums';
import { SIDES, type Side } from '#shared/model/ids';
import type { SpreadDocument } from '#shared/model/spread';
import { sketchesFor } from '#shared/sketches/catalogue';
import { filterSketches, type SketchFilter } from '#shared/sketches/features';
import type { Sketch } from '#shared/sketches/sketch';
import { Button } from '@/components/button';
import { EmptyLine } from '@/components/notice';
import { useAnnounce } from '@/components/live-region';
import { SketchFilters } from '@/features/composer/components/sketch-filters';
import { SketchCard, SketchPicture } from '@/features/composer/components/sketch-picture';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';

const SIDE_WORDS = { left: 'Left page', right: 'Right page' } as const;
type Pair = Readonly<Record<Side, Sketch | null>>;

/** The Match stage: start from a sketch for each page. Generated pairings come with a later release. */
export function Component() {
  const detail = useOutletContext<SpreadDetail>();
  const store = useComposerStore();
  const navigate = useNavigate();
  const announce = useAnnounce();
  const doc = useComposer((state) => state.doc);
  const [filter, setFilter] = useState<SketchFilter>({});
  const [pair, setPair] = useState<Pair>({ left: null, right: null });
  const sides = SIDES.filter((side) => doc.pages[side]);
  const [target, setTarget] = useState<Side>(sides[0] ?? 'left');
  const all = sketchesFor(doc.format);
  const shown = filterSketches(all, doc.format, filter);

  const choose = (sketch: Sketch): void => {
    setPair({ ...pair, [target]: sketch });
    announce(`${sketch.name} for the ${target} page`);
    const other = sides.find((side) => side !== target && pair[side] === null);
    if (other) setTarget(other);
  };
  const compose = (): void => {
    const chosen = sides.flatMap((page) => (pair[page] ? [{ page, sketch: pair[page] }] : []));
    const done = store.getState().run(
      chosen.map(({ page, sketch }) => ({
        id: 'pages.useSketch' as const,
        args: { page, mats: sketch.mats, color: doc.scheme?.colors.main.hex ?? '#515a62' },
      })),
    );
    if (done) void navigate(`/spreads/${detail.id}`);
  };
  const chosenCount = sides.filter((side) => pair[side]).length;
  return (
    <main className="match">
      <section>
        <h1>Start from a sketch</h1>
        <p className="text-ink-2">Each mat is a place for a print. Choose one sketch for each page; whatever lies on a page now goes back to the table, and undo brings it back.</p>
        <SketchFilters filter={filter} count={shown.length} total={all.length} onChange={setFilter} />
        {shown.length === 0 && (
          <EmptyLine>
            No sketch is like that.{' '}
            <button type="button" className="link-button" onClick={() => setFilter({})}>
              Show all {all.length}
            </button>
          </EmptyLine>
        )}
        <ul className="sketches">
          {shown.map((sketch) => (
            <li key={sketch.id}>
              <SketchCard sketch={sketch} format={doc.format} isChosen={pair[target]?.id === sketch.id} onChoose={() => choose(sketch)} />
            </li>
          ))}
        </ul>
      </section>
      <aside className="match-slip" aria-label="The pair">
        <h2>The pair</h2>
        <div className="sketch-pair" role="group" aria-label="The page that the next sketch is for">
          {sides.map((side) => (
            <button key={side} type="button" className="sketch-page" aria-pressed={target === side} aria-label={`${SIDE_WORDS[side]}: ${pair[side]?.name ?? 'as it is'}`} onClick={() => setTarget(side)}>
              <SketchPicture format={doc.format} mats={pair[side]?.mats ?? pageMats(doc, side)} />
            </button>
          ))}
        </div>
        <dl className="pair-names">
          {sides.map((side) => (
            <div key={side}>
              <dt>{SIDE_WORDS[side]}</dt>
              <dd>{pair[side]?.name ?? (pageMats(doc, side).length > 0 ? 'stays as it is' : 'not chosen yet')}</dd>
            </div>
          ))}
        </dl>
        {detail.may.edit ? (
          <Button variant="ink" disabled={chosenCount === 0} title={chosenCount === 0 ? 'Choose a sketch first' : undefined} onClick={compose}>
            {chosenCount === 2 ? 'Compose this pair' : 'Compose with it'}
          </Button>
        ) : (
          <p className="text-ink-2">You may look at sketches; composing is for designers and owners.</p>
        )}
      </aside>
    </main>
  );
}

/** A page's mats as they are now, as a sketch shows them. */
const pageMats = (doc: SpreadDocument, side: Side) =>
  doc.mats
    .filter((mat) => mat.page === side)
    .map(({ x, y, w, h, focal, content }) => ({ x, y, w, h, focal, paneGroup: content.kind === 'pane' ? 0 : undefined }));
