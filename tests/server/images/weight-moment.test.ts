import { fileURLToPath } from 'node:url';
import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { drawScene } from '#server/images/draw-scene';
import { SHAPE_PULL } from '#shared/checks/weight-factors';
import { weighSpread } from '#shared/checks/weight';
import { hexToOklab, rgbToOklab } from '#shared/colour/convert';
import { encodeRaster } from '#shared/colour/raster';
import { inches } from '#shared/model/length';
import type { OklabRaster, Print } from '#shared/model/print';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent, printIdOf, printsById } from '../../support/builders';

const PAGE = '#efe6d2';
const photoFile = (name: string): string => fileURLToPath(new URL(`../../../server/setup/demo/photos/${name}`, import.meta.url));

/** The raster that intake would store: 64 px on the long side, in OKLab. */
async function rasterOf(file: string): Promise<OklabRaster> {
  const { data, info } = await sharp(file).resize(64, 64, { fit: 'inside' }).removeAlpha().raw().toBuffer({ resolveWithObject: true });
  const oklab: number[] = [];
  for (let at = 0; at < data.length; at += 3) oklab.push(...rgbToOklab(data[at]!, data[at + 1]!, data[at + 2]!));
  return encodeRaster(info.width, info.height, oklab);
}

async function printOf(n: number, name: string, widthIn: number, heightIn: number): Promise<Print> {
  const { width, height } = await sharp(photoFile(name)).metadata();
  return buildPrint({ id: printIdOf(n), paperWidth: inches(widthIn), paperHeight: inches(heightIn), imageWidth: width, imageHeight: height, raster: await rasterOf(photoFile(name)) });
}

/** Where the drawn picture's mass lies, as shares of its width and height: every pixel that is not page pulls by its colour. */
async function imageMoment(doc: SpreadDocument, prints: readonly Print[], files: ReadonlyMap<string, string>): Promise<{ x: number; y: number }> {
  const scene = buildScene(doc, printsById(prints));
  const drawing = await drawScene(scene, { widthPx: 960, loadPicture: async (id) => ({ data: await sharp(files.get(id)).toBuffer() }) });
  const { data, info } = await drawing.raw().toBuffer({ resolveWithObject: true });
  const [pageL] = hexToOklab(PAGE);
  const pageRgb = [1, 3, 5].map((at) => Number.parseInt(PAGE.slice(at, at + 2), 16));
  let mass = 0;
  let x = 0;
  let y = 0;
  for (let at = 0; at < data.length; at += 3) {
    if (pageRgb.every((value, i) => Math.abs(data[at + i]! - value) <= 1)) continue;
    const [l, a, b] = rgbToOklab(data[at]!, data[at + 1]!, data[at + 2]!);
    const pull = SHAPE_PULL + Math.abs(l - pageL) + Math.hypot(a, b);
    const pixel = at / 3;
    mass += pull;
    x += pull * ((pixel % info.width) + 0.5);
    y += pull * (Math.floor(pixel / info.width) + 0.5);
  }
  return { x: x / mass / info.width, y: y / mass / info.height };
}

function ourCentre(doc: SpreadDocument, prints: readonly Print[]): { x: number; y: number } {
  const { centre } = weighSpread(buildView({ doc, prints }));
  return { x: centre!.x / (2 * doc.format.width), y: centre!.y / doc.format.height };
}

/** An edge to edge pair of pages has no fold that would count as mass in the picture. */
const spreadOf = (mats: readonly Mat[]): SpreadDocument => {
  const doc = buildSpread({ pages: { left: { color: PAGE }, right: { color: PAGE } }, mats });
  return { ...doc, binding: { ...doc.binding, gap: 0 } };
};

describe('the centre of mass against the moment of the drawn spread', () => {
  it('is the same to a thousandth of the spread for card, inner mats and mats laid over others', async () => {
    const doc = spreadOf([
      buildMat({ id: matIdOf(1), x: 1, y: 2, w: 9, h: 7, color: '#1f4f5f', inner: { color: '#d99e32', reveal: inches(1 / 2) } }),
      buildMat({ id: matIdOf(2), x: 8, y: 6, w: 8, h: 9, z: 1, laidOver: true, color: '#b8cfc4' }),
      buildMat({ id: matIdOf(3), x: 0, y: 16, w: 22, h: 4, color: '#a3240f' }),
      buildMat({ id: matIdOf(4), page: 'right', x: 12, y: 10, w: 10, h: 12, color: '#1b1d22', content: { kind: 'embellishment', name: '', color: '#fdfcf8' } }),
    ]);
    const [ours, image] = [ourCentre(doc, []), await imageMoment(doc, [], new Map())];
    expect(Math.abs(ours.x - image.x)).toBeLessThan(0.001);
    expect(Math.abs(ours.y - image.y)).toBeLessThan(0.001);
  });

  it('is the same to one in two hundred with photographs, whose detail the picture’s moment does not weigh', async () => {
    const [headland, tower] = [await printOf(1, 'headland.jpg', 6, 4), await printOf(2, 'tower.jpg', 5, 7)];
    const doc = spreadOf([
      buildMat({ id: matIdOf(1), x: 0, y: 0, w: 12, h: 8, color: '#1f4f5f', content: printContent(headland, { x: inches(1 / 8), y: inches(1 / 8) }) }),
      buildMat({ id: matIdOf(2), x: 4, y: 10, w: 6, h: 9, color: '#b8cfc4', content: printContent(tower, { x: inches(1), y: inches(2) }) }),
      buildMat({ id: matIdOf(3), page: 'right', x: 8, y: 6, w: 12, h: 16, color: '#d99e32', content: printContent(tower, { mode: 'whole' }) }),
    ]);
    const files = new Map([[headland.id, photoFile('headland.jpg')], [tower.id, photoFile('tower.jpg')]]);
    const [ours, image] = [ourCentre(doc, [headland, tower]), await imageMoment(doc, [headland, tower], files)];
    expect(Math.abs(ours.x - image.x)).toBeLessThan(0.005);
    expect(Math.abs(ours.y - image.y)).toBeLessThan(0.005);
    expect(Math.abs(ours.x - 0.5)).toBeGreaterThan(0.01);
  });
});
