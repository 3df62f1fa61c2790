import { DragOverlay, type Modifier } from '@dnd-kit/core';
import { toPaper } from '#shared/geometry/paper';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import { PrintPicture } from '@/components/print-picture';

/** Keeps the middle of what is in the hand under the pointer: on the pages it is larger than in its pile. */
const centreUnderPointer: Modifier = ({ activatorEvent, activeNodeRect, overlayNodeRect, transform }) => {
  if (!activatorEvent || !activeNodeRect || !overlayNodeRect || !('clientX' in activatorEvent)) return transform;
  const { clientX, clientY } = activatorEvent as PointerEvent;
  return {
    ...transform,
    x: transform.x + clientX - activeNodeRect.left - overlayNodeRect.width / 2,
    y: transform.y + clientY - activeNodeRect.top - overlayNodeRect.height / 2,
  };
};

const MODIFIERS = [centreUnderPointer];

/** What dropping the print where it is now would do. */
export interface DropWords {
  readonly words: string;
  readonly size: string;
  readonly isStop: boolean;
}

/** The print in the hand, at the pages' scale, with its keep zone and what a drop would do. */
export function HeldPrint({ print, perInch, drop }: { print: Print | null; perInch: number; drop: DropWords | null }) {
  const scale = perInch / UNITS_PER_INCH;
  const keep = print?.keepZone ? toPaper(print, print.keepZone) : null;
  return (
    <DragOverlay modifiers={MODIFIERS} dropAnimation={null} className="held-overlay" zIndex={60}>
      {print && (
        <div className="held-print">
          <PrintPicture print={print} pxPerInch={perInch} pictureSize="medium" state="hand" decorative />
          {drop && (
            <span className="tag drop-tag" data-tone={drop.isStop ? 'stop' : 'pencil'}>
              {drop.words} <span className="num">{drop.size}</span>
            </span>
          )}
          {keep && <i style={{ left: keep.x * scale, top: keep.y * scale, width: keep.width * scale, height: keep.height * scale }} />}
        </div>
      )}
    </DragOverlay>
  );
}
