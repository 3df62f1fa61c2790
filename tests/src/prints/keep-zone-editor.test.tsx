import { fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { inches } from '#shared/model/length';
import type { Rect } from '#shared/model/rect';
import { KeepZoneEditor } from '@/features/prints/components/keep-zone-editor';

const STEP = inches(1 / 16);
const zone: Rect = { x: inches(1), y: inches(1), width: inches(2), height: inches(1) };

interface Parts {
  readonly zone?: Rect | null;
  readonly mayEdit?: boolean;
}

const setUp = (parts: Parts = {}) => setUpWith(parts).onSave;

/** With a way to show another zone of the print. */
function setUpWith(parts: Parts) {
  const onSave = vi.fn<(rect: Rect) => void>();
  const editor = (shown: Rect | null) => (
    <KeepZoneEditor
      zone={shown}
      paper={{ width: inches(6), height: inches(4) }}
      unit="in"
      pxPerLength={100 / inches(1)}
      step={STEP}
      mayEdit={parts.mayEdit ?? true}
      onSave={onSave}
    />
  );
  const { rerender } = render(editor(parts.zone === undefined ? zone : parts.zone));
  return { onSave, show: (shown: Rect | null) => rerender(editor(shown)) };
}

describe('the keep zone by keyboard', () => {
  it('says where it lies', () => {
    setUp();
    expect(screen.getByRole('button')).toHaveAccessibleName('Keep zone 2 × 1 in, 1 from the left, 1 from the top');
  });

  it('moves by the finest mark, and by four of them with Shift', async () => {
    const onSave = setUp();
    screen.getByRole('button').focus();
    await userEvent.keyboard('{ArrowRight}');
    expect(onSave).toHaveBeenLastCalledWith({ ...zone, x: zone.x + STEP });
    await userEvent.keyboard('{Shift>}{ArrowUp}{/Shift}');
    // It goes on from what was just stored, although that has not come back yet.
    expect(onSave).toHaveBeenLastCalledWith({ ...zone, x: zone.x + STEP, y: zone.y - 4 * STEP });
  });

  it('shows what was stored until the print’s own zone changes, and then that one', async () => {
    const { onSave, show } = setUpWith({});
    screen.getByRole('button').focus();
    await userEvent.keyboard('{ArrowDown}');
    expect(onSave).toHaveBeenCalledOnce();
    expect(screen.getByRole('button')).toHaveAccessibleName(/1 1\/16 from the top$/);
    show({ ...zone, y: inches(2) }); // somebody else was quicker
    expect(screen.getByRole('button')).toHaveAccessibleName(/2 from the top$/);
    show(zone);
    expect(screen.getByRole('button')).toHaveAccessibleName(/1 from the top$/);
  });

  it('is pulled at its right and lower edge with Alt', async () => {
    const onSave = setUp();
    screen.getByRole('button').focus();
    await userEvent.keyboard('{Alt>}{ArrowRight}{/Alt}');
    expect(onSave).toHaveBeenLastCalledWith({ ...zone, width: zone.width + STEP });
  });

  it('stays on the paper', async () => {
    const onSave = setUp({ zone: { ...zone, x: inches(4) - STEP / 2 } });
    screen.getByRole('button').focus();
    await userEvent.keyboard('{ArrowRight}');
    expect(onSave).toHaveBeenLastCalledWith({ ...zone, x: inches(4) });
  });

  it('is stored once, when the key lets go', () => {
    const onSave = setUp();
    const handle = screen.getByRole('button');
    fireEvent.keyDown(handle, { key: 'ArrowDown' });
    fireEvent.keyDown(handle, { key: 'ArrowDown' });
    expect(onSave).not.toHaveBeenCalled();
    fireEvent.keyUp(handle, { key: 'ArrowDown' });
    expect(onSave).toHaveBeenCalledExactlyOnceWith({ ...zone, y: zone.y + 2 * STEP });
  });

  it('cannot be changed by someone who only looks', async () => {
    const onSave = setUp({ mayEdit: false });
    fireEvent.keyDown(screen.getByRole('button'), { key: 'ArrowDown' });
    fireEvent.keyUp(screen.getByRole('button'), { key: 'ArrowDown' });
    expect(onSave).not.toHaveBeenCalled();
  });
});

describe('the keep zone by pointer', () => {
  const at = (x: number, y: number) => ({ clientX: x * 100, clientY: y * 100, button: 0, pointerId: 1 });

  it('is drawn between two points where there is none', () => {
    const onSave = setUp({ zone: null });
    const paper = document.querySelector('[data-paper]')!;
    fireEvent.pointerDown(paper, at(1, 1));
    fireEvent.pointerMove(paper, at(3, 2));
    fireEvent.pointerUp(paper, at(3, 2));
    expect(onSave).toHaveBeenCalledExactlyOnceWith({ x: inches(1), y: inches(1), width: inches(2), height: inches(1) });
  });

  it('moves with the pointer and is put back by Escape', () => {
    const onSave = setUp();
    const handle = screen.getByRole('button');
    fireEvent.pointerDown(handle, at(2, 1.5));
    fireEvent.pointerMove(handle, at(2.5, 1.5));
    expect(handle).toHaveAccessibleName('Keep zone 2 × 1 in, 1 1/2 from the left, 1 from the top');
    fireEvent.keyDown(handle, { key: 'Escape' });
    fireEvent.pointerUp(handle, at(2.5, 1.5));
    expect(onSave).not.toHaveBeenCalled();
    expect(handle).toHaveAccessibleName('Keep zone 2 × 1 in, 1 from the left, 1 from the top');
  });
});
