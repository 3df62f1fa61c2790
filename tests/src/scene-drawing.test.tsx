import { fireEvent, render } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { inches } from '#shared/model/length';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import type * as PictureCover from '#shared/scene/picture-cover';
import { SceneDrawing } from '@/components/scene/scene-drawing';
import { buildMat, buildPrint, buildSpread, matIdOf, printContent, printIdOf, printsById } from '../support/builders';

/** Ids of the prints whose photos were drawn, in order: one entry per drawing. */
const drawnPrints = vi.hoisted((): string[] => []);
vi.mock('#shared/scene/picture-cover', async (importOriginal) => {
  const original = await importOriginal<typeof PictureCover>();
  return {
    ...original,
    pictureCover: (photo: Parameters<typeof original.pictureCover>[0] & { printId: string }) => {
      drawnPrints.push(photo.printId);
      return original.pictureCover(photo);
    },
  };
});

const FIRST = buildPrint({ id: printIdOf(1), imageWidth: 600, imageHeight: 400 });
const SECOND = buildPrint({ id: printIdOf(2), imageWidth: 600, imageHeight: 400, paperRect: { x: -30, y: -20, width: 660, height: 440 } });
const PRINTS = printsById([FIRST, SECOND]);

const A: Mat = buildMat({ id: matIdOf(1), w: 8, h: 6, content: printContent(FIRST, { x: inches(1), y: inches(1 / 2) }) });
const B: Mat = buildMat({ id: matIdOf(2), x: 8, w: 8, h: 6, content: printContent(SECOND) });
const TITLE: Mat = buildMat({ id: matIdOf(3), y: 10, w: 10, h: 5, content: { kind: 'lettering', text: 'Out', color: '#1f4f5f', letterHeight: inches(1) } });

const spreadOf = (...mats: Mat[]): SpreadDocument => buildSpread({ mats });
const sceneOf = (...mats: Mat[]) => buildScene(spreadOf(...mats), PRINTS);

const matGroup = (container: HTMLElement, mat: Mat): SVGGElement | null => container.querySelector(`[data-mat="${mat.id}"]`);

beforeEach(() => {
  drawnPrints.length = 0;
});

describe('SceneDrawing', () => {
  it('shows the window of the picture, at the size asked for', () => {
    const { container } = render(<SceneDrawing scene={sceneOf(A)} pictureSize="large" />);
    const image = matGroup(container, A)!.querySelector('image')!;
    expect(image.getAttribute('href')).toBe(`/api/pictures/${FIRST.id}/large`);
    expect(image.closest('svg')!.getAttribute('viewBox')).toBe('100 50 362.5 262.5');
    expect([image.getAttribute('width'), image.getAttribute('height')]).toEqual(['600', '400']);
  });

  it('draws only the mat that changed', () => {
    const { rerender } = render(<SceneDrawing scene={sceneOf(A, B)} pictureSize="medium" />);
    expect(drawnPrints).toEqual([FIRST.id, SECOND.id]);
    rerender(<SceneDrawing scene={sceneOf(A, { ...B, y: 7 })} pictureSize="medium" />);
    expect(drawnPrints).toEqual([FIRST.id, SECOND.id, SECOND.id]);
  });

  it('leaves out hidden mats', () => {
    const { container } = render(<SceneDrawing scene={sceneOf(A, B)} pictureSize="medium" hiddenMatIds={new Set([A.id])} />);
    expect(matGroup(container, A)).toBeNull();
    expect(matGroup(container, B)).not.toBeNull();
  });

  it('shows white paper beside a picture that does not fill it, and none under one that does', () => {
    const { container } = render(<SceneDrawing scene={sceneOf(A, B)} pictureSize="medium" />);
    expect(matGroup(container, B)!.querySelectorAll('rect[fill="#ffffff"]')).toHaveLength(1);
    expect(matGroup(container, A)!.querySelectorAll('rect[fill="#ffffff"]')).toHaveLength(0);
  });

  it('shows blank paper until the picture is there', () => {
    const { container } = render(<SceneDrawing scene={sceneOf(A)} pictureSize="medium" />);
    expect(matGroup(container, A)!.querySelectorAll('[data-state="photo-loading"]')).toHaveLength(1);
    fireEvent.load(matGroup(container, A)!.querySelector('image')!);
    expect(matGroup(container, A)!.querySelectorAll('[data-state="photo-loading"]')).toHaveLength(0);
  });

  it('strikes the paper out where a picture cannot be had, and asks again for another size', () => {
    const { container, rerender } = render(<SceneDrawing scene={sceneOf(A)} pictureSize="medium" />);
    fireEvent.error(matGroup(container, A)!.querySelector('image')!);
    expect(matGroup(container, A)!.querySelector('[data-state="photo-missing"] path')).not.toBeNull();
    expect(matGroup(container, A)!.querySelector('image')).toBeNull();
    rerender(<SceneDrawing scene={sceneOf(A)} pictureSize="large" />);
    expect(matGroup(container, A)!.querySelector('image')!.getAttribute('href')).toContain('/large');
  });

  it('gives every letter its place', () => {
    const scene = sceneOf(TITLE);
    const { container } = render(<SceneDrawing scene={scene} pictureSize="medium" />);
    const text = container.querySelector('text')!;
    const item = scene.items.find((candidate) => candidate.kind === 'text')!;
    const unit = Number(/scale\((.+)\)/.exec(text.getAttribute('transform')!)![1]);
    expect(text.textContent).toBe('Out');
    const places = text.getAttribute('x')!.split(' ').map((x) => Math.round(Number(x) * unit));
    expect(places).toEqual(item.kind === 'text' && item.xs.map(Math.round));
  });

  it('puts edges on whole device pixels once it knows its size', () => {
    const box = { width: 1000, height: 500 } as DOMRect;
    vi.spyOn(SVGElement.prototype, 'getBoundingClientRect').mockReturnValue(box);
    const scene = sceneOf(A);
    const { container } = render(<SceneDrawing scene={scene} pictureSize="medium" />);
    const card = matGroup(container, A)!.querySelector('rect')!;
    const perUnit = 1000 / scene.width;
    for (const name of ['x', 'y', 'width', 'height']) {
      const px = Number(card.getAttribute(name)) * perUnit;
      expect(Math.abs(px - Math.round(px))).toBeLessThan(1e-6);
    }
    expect(scene.items[0]).toMatchObject({ rect: { x: inches(9 / 16) } });
    expect(Number(card.getAttribute('x')) * perUnit).toBeCloseTo(23);
  });

  it('leaves out cards’ thin edges in a miniature, and takes the small pictures', () => {
    const { container } = render(<SceneDrawing scene={sceneOf(A, TITLE)} pictureSize="small" isMini />);
    expect(container.querySelector('image')!.getAttribute('href')).toContain('/small');
    expect(matGroup(container, A)!.querySelectorAll('path')).toHaveLength(0);
  });

  it('holds no inline markup that a strict content security policy would refuse', () => {
    const { container } = render(<SceneDrawing scene={sceneOf(A, B, TITLE)} pictureSize="medium" />);
    expect(container.querySelectorAll('style, script, [onerror], [onload]')).toHaveLength(0);
  });
});
