import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Note, SpreadView } from '#shared/checks/check';
import { CHECK_IDS } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';
import { runChecks } from '#shared/checks/run-checks';
import { weighSpread } from '#shared/checks/weight';
import { runCommand } from '#shared/commands/run-command';
import { gridOf } from '#shared/geometry/grid';
import { findDocumentFaults } from '#shared/model/document-faults';
import { applyPatch } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';
import { noteSentence, remedyLabel } from '#shared/words/en/notes';
import { buildRaster, buildSpread, buildView, formatOf, idOf } from '../../support/builders';
import { mirrorSpread, randomOf, randomSpread } from '../../support/random-spread';

const FORMATS = ['12x12in', '12x12in-bleed', '8.5x11in', '6x8in', 'a4', '30x30cm'] as const;
const RUNS = { numRuns: 40 };

const spreads = (withPanes = true) =>
  fc
    .record({ seed: fc.integer(), mats: fc.integer({ min: 0, max: 30 }), prints: fc.integer({ min: 1, max: 30 }), format: fc.constantFrom(...FORMATS) })
    .map(({ seed, format, ...parts }) => randomSpread(randomOf(seed), { ...parts, format: formatOf(format), withPanes, rasterSize: 12 }));

/** Every number in a note's or a weight's data. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (value instanceof Map) return [...value.values()].flatMap(numbersIn);
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(numbersIn) : [];
}

function stopKeys(view: SpreadView): Set<string> {
  return new Set(
    CHECK_IDS.filter((id) => CHECKS[id].severity === 'stop').flatMap((id) => CHECKS[id].run(view).map((finding) => `${id} ${[...finding.matIds].sort().join()}`)),
  );
}

describe('checks on random spreads', { timeout: 60_000 }, () => {
  it('the random spreads are documents that could be stored', () => {
    fc.assert(
      fc.property(spreads(), ({ doc }) => {
        expect(findDocumentFaults(doc).filter(({ code }) => code !== 'no-room-for-photo')).toEqual([]);
      }),
      RUNS,
    );
  });

  it('never throw, give finite numbers only, and every note has its sentence and its label', () => {
    fc.assert(
      fc.property(spreads(), ({ doc, prints }) => {
        const view = buildView({ doc, prints });
        const notes = runChecks(view);
        for (const number of [...numbersIn(notes), ...numbersIn(weighSpread(view))]) expect(Number.isFinite(number)).toBe(true);
        for (const note of notes) {
          for (const unit of ['in', 'mm'] as const) {
            expect(noteSentence(note, unit)).toMatch(/^[^a-z].*\.$/);
            if (note.remedy) expect([...remedyLabel(note.remedy, unit)].length).toBeLessThanOrEqual(20);
          }
        }
      }),
      RUNS,
    );
  });

  it('no remedy makes a stop that was not there, on the whole spread; a stop’s own remedy ends it', () => {
    let tried = 0;
    fc.assert(
      fc.property(spreads(), ({ doc, prints }) => {
        const view = buildView({ doc, prints });
        const before = stopKeys(view);
        for (const note of runChecks(view)) {
          if (!note.remedy) continue;
          let made = 0;
          const newId = (): string => idOf((made += 1), 9);
          const patch = runCommand(doc, note.remedy.call, { prints: view.prints, trim: view.trim, newId });
          expect(Object.keys(patch)).not.toEqual([]);
          const after = stopKeys(buildView({ doc: applyPatch(doc, patch), prints }));
          expect([...after].filter((key) => !before.has(key))).toEqual([]);
          if (note.severity === 'stop') expect([...after]).not.toContain(`${note.checkId} ${[...note.matIds].sort().join()}`);
          tried += 1;
        }
      }),
      RUNS,
    );
    expect(tried).toBeGreaterThan(100);
  });

  it('say the same about the same spread, remembered or not', () => {
    fc.assert(
      fc.property(spreads(), ({ doc, prints }) => {
        const first = runChecks(buildView({ doc, prints }));
        expect(runChecks(buildView({ doc, prints }))).toEqual(first);
        expect(runChecks(buildView({ doc: structuredClone(doc), prints: structuredClone(prints) }))).toEqual(first);
      }),
      RUNS,
    );
  });

  it('turn their notes over when the spread is turned over', () => {
    const summary = (notes: readonly Note[], turned: boolean): string[] =>
      notes
        // Pictures are not mirrored with their mats: what lies over one hides another part of it, and the weights change a little.
        .filter((note) => note.checkId !== 'pages-unequal' && note.checkId !== 'centre-off')
        .map((note) => {
          const page = note.matIds.length === 0 ? '-' : turned ? note.page : note.page === 'left' ? 'right' : 'left';
          return JSON.stringify([note.checkId, note.messageId, page, [...note.matIds].sort(), note.data, note.remedy?.messageId]);
        })
        .sort();
    fc.assert(
      fc.property(spreads(false), ({ doc, prints }) => {
        const notes = runChecks(buildView({ doc, prints }));
        expect(summary(runChecks(buildView({ doc: mirrorSpread(doc), prints })), true)).toEqual(summary(notes, false));
      }),
      RUNS,
    );
  });

  it('weigh a spread whose pages mirror each other 50 to 50, its centre on the gutter', () => {
    fc.assert(
      fc.property(spreads(false), ({ doc, prints }) => {
        // Pictures are never mirrored: plain ones, mounted whole, are their own mirror image.
        const plain = prints.map((print) => ({ ...print, faces: [], raster: buildRaster(4, 4, [0.3, 0.1, 0]) }));
        const half = doc.mats
          .filter((mat) => mat.page === 'left')
          .map((mat) => (mat.content.kind === 'print' ? { ...mat, content: { ...mat.content, mode: 'whole' as const } } : mat));
        const color = doc.pages.left!.color;
        const symmetric: SpreadDocument = buildSpread({ ...doc, pages: { left: { color }, right: { color } }, mats: half });
        const { columns } = gridOf(doc.format);
        const twins = half.map((mat, i) => ({ ...mat, id: idOf(i + 1, 8), page: 'right' as const, x: columns - mat.x - mat.w }));
        const { left, right, centre } = weighSpread(buildView({ doc: buildSpread({ ...symmetric, mats: [...half, ...twins] }), prints: plain }));
        expect([left, right]).toEqual(half.length > 0 ? [50, 50] : [0, 0]);
        if (centre) expect(Math.abs(centre.x - doc.format.width)).toBeLessThanOrEqual(2);
      }),
      RUNS,
    );
  });
});
