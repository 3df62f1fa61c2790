import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import { MARK_SIDE, type Mark } from '#shared/contracts/stash';

interface PhotoMarkProps {
  readonly label: string;
  readonly mark: Mark;
  /** Width over height of the photo. */
  readonly ratio: number;
  readonly onMove: (mark: Mark) => void;
}

const held = (share: number): number => Math.min(1, Math.max(0, share));
const ARROWS: Readonly<Record<string, readonly [number, number]>> = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, -1], ArrowDown: [0, 1] };

/** A square on the photo that says what to measure: dragged, or moved with the arrow keys (with Shift by more). */
export function PhotoMark({ label, mark, ratio, onMove }: PhotoMarkProps) {
  const isHeld = useRef(false);
  const follow = (event: PointerEvent<HTMLButtonElement>): void => {
    const photo = event.currentTarget.parentElement!.getBoundingClientRect();
    if (isHeld.current) onMove({ x: held((event.clientX - photo.left) / photo.width), y: held((event.clientY - photo.top) / photo.height) });
  };
  const press = (event: KeyboardEvent): void => {
    const arrow = ARROWS[event.key];
    if (!arrow) return;
    event.preventDefault();
    const step = event.shiftKey ? 0.05 : 0.01;
    onMove({ x: held(mark.x + arrow[0] * step), y: held(mark.y + arrow[1] * step) });
  };
  const side = MARK_SIDE * 100;
  return (
    <button
      type="button"
      className="photo-mark"
      aria-label={`${label} mark: ${Math.round(mark.x * 100)}% from the left, ${Math.round(mark.y * 100)}% from the top. Arrow keys move it.`}
      style={{ left: `${mark.x * 100}%`, top: `${mark.y * 100}%`, width: `${ratio > 1 ? side / ratio : side}%`, height: `${ratio > 1 ? side : side * ratio}%` }}
      onPointerDown={(event) => {
        isHeld.current = true;
        event.currentTarget.setPointerCapture(event.pointerId);
      }}
      onPointerMove={follow}
      onPointerUp={() => (isHeld.current = false)}
      onPointerCancel={() => (isHeld.current = false)}
      onKeyDown={press}
    >
      <span aria-hidden="true">{label}</span>
    </button>
  );
}
