import { useDraggable } from '@dnd-kit/core';
import { onPiece, paperOf, withSpare, zoneOf } from '#shared/geometry/keep-zone';
import { bottom, movedBy, right } from '#shared/geometry/rects';
import type { PlacedPhoto } from '#shared/geometry/placed-photos';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { Rect } from '#shared/model/rect';
import type { Print } from '#shared/model/print';
import type { Mat, SpreadDocument, TrimSettings } from '#shared/model/spread';
import { formatSize, type Unit } from '#shared/words/measure';
import { pictureUrl } from '#shared/contracts/prints';
import { pageLeft, toScreen } from '@/features/composer/canvas/page-scale';
import type { DragData, Edge } from '@/features/composer/hooks/drag-data';

const EDGES: readonly { edge: Edge; name: string }[] = [
  { edge: 'n', name: 'top edge' },
  { edge: 'e', name: 'right edge' },
  { edge: 's', name: 'bottom edge' },
  { edge: 'w', name: 'left edge' },
  { edge: 'ne', name: 'top right corner' },
  { edge: 'se', name: 'bottom right corner' },
  { edge: 'sw', name: 'bottom left corner' },
  { edge: 'nw', name: 'top left corner' },
];

interface SelectedMatProps {
  doc: SpreadDocument;
  mat: Mat;
  matRect: Rect;
  label: string;
  photo: PlacedPhoto | undefined;
  print: Print | undefined;
  trim: TrimSettings;
  unit: Unit;
  perInch: number;
  isSliding: boolean;
}

/** The selected mat's marks: outline, true size, keep zone, and the handles that move, resize and slide. */
export function SelectedMat({ doc, mat, matRect, label, photo, print, trim, unit, perInch, isSliding }: SelectedMatProps) {
  const onScreen = (rect: Rect): Rect => toScreen(rect, pageLeft(doc, mat.page), perInch);
  const keep = photo && print ? keepOnPage(photo, print, trim) : null;
  const photoRect = photo && onScreen(photo.rect);
  const canSlide = photo?.placement.mode === 'window';
  return (
    <>
      {isSliding && photo && print && <WholePrint photo={photo} print={print} onScreen={onScreen} />}
      <svg className="selected-marks" aria-hidden="true">
        <rect className="selected-outline" x={matRect.x - 0.75} y={matRect.y - 0.75} width={matRect.width + 1.5} height={matRect.height + 1.5} />
        {keep && <KeepZone zone={onScreen(keep.zone)} lost={keep.lost.map(onScreen)} />}
      </svg>
      <span className="tag selected-size" data-tone="pencil" style={{ left: matRect.x + matRect.width / 2, top: matRect.y - 24 }}>
        {formatSize(photo ? photo.rect : matSize(matRect, perInch), unit)}
      </span>
      <MoveHandle matId={mat.id} label={label} rect={matRect} />
      {EDGES.map(({ edge, name }) => (
        <ResizeHandle key={edge} matId={mat.id} edge={edge} label={`Resize mat ${label} from its ${name}`} rect={matRect} />
      ))}
      {canSlide && photoRect && <WindowGrip matId={mat.id} rect={photoRect} />}
    </>
  );
}

const matSize = (rect: Rect, perInch: number) => ({
  width: Math.round((rect.width / perInch) * UNITS_PER_INCH),
  height: Math.round((rect.height / perInch) * UNITS_PER_INCH),
});

/** What the piece must hold, in page space, and the parts of it (with the cutting tolerance) that the window would cut away. */
function keepOnPage({ placement, window, rect: box, groupId }: PlacedPhoto, print: Print, trim: TrimSettings): { zone: Rect; lost: Rect[] } | null {
  const zone = zoneOf(print, placement);
  if (!zone) return null;
  const place = (rect: Rect): Rect => movedBy(onPiece(rect, window, placement.turn), box);
  if (placement.mode === 'whole' || groupId) return { zone: place(zone), lost: [] };
  const wanted = place(withSpare(zone, paperOf(print, placement), trim.tolerance));
  const bands: Rect[] = [
    { ...wanted, width: box.x - wanted.x },
    { ...wanted, x: right(box), width: right(wanted) - right(box) },
    { ...wanted, height: box.y - wanted.y },
    { ...wanted, y: bottom(box), height: bottom(wanted) - bottom(box) },
  ];
  return { zone: place(zone), lost: bands.filter(({ width, height }) => width > 0 && height > 0) };
}

