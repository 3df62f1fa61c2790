import { existsSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { CHECK_IDS, type CheckId } from '#shared/checks/check-ids';
import { CHECK_EXAMPLES } from '#shared/checks/examples/check-examples';
import { readDrawn } from '#shared/checks/examples/drawn-picture';
import type { ExampleSpread } from '#shared/checks/examples/parts';
import { runChecks } from '#shared/checks/run-checks';
import { findDocumentFaults } from '#shared/model/document-faults';
import { buildView } from '../../support/builders';

const notesOn = ({ doc, prints }: ExampleSpread) => runChecks(buildView({ doc, prints: prints.map(({ print }) => print) }));
const idsOn = (spread: ExampleSpread): CheckId[] => [...new Set(notesOn(spread).map(({ checkId }) => checkId))];

describe('the examples of every check', () => {
  it.each(CHECK_IDS)('%s: the wrong spread raises it and nothing that the right one does not; the right one never does', (id) => {
    const { wrong, right } = CHECK_EXAMPLES[id];
    const before = idsOn(right);
    expect(before).not.toContain(id);
    expect(idsOn(wrong).filter((other) => !before.includes(other))).toEqual([id]);
  });

  it.each(CHECK_IDS)('%s: both are documents that could be stored, on pages of one format, and stand in a file of their own', (id) => {
    const { wrong, right } = CHECK_EXAMPLES[id];
    for (const { doc, prints } of [wrong, right]) {
      const known = new Set(prints.map(({ print }) => print.id));
      expect(findDocumentFaults(doc, { print: (printId) => known.has(printId) })).toEqual([]);
    }
    expect(wrong.doc.format.id).toBe(right.doc.format.id);
    expect(wrong.doc).not.toEqual(right.doc);
    expect(existsSync(new URL(`../../../shared/checks/examples/${id}.ts`, import.meta.url))).toBe(true);
  });
});

describe('a drawn picture', () => {
  const picture = {
    width: 100,
    height: 50,
    shapes: [
      { kind: 'rect', x: 0, y: 0, width: 100, height: 50, fill: '#ffffff' },
      { kind: 'polygon', points: [[0, 0], [50, 0], [50, 50], [0, 50]], fill: '#000000' },
      { kind: 'ellipse', cx: 75, cy: 25, rx: 10, ry: 10, fill: '#ff0000' },
    ],
  } as const;

  it('has the palette of what it shows', () => {
    const { palette, raster } = readDrawn(picture);
    expect([raster.width, raster.height]).toEqual([64, 32]);
    expect(palette.map(({ hex }) => hex)).toEqual(['#000000', '#ffffff', '#ff0000']);
    expect(palette[0]!.share).toBeCloseTo(0.5, 6);
    expect(palette[2]!.share).toBeCloseTo((Math.PI * 100) / 5000, 2);
  });
});
