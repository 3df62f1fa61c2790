import { useState, type KeyboardEvent, type PointerEvent } from 'react';
import type { Length } from '#shared/model/length';
import type { Rect, Size } from '#shared/model/rect';
import { formatLength, formatSize, type Unit } from '#shared/words/measure';
import { HANDLES, moveZone, pullZone, zoneBetween, type Handle } from '../model/zone-edit';

interface KeepZoneEditorProps {
  /** On the paper, in Lengths; null when there is none yet. */
  readonly zone: Rect | null;
  readonly paper: Size;
  readonly unit: Unit;
  readonly pxPerLength: number;
  /** How far one press of an arrow key goes. */
  readonly step: Length;
  readonly mayEdit: boolean;
  readonly onSave: (zone: Rect) => void;
}

/** A keep zone is at least this many steps on a side. */
const LEAST_STEPS = 2;

interface Gesture {
  readonly start: { readonly x: number; readonly y: number };
  readonly from: Rect | null;
  /** null moves the zone, or draws one where there is none. */
  readonly handle: Handle | null;
}

interface Stored {
  readonly rect: Rect;
  /** The print's zone when it was stored. */
  readonly before: Rect | null;
}

/**
 * The keep zone as a rectangle on the paper: drawn, moved and pulled by pointer; with the focus on it, by
 * arrows. It is stored once, when the pointer or the key lets go.
 */
export function KeepZoneEditor({ zone, paper, unit, pxPerLength, step, mayEdit, onSave }: KeepZoneEditorProps) {
  const [gesture, setGesture] = useState<Gesture | null>(null);
  const [draft, setDraft] = useState<Rect | null>(null);
  const [stored, setStored] = useState<Stored | null>(null);
  // What was stored shows until it comes back as the print's own zone; the next press of an arrow goes on from there.
  const isNews = stored !== null && !isSame(stored.before, zone);
  if (isNews) setStored(null);
  const shown = draft ?? (isNews ? zone : (stored?.rect ?? zone));
  const least = step * LEAST_STEPS;

  const pointOf = (event: PointerEvent): { x: number; y: number } => {
    const box = event.currentTarget.closest('[data-paper]')!.getBoundingClientRect();
    return { x: Math.round((event.clientX - box.left) / pxPerLength), y: Math.round((event.clientY - box.top) / pxPerLength) };
  };
  const begin = (event: PointerEvent, handle: Handle | null): void => {
    if (!mayEdit || event.button !== 0) return;
    event.stopPropagation();
    event.currentTarget.setPointerCapture(event.pointerId);
    setGesture({ start: pointOf(event), from: zone, handle });
  };
  const follow = (event: PointerEvent): void => {
    if (gesture === null) return;
    const point = pointOf(event);
    const [dx, dy] = [point.x - gesture.start.x, point.y - gesture.start.y];
    if (gesture.from === null) setDraft(zoneBetween(gesture.start, point, paper, least));
    else if (gesture.handle === null) setDraft(moveZone(gesture.from, dx, dy, paper));
    else setDraft(pullZone(gesture.from, gesture.handle, dx, dy, paper, least));
  };
  const end = (): void => {
    if (draft !== null) {
      setStored({ rect: draft, before: zone });
      onSave(draft);
    }
    setGesture(null);
    setDraft(null);
  };
  const cancel = (): void => {
    setGesture(null);
    setDraft(null);
  };
  const press = (event: KeyboardEvent): void => {
    const arrow = ARROWS[event.key];
    if (event.key === 'Escape') return cancel();
    if (arrow === undefined || shown === null || !mayEdit) return;
    event.preventDefault();
    const by = event.shiftKey ? step * 4 : step;
    const [dx, dy] = [arrow[0] * by, arrow[1] * by];
    setDraft(event.altKey ? pullZone(shown, { x: 1, y: 1 }, dx, dy, paper, least) : moveZone(shown, dx, dy, paper));
  };

  const px = (rect: Rect) => ({ left: rect.x * pxPerLength, top: rect.y * pxPerLength, width: rect.width * pxPerLength, height: rect.height * pxPerLength });
  return (
    <div
      data-paper
      className="zone-paper"
      data-drawing={mayEdit && zone === null}
      onPointerDown={(event) => zone === null && begin(event, null)}
      onPointerMove={follow}
      onPointerUp={end}
      onPointerCancel={cancel}
    >
      {shown !== null && (
        <>
          <div className="zone-veil" style={px(shown)} />
          <button
            type="button"
            className="zone"
            style={px(shown)}
            disabled={!mayEdit}
            aria-label={`Keep zone ${formatSize(shown, unit)}, ${formatLength(shown.x, unit)} from the left, ${formatLength(shown.y, unit)} from the top`}
            onPointerDown={(event) => begin(event, null)}
            onKeyDown={press}
            onKeyUp={(event) => ARROWS[event.key] !== undefined && gesture === null && end()}
            onBlur={end}
          />
          {mayEdit &&
            HANDLES.map((handle) => (
              <i
                key={`${handle.x}/${handle.y}`}
                className="zone-handle"
                data-axis={handle.x === 0 ? 'y' : handle.y === 0 ? 'x' : handle.x === handle.y ? 'down' : 'up'}
                style={{
                  left: (shown.x + ((handle.x + 1) / 2) * shown.width) * pxPerLength,
                  top: (shown.y + ((handle.y + 1) / 2) * shown.height) * pxPerLength,
                }}
                onPointerDown={(event) => begin(event, handle)}
              />
            ))}
        </>
      )}
    </div>
  );
}

const isSame = (a: Rect | null, b: Rect | null): boolean =>
  a === b || (a !== null && b !== null && a.x === b.x && a.y === b.y && a.width === b.width && a.height === b.height);

const ARROWS: Readonly<Record<string, readonly [x: number, y: number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
