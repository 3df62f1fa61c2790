import { describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import { moveCall, resizeCall, slideCall } from '@/features/composer/hooks/drag-steps';
import { pixelsPerInch } from '@/features/composer/canvas/page-scale';
import { buildMat, buildSpread } from '../../support/builders';

const PER_INCH = 44;
const STEP_PX = 22;
const mat = buildMat({ x: 4, y: 4, w: 6, h: 4 });
const doc = buildSpread({ mats: [mat] });

describe('dragging a mat', () => {
  it('snaps to whole steps', () => {
    expect(moveCall(doc, mat, { x: 2.4 * STEP_PX, y: -1.6 * STEP_PX }, PER_INCH).args).toMatchObject({ dx: 2, dy: -2, page: 'left' });
  });

  it('never leaves the page', () => {
    expect(moveCall(doc, mat, { x: -999, y: 9999 }, PER_INCH).args).toMatchObject({ dx: -4, dy: 14, page: 'left' });
  });

  it('goes to the page on which its middle lies', () => {
    expect(moveCall(doc, mat, { x: 12 * PER_INCH, y: 0 }, PER_INCH).args).toMatchObject({ dx: 0, dy: 0, page: 'right' });
  });

  it('stays where the other page is missing', () => {
    const single = buildSpread({ mats: [mat], pages: { left: doc.pages.left, right: null } });
    expect(moveCall(single, mat, { x: 12 * PER_INCH, y: 0 }, PER_INCH).args).toMatchObject({ page: 'left', dx: 12 });
  });
});

describe('dragging an edge', () => {
  it('moves only that edge', () => {
    expect(resizeCall(doc, mat, 'e', { x: 2 * STEP_PX, y: 5 * STEP_PX }, PER_INCH).args).toMatchObject({ x: 4, y: 4, w: 8, h: 4 });
    expect(resizeCall(doc, mat, 'nw', { x: -STEP_PX, y: STEP_PX }, PER_INCH).args).toMatchObject({ x: 3, y: 5, w: 7, h: 3 });
  });

  it('keeps at least one step and stays on the page', () => {
    expect(resizeCall(doc, mat, 'w', { x: 999, y: 0 }, PER_INCH).args).toMatchObject({ x: 9, w: 1 });
    expect(resizeCall(doc, mat, 's', { x: 0, y: 9999 }, PER_INCH).args).toMatchObject({ y: 4, h: 18 });
  });
});

describe('sliding a window', () => {
  const photo = (turn: 0 | 1 | 2 | 3) => ({
    matId: mat.id,
    page: 'left' as const,
    printId: 'p',
    groupId: null,
    placement: { printId: 'p', mode: 'window' as const, x: inches(1), y: inches(1), turn, scaledWidth: null, detailId: null },
    rect: { x: 0, y: 0, width: inches(2), height: inches(2) },
    window: { x: inches(1), y: inches(1), width: inches(2), height: inches(2) },
  });

  it('moves the picture with the hand, so the window goes the other way', () => {
    expect(slideCall(photo(0), { x: PER_INCH / 2, y: 0 }, PER_INCH).args).toMatchObject({ x: inches(1 / 2), y: inches(1) });
  });

  it('follows the hand on a turned piece as well', () => {
    // Turned clockwise once, the paper's left edge is on top: pulling the picture down moves the window towards it.
    expect(slideCall(photo(1), { x: 0, y: PER_INCH / 2 }, PER_INCH).args).toMatchObject({ x: inches(1 / 2), y: inches(1) });
    expect(slideCall(photo(2), { x: PER_INCH / 2, y: 0 }, PER_INCH).args).toMatchObject({ x: inches(1, 1 / 2), y: inches(1) });
  });
});

describe('the scale of the pages', () => {
  it('is 44 px to the inch at 1440 × 900, as the tokens say', () => {
    expect(pixelsPerInch({ width: 1440, height: 900 }, doc, { sides: 384, vertical: 372 })).toBe(44);
  });
});
