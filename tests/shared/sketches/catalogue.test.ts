import { describe, expect, it } from 'vitest';
import { findDocumentFaults } from '#shared/model/document-faults';
import { gridOf, matRect } from '#shared/geometry/grid';
import { contains, overlaps } from '#shared/geometry/rects';
import { inches } from '#shared/model/length';
import { PAGE_FORMATS, type PageFormat } from '#shared/model/page-format';
import { sketchesFor } from '#shared/sketches/catalogue';
import { SKETCH_NAMES } from '#shared/sketches/names';
import { canonicalForm, turnsOf, type Sketch } from '#shared/sketches/sketch';
import { buildMat, buildSpread, formatOf, matIdOf } from '../../support/builders';

/** Formats of a studio's own, which no sketch was drawn for. */
const OWN_FORMATS: readonly PageFormat[] = [
  { ...formatOf('12x12in'), id: 'own-ten', width: inches(10), height: inches(10) },
  { ...formatOf('8.5x11in'), id: 'own-nine-by-twelve', width: inches(9), height: inches(12) },
  { ...formatOf('12x12in'), id: 'own-flat', width: inches(11), height: inches(8, 1 / 2) },
];

const each = [...PAGE_FORMATS, ...OWN_FORMATS].flatMap((format) => sketchesFor(format).map((sketch) => [format.id, sketch.name, sketch, format] as const));

describe('sketchesFor', () => {
  it.each([
    ['12x12in', 30],
    ['a4', 12],
    ['12x12in-bleed', 8],
    ['8.5x11in', 8],
    ['8x8in', 8],
    ['6x8in', 8],
    ['30.5x30.5cm', 8],
    ['30x30cm', 8],
  ])('has for %s at least %d sketches', (id, least) => {
    expect(sketchesFor(formatOf(id)).length).toBeGreaterThanOrEqual(least);
  });

  it.each(OWN_FORMATS.map((format) => [format.id, format] as const))('adapts sketches to a studio’s own format: %s', (_, format) => {
    expect(sketchesFor(format).length).toBeGreaterThanOrEqual(6);
  });

  it.each(each)('%s · %s keeps its mats in whole steps on the grid, apart, one focal at most', (_id, _name, sketch, format) => {
    const { columns, rows } = gridOf(format);
    expect(sketch.mats.length).toBeGreaterThanOrEqual(3);
    expect(sketch.mats.length).toBeLessThanOrEqual(20);
    for (const { x, y, w, h } of sketch.mats) {
      expect([x, y, w, h].every(Number.isInteger)).toBe(true);
      expect(Math.min(x, y)).toBeGreaterThanOrEqual(0);
      expect(Math.min(w, h)).toBeGreaterThanOrEqual(2);
      expect(x + w).toBeLessThanOrEqual(columns);
      expect(y + h).toBeLessThanOrEqual(rows);
    }
    const rects = sketch.mats.map((mat) => matRect(format, { ...mat, trueSize: null }));
    const page = { x: 0, y: 0, width: format.width, height: format.height };
    rects.forEach((rect, i) => {
      expect(contains(page, rect)).toBe(true);
      expect(rects.slice(i + 1).some((other) => overlaps(rect, other))).toBe(false);
    });
    expect(sketch.mats.filter((mat) => mat.focal).length).toBeLessThanOrEqual(1);
    for (const group of new Set(sketch.mats.flatMap((mat) => mat.paneGroup ?? []))) {
      expect(sketch.mats.filter((mat) => mat.paneGroup === group).length).toBeGreaterThanOrEqual(2);
    }
  });

  it('makes no faulty document of any sketch', () => {
    for (const [, , sketch, format] of each) {
      const mats = sketch.mats.map(({ x, y, w, h }, i) => buildMat({ id: matIdOf(i), x, y, w, h, z: i }));
      expect(findDocumentFaults(buildSpread({ format, mats }))).toEqual([]);
    }
  });

  it.each([...PAGE_FORMATS, ...OWN_FORMATS].map((format) => [format.id, format] as const))('%s has no two that are turns or mirror images, and no name twice', (_, format) => {
    const sketches = sketchesFor(format);
    const forms = sketches.map((sketch) => canonicalForm(sketch.mats, gridOf(format)));
    expect(new Set(forms).size).toBe(sketches.length);
    expect(new Set(sketches.map(({ id }) => id)).size).toBe(sketches.length);
    expect(new Set(sketches.map(({ name }) => name)).size).toBe(sketches.length);
    // Not by the hash alone: no turn of one is drawn as another.
    const drawn = new Set(sketches.map((sketch) => plain(sketch.mats)));
    for (const sketch of sketches) {
      const others = turnsOf(sketch.mats, gridOf(format)).map(plain).filter((turn) => turn !== plain(sketch.mats));
      expect(others.some((turn) => drawn.has(turn))).toBe(false);
    }
  });

  it('gives every sketch two plain words of its own, kept for good', () => {
    const names = Object.values(SKETCH_NAMES);
    expect(new Set(names).size).toBe(names.length);
    for (const name of names) expect(name).toMatch(/^[A-Z][a-z]+ [A-Z][a-z]+$/);
    expect(SKETCH_NAMES['fa7d2cc5ea4fcb3a']).toBe('Milk Churn');
  });

  it('spreads the focal over the page, from three mats to twenty', () => {
    const sketches = sketchesFor(formatOf('12x12in'));
    const counts = sketches.map(({ mats }) => mats.length);
    expect(Math.min(...counts)).toBe(3);
    expect(Math.max(...counts)).toBe(20);
    expect(sketches.filter(({ mats }) => mats.some((mat) => mat.paneGroup !== undefined)).length).toBeGreaterThanOrEqual(6);
  });
});

const plain = (mats: Sketch['mats']): string => mats.map(({ x, y, w, h, paneGroup }) => `${x},${y},${w},${h},${paneGroup === undefined ? '' : 'pane'}`).join(';');
