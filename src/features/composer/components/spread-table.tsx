import { lazy, memo, Suspense, useCallback, useMemo, useState, type MouseEvent } from 'react';
import type { Note } from '#shared/checks/check';
import { BALANCE_LIMIT } from '#shared/checks/pages-unequal';
import { matRect } from '#shared/geometry/grid';
import type { MatId, PrintId } from '#shared/model/ids';
import { SIDES } from '#shared/model/ids';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { Rect } from '#shared/model/rect';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import type { Print } from '#shared/model/print';
import { buildScene } from '#shared/scene/build-scene';
import { formatSize, type Unit } from '#shared/words/measure';
import { SceneDrawing } from '@/components/scene/scene-drawing';
import { anchorOf, type Anchor } from '@/features/composer/canvas/note-layout';
import { asRead, cellsAt, matLabels, pageAt, pageLeft, toScreen } from '@/features/composer/canvas/page-scale';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import { isPrintDrag } from '@/features/composer/hooks/drag-data';
import type { Held } from '@/features/composer/hooks/use-compose-drag';
import { stopOn, type Judgement } from '@/features/composer/hooks/use-judgement';
import { useOverlayKey } from '@/features/composer/hooks/use-overlay-key';
import { AfterPages } from './after-pages';
import { BalanceBeam } from './balance-beam';
import { MatControl } from './mat-control';
import { NoteMargins } from './note-margins';
import { PageGrid } from './page-grid';
import { PageRuler } from './page-ruler';
import { RuleTools } from './rule-tools';
import type { Comparison } from './scheme-fan';
import { SelectedMat } from './selected-mat';
import { VisionChoice, VisionView, type SeenAs } from './vision-view';
import { WeightOverlay } from './weight-overlay';

// The tools come after the pages: prints can be dragged while these are still fetched.
const MatActions = lazy(async () => ({ default: (await import('./mat-actions')).MatActions }));
const PageActions = lazy(async () => ({ default: (await import('./page-actions')).PageActions }));

interface SpreadTableProps {
  readonly judgement: Judgement;
  readonly held: Held | null;
  readonly perInch: number;
  /** Width of a notes margin in px. */
  readonly margin: number;
  readonly isEditable: boolean;
  /** Prints whose mats are outlined, because a scheme's colour comes from them. */
  readonly sources: readonly PrintId[] | null;
  /** Drawn instead of the spread as it is, while somebody compares. */
  readonly comparison: Comparison | null;
}

/** The two facing pages on the neutral table, with everything that hangs on them. */
export function SpreadTable({ judgement, held, perInch, margin, isEditable, sources, comparison }: SpreadTableProps) {
  const store = useComposerStore();
  const doc = useComposer((state) => state.doc);
  const prints = useComposer((state) => state.prints);
  const unit = useComposer((state) => state.unit);
  const trim = useComposer((state) => state.trim);
  const selection = useComposer((state) => state.selection);
  const [seenAs, setSeenAs] = useState<SeenAs>('common');
  const [marked, setMarked] = useState<readonly string[] | null>(null);
  const [areWeightsShown, setAreWeightsShown] = useState(false);
  const toggleWeights = useCallback(() => setAreWeightsShown((shown) => !shown), []);
  useOverlayKey(toggleWeights);

  const drawn = comparison?.doc ?? doc;
  const scene = useMemo(() => buildScene(drawn, prints), [drawn, prints]);
  const scale = perInch / UNITS_PER_INCH;
  const size = { width: scene.width * scale, height: scene.height * scale };
  const labels = useMemo(() => matLabels(doc.mats), [doc.mats]);
  const rects = useMemo(
    () => new Map(doc.mats.map((mat) => [mat.id, toScreen(matRect(doc.format, mat), pageLeft(doc, mat.page), perInch)])),
    [doc, perInch],
  );
  const anchors = useMemo(() => anchorsOf(doc.mats, rects), [doc.mats, rects]);
  const select = useCallback(
    (matId: MatId, adds: boolean) => {
      const { selection: old, select: set } = store.getState();
      set(adds ? (old.includes(matId) ? old.filter((id) => id !== matId) : [...old, matId]) : [matId]);
    },
    [store],
  );
  const applyRemedy = useCallback((note: Note) => note.remedy && store.getState().run(note.remedy.call), [store]);
  const selected = doc.mats.filter((mat) => selection.includes(mat.id));
  const isHoldingPrint = held !== null && isPrintDrag(held.data);

  return (
    <div className="spread-table" style={{ width: size.width + 2 * margin, paddingInline: margin }}>
      <div className="table-head">
        <BalanceBeam left={judgement.left} right={judgement.right} limit={BALANCE_LIMIT} />
        <RuleTools view={judgement.view} areWeightsShown={areWeightsShown} onToggleWeights={toggleWeights} />
        {SIDES.map((side) => doc.pages[side] && <PageRuler key={side} format={doc.format} left={pageLeft(doc, side) * scale} perInch={perInch} />)}
      </div>
      <div className="spread" style={size} onDoubleClick={(event) => isEditable && addMatAt(event, store.getState(), perInch)} onPointerDown={(event) => event.target === event.currentTarget && store.getState().select([])}>
        <VisionView seenAs={seenAs}>
          <SceneDrawing scene={scene} pictureSize={perInch * devicePixelRatio > 80 ? 'large' : 'medium'} underlay={<Grids doc={doc} />} />
        </VisionView>
        {areWeightsShown && <WeightOverlay view={judgement.view} scale={scale} />}
        {comparison && <p className="comparison-tag">{comparison.words}</p>}
        {asRead(doc.mats).map((mat) => (
          <MatControl
            key={mat.id}
            matId={mat.id}
            rect={rects.get(mat.id)!}
            z={mat.z}
            label={describeMat(mat, labels.get(mat.id)!, doc, prints, unit)}
            printId={carriedPrint(mat, doc)}
            isSelected={selection.includes(mat.id)}
            isEditable={isEditable}
            drop={held?.overMatId === mat.id ? (stopOn(judgement.notes, mat.id) ? 'cuts' : 'fits') : null}
            isMarked={(marked?.includes(mat.id) ?? false) || (sources?.includes(carriedPrint(mat, doc) ?? '') ?? false)}
            onSelect={select}
          />
        ))}
        {isEditable && selected.length === 1 && !isHoldingPrint && (
          <SelectedMat
            doc={doc}
            mat={selected[0]!}
            matRect={rects.get(selected[0]!.id)!}
            label={labels.get(selected[0]!.id)!}
            photo={judgement.view.photosByMat.get(selected[0]!.id)}
            print={prints.get(judgement.view.photosByMat.get(selected[0]!.id)?.printId ?? '')}
            trim={trim}
            unit={unit}
            perInch={perInch}
            isSliding={held?.data.type === 'window'}
          />
        )}
        {isEditable && selected.length > 0 && !held && (
          <div className="mat-actions-place" style={actionsPlace(selected.flatMap((mat) => rects.get(mat.id) ?? []), size)}>
            <Suspense fallback={null}>
              <MatActions mats={selected} unit={unit} onDone={() => store.getState().select([])} />
            </Suspense>
          </div>
        )}
        <NoteMargins
          found={judgement.notes}
          isHeld={held !== null}
          unit={unit}
          margin={margin}
          size={size}
          anchor={(matId) => anchors.get(matId)}
          isEditable={isEditable}
          onRemedy={applyRemedy}
          onMark={setMarked}
        />
      </div>
      {margin > 0 && <VisionChoice value={seenAs} width={margin - 36} onChange={setSeenAs} />}
      {isEditable && (
        <div className="table-foot">
          <AfterPages>
            {SIDES.map((side) => (
              <PageActions key={side} side={side} />
            ))}
          </AfterPages>
        </div>
      )}
    </div>
  );
}