function KeepZone({ zone, lost }: { zone: Rect; lost: readonly Rect[] }) {
  const box = { x: zone.x, y: zone.y, width: zone.width, height: zone.height };
  return (
    <>
      <rect className="keep-halo" {...box} />
      <rect className="keep-line" {...box} />
      {lost.map((rect, i) => (
        <rect key={i} className="keep-lost" {...rect} />
      ))}
    </>
  );
}

/** While the window slides, its whole print shows at 40 % under the hand, over the neighbours. */
function WholePrint({ photo, print, onScreen }: { photo: PlacedPhoto; print: Print; onScreen: (rect: Rect) => Rect }) {
  const whole = onPiece(paperOf(print, photo.placement), photo.window, photo.placement.turn);
  const rect = onScreen(movedBy(whole, photo.rect));
  const turns = (print.turns + photo.placement.turn) % 4;
  const upright = turns % 2 === 0 ? rect : { ...rect, width: rect.height, height: rect.width };
  return (
    <div className="whole-print" style={{ left: rect.x, top: rect.y, width: rect.width, height: rect.height }}>
      <img
        src={pictureUrl(print.id, 'medium')}
        alt=""
        style={{ width: upright.width, height: upright.height, transform: `translate(-50%, -50%) rotate(${turns * 90}deg)` }}
      />
    </div>
  );
}

function MoveHandle({ matId, label, rect }: { matId: string; label: string; rect: Rect }) {
  const data: DragData = { type: 'mat', matId };
  const { setNodeRef, attributes, listeners } = useDraggable({ id: `move/${matId}`, data });
  return (
    <button type="button" ref={setNodeRef} {...attributes} {...listeners} className="move-handle" aria-label={`Move mat ${label}`} style={{ left: rect.x, top: rect.y - 26 }}>
      <svg viewBox="0 0 18 18" width="18" height="18" aria-hidden="true">
        <path d="M9 2v14M2 9h14M9 2 7 4.500M9 2l2 2.500M9 16l-2-2.500M9 16l2-2.500M2 9l2.500-2M2 9l2.500 2M16 9l-2.500-2M16 9l-2.500 2" />
      </svg>
    </button>
  );
}

function ResizeHandle({ matId, edge, label, rect }: { matId: string; edge: Edge; label: string; rect: Rect }) {
  const data: DragData = { type: 'resize', matId, edge };
  const { setNodeRef, attributes, listeners } = useDraggable({ id: `resize/${edge}/${matId}`, data });
  const x = edge.includes('w') ? rect.x : edge.includes('e') ? rect.x + rect.width : rect.x + rect.width / 2;
  const y = edge.includes('n') ? rect.y : edge.includes('s') ? rect.y + rect.height : rect.y + rect.height / 2;
  return (
    <button
      type="button"
      ref={setNodeRef}
      {...attributes}
      {...listeners}
      tabIndex={edge.length === 1 ? 0 : -1}
      className={`resize-handle resize-${edge}`}
      aria-label={label}
      style={{ left: x, top: y }}
    />
  );
}

function WindowGrip({ matId, rect }: { matId: string; rect: Rect }) {
  const data: DragData = { type: 'window', matId };
  const { setNodeRef, attributes, listeners } = useDraggable({ id: `window/${matId}`, data });
  return (
    <button
      type="button"
      ref={setNodeRef}
      {...attributes}
      {...listeners}
      className="window-grip"
      aria-label="Slide the window over the print"
      style={{ left: rect.x + rect.width / 2, top: rect.y + rect.height - 24 }}
    >
      <svg viewBox="0 0 26 18" width="26" height="18" aria-hidden="true">
        <path d="M5 9h16M5 9l3-2.500M5 9l3 2.500M21 9l-3-2.500M21 9l-3 2.500M13 3v12M13 3l-2.500 2.500M13 3l2.500 2.500M13 15l-2.500-2.500M13 15l2.500-2.500" />
      </svg>
    </button>
  );
}
