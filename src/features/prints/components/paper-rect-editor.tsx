import { useState, type KeyboardEvent, type PointerEvent } from 'react';
import { pictureUrl } from '#shared/contracts/prints';
import { automaticPaperRect, inverseTurn, turnedSize, turnInBox } from '#shared/geometry/paper';
import type { Print, PxRect } from '#shared/model/print';
import { Button } from '@/components/button';
import { useWidth } from '@/lib/use-width';
import { growPaper, movePaper } from '../model/paper-edit';

interface PaperRectEditorProps {
  readonly print: Print;
  readonly onSave: (paperRect: PxRect) => void;
  readonly onDone: () => void;
}

const ROOM = { width: 452, height: 400 };
/** Space kept at the left, where the rulers stand in the print's own view. */
const MARGIN = 24;

/** One press of an arrow, and of "more" or "less", as a share of the picture's long side. */
const NUDGE = 0.004;
const GROWTH = 1.01;

/**
 * The whole file with the part that the paper shows outlined on it. The outline is moved by pointer or
 * arrows and grown by + and −; it may leave the file, where the paper then is white.
 */
export function PaperRectEditor({ print, onSave, onDone }: PaperRectEditorProps) {
  const [rect, setRect] = useState(print.paperRect);
  const [from, setFrom] = useState<{ readonly x: number; readonly y: number; readonly rect: PxRect } | null>(null);
  const image = { width: print.imageWidth, height: print.imageHeight };
  const upright = turnedSize(image, print.turns);
  const [width, room] = useWidth<HTMLDivElement>(ROOM.width);
  const scale = Math.min(Math.min(width - MARGIN, ROOM.width) / upright.width, ROOM.height / upright.height);
  const outline = turnInBox(rect, image, print.turns);

  /** A shift as it is seen, back in the directions of the file. */
  const shift = (start: PxRect, dx: number, dy: number): PxRect => {
    const seen = turnInBox(start, image, print.turns);
    const moved = turnInBox({ ...seen, x: seen.x + dx, y: seen.y + dy }, upright, inverseTurn(print.turns));
    return movePaper(start, moved.x - start.x, moved.y - start.y);
  };
  const press = (event: KeyboardEvent): void => {
    const arrow = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, -1], ArrowDown: [0, 1] }[event.key];
    if (arrow !== undefined) {
      event.preventDefault();
      const by = Math.max(image.width, image.height) * NUDGE * (event.shiftKey ? 5 : 1);
      setRect(shift(rect, arrow[0]! * by, arrow[1]! * by));
    } else if (event.key === '+' || event.key === '=') setRect(growPaper({ ...print, paperRect: rect }, GROWTH));
    else if (event.key === '-') setRect(growPaper({ ...print, paperRect: rect }, 1 / GROWTH));
  };
  const follow = (event: PointerEvent): void => {
    if (from !== null) setRect(shift(from.rect, (event.clientX - from.x) / scale, (event.clientY - from.y) / scale));
  };
  return (
    <div className="mb-4">
      <div ref={room} aria-hidden="true" />
      <div className="paper-nudge" style={{ width: upright.width * scale, height: upright.height * scale }}>
        <img
          src={pictureUrl(print.id, 'medium')}
          alt={`The whole file of ${print.title}`}
          draggable={false}
          style={{
            width: image.width * scale,
            height: image.height * scale,
            transform: `translate(-50%, -50%) rotate(${print.turns * 90}deg)`,
          }}
        />
        <button
          type="button"
          className="paper-outline"
          aria-label="The part that the paper shows: arrows move it, plus and minus change how much"
          style={{ left: outline.x * scale, top: outline.y * scale, width: outline.width * scale, height: outline.height * scale }}
          onKeyDown={press}
          onPointerDown={(event) => {
            event.currentTarget.setPointerCapture(event.pointerId);
            setFrom({ x: event.clientX, y: event.clientY, rect });
          }}
          onPointerMove={follow}
          onPointerUp={() => setFrom(null)}
          onPointerCancel={() => setFrom(null)}
        />
      </div>
      <p className="mt-3 text-12 text-ink-2">
        The outline is the paper in your hand. Drag it, or use arrows; <kbd>+</kbd> and <kbd>−</kbd> show more or less of the picture.
      </p>
      <div className="mt-2 flex flex-wrap gap-2">
        <Button variant="ink" onClick={() => (onSave(rect), onDone())}>
          Keep this
        </Button>
        <Button onClick={() => setRect(growPaper({ ...print, paperRect: rect }, GROWTH))}>More</Button>
        <Button onClick={() => setRect(growPaper({ ...print, paperRect: rect }, 1 / GROWTH))}>Less</Button>
        <Button onClick={() => setRect(automaticPaperRect(print))}>Middle</Button>
        <Button variant="bare" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </div>
  );
}