const Grids = memo(function Grids({ doc }: { doc: SpreadDocument }) {
  return SIDES.map((side) => doc.pages[side] && <PageGrid key={side} format={doc.format} x={pageLeft(doc, side)} />);
});

/** Where the leader to each mat ends; mats laid over others do not stand in a leader's way. */
function anchorsOf(mats: readonly Mat[], rects: ReadonlyMap<MatId, Rect>): Map<MatId, Anchor> {
  return new Map(
    mats.flatMap((mat) => {
      const rect = rects.get(mat.id);
      const others = mats.flatMap((other) => (other !== mat && other.page === mat.page && !other.laidOver ? (rects.get(other.id) ?? []) : []));
      return rect ? [[mat.id, anchorOf(rect, others, mat.page)] as const] : [];
    }),
  );
}

/** The print that dragging a mat's picture picks up: its own, or its pane group's. */
function carriedPrint(mat: Mat, doc: SpreadDocument): PrintId | null {
  if (mat.content.kind === 'print') return mat.content.printId;
  if (mat.content.kind !== 'pane') return null;
  const { groupId } = mat.content;
  return doc.panes.find((group) => group.id === groupId)?.content?.printId ?? null;
}

function describeMat(mat: Mat, label: string, doc: SpreadDocument, prints: ReadonlyMap<PrintId, Print>, unit: Unit): string {
  const size = formatSize(matRect(doc.format, mat), unit);
  const printId = carriedPrint(mat, doc);
  const carried = printId
    ? `${prints.get(printId)?.title ?? 'a print'}${mat.content.kind === 'pane' ? ', a pane' : ''}`
    : { bare: 'bare', paper: 'patterned paper', lettering: 'title', journaling: 'journaling', embellishment: 'embellishment', keepsake: 'keepsake', print: '', pane: 'empty pane' }[mat.content.kind];
  return `Mat ${label}, ${size}, ${carried}${mat.focal ? ', focal' : ''}`;
}

/** Just under the selection, or over it where it stands at the foot of the page. */
function actionsPlace(rects: readonly Rect[], size: { width: number; height: number }): { left: number; top: number } {
  const left = Math.min(...rects.map((r) => r.x));
  const top = Math.min(...rects.map((r) => r.y));
  const foot = Math.max(...rects.map((r) => r.y + r.height));
  const below = foot + 10;
  return { left: Math.max(0, Math.min(left, size.width - 420)), top: below + 34 <= size.height + 4 ? below : Math.max(4, top - 66) };
}

type StoreState = ReturnType<ReturnType<typeof useComposerStore>['getState']>;

/** A double press on the bare page adds a mat of four steps there, where there is room. */
function addMatAt(event: MouseEvent<HTMLDivElement>, state: StoreState, perInch: number): void {
  if ((event.target as HTMLElement).closest('button')) return;
  const box = event.currentTarget.getBoundingClientRect();
  const { doc } = state;
  const x = event.clientX - box.left;
  const scale = perInch / UNITS_PER_INCH;
  const side = pageAt(doc, x / scale);
  const cell = cellsAt(doc.format, x - pageLeft(doc, side) * scale, event.clientY - box.top, perInch);
  for (const steps of [4, 3, 2]) {
    if (state.run({ id: 'mats.add', args: { page: side, ...cell, w: steps, h: steps, color: doc.scheme?.colors.main.hex } })) return;
  }
}
