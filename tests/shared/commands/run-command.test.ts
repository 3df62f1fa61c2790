import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runCommand, whyNot } from '#shared/commands/run-command';
import type { CommandContext } from '#shared/commands/command';
import { documentSchema } from '#shared/contracts/document';
import { turnedSize } from '#shared/geometry/paper';
import { placedPaper } from '#shared/geometry/window';
import { placedPhotos } from '#shared/geometry/placed-photos';
import { findDocumentFaults } from '#shared/model/document-faults';
import { applyPatch, invertPatch, readKey } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { idOf, printsById } from '../../support/builders';
import { callsOn, PRINTS, spreads } from '../../support/spread-arbitraries';

const prints = printsById(PRINTS);

function newContext(): CommandContext {
  let n = 0;
  return { prints, trim: TRIM_SETTINGS_INCH, newId: () => idOf((n += 1), 7) };
}

/** A spread, and three commands to run on it one after the other. */
const histories = spreads.chain((doc) => fc.tuple(fc.constant(doc), callsOn(doc), callsOn(doc), callsOn(doc)));

const plain = (doc: SpreadDocument): unknown => JSON.parse(JSON.stringify(doc));

describe('every command', { timeout: 60_000 }, () => {
  it('starts from spreads that are faultless', () => {
    fc.assert(
      fc.property(spreads, (doc) => {
        expect(findDocumentFaults(doc, { print: (id) => prints.has(id) })).toEqual([]);
      }),
    );
  });

  it('never leaves a faulty document, and its patch can be taken back exactly', () => {
    fc.assert(
      fc.property(histories, ([start, ...calls]) => {
        const context = newContext();
        let doc = start;
        for (const call of calls) {
          const patch = runCommand(doc, call, context);
          const next = applyPatch(doc, patch);
          expect(findDocumentFaults(next, { print: (id) => prints.has(id) })).toEqual([]);
          expect(documentSchema.parse(plain(next))).toEqual(next);
          for (const [key, { before, after }] of Object.entries(patch)) {
            expect(before).toEqual(readKey(doc, key));
            expect(after).toEqual(readKey(next, key));
          }
          expect(applyPatch(next, invertPatch(patch))).toEqual(doc);
          doc = next;
        }
      }),
      { numRuns: 800 },
    );
  });

  it('leaves no fault behind a split and the merge that takes it back', () => {
    let merges = 0;
    fc.assert(
      fc.property(spreads, fc.nat(13), fc.integer({ min: 1, max: 3 }), fc.integer({ min: 1, max: 3 }), (doc, at, columns, rows) => {
        const mat = doc.mats[at];
        if (!mat || mat.laidOver) return;
        const context = newContext();
        const pieces = applyPatch(doc, runCommand(doc, { id: 'mats.split', args: { matId: mat.id, columns, rows } }, context));
        const ids = pieces.mats.filter(({ id }) => id === mat.id || !doc.mats.some((old) => old.id === id)).map(({ id }) => id);
        const merged = applyPatch(pieces, runCommand(pieces, { id: 'mats.merge', args: { matIds: ids } }, context));
        expect(findDocumentFaults(merged)).toEqual([]);
        expect(merged.mats.map(({ page, x, y, w, h }) => [page, x, y, w, h]).sort()).toEqual(doc.mats.map(({ page, x, y, w, h }) => [page, x, y, w, h]).sort());
        merges += ids.length > 1 ? 1 : 0;
      }),
      { numRuns: 400 },
    );
    expect(merges).toBeGreaterThan(10);
  });

  it('gives a reason exactly where it does nothing', () => {
    fc.assert(
      fc.property(histories, ([doc, call]) => {
        const patch = runCommand(doc, call, newContext());
        expect(whyNot(doc, call, newContext()) === null).toBe(Object.keys(patch).length > 0);
      }),
    );
  });

  it('keeps at most one declared focal on a page', () => {
    fc.assert(
      fc.property(histories, ([start, ...calls]) => {
        const context = newContext();
        const end = calls.reduce((doc, call) => applyPatch(doc, runCommand(doc, call, context)), start);
        for (const side of ['left', 'right']) expect(end.mats.filter((mat) => mat.page === side && mat.focal).length).toBeLessThan(2);
      }),
    );
  });

  it('leaves windows that it changed on the finest mark and, where the paper is large enough, on the paper', () => {
    fc.assert(
      fc.property(histories, ([doc, call]) => {
        const next = applyPatch(doc, runCommand(doc, call, newContext()));
        const before = placedPhotos(doc, (id) => prints.get(id));
        for (const photo of placedPhotos(next, (id) => prints.get(id))) {
          const { placement } = photo;
          if (photo.groupId || placement.mode === 'whole' || before.some((old) => old.placement === placement || JSON.stringify(old) === JSON.stringify(photo))) continue;
          const old = before.find((was) => was.matId === photo.matId);
          if (old && JSON.stringify(old.placement) === JSON.stringify(placement) && old.rect.width === photo.rect.width && old.rect.height === photo.rect.height) continue;
          expect(placement.x % TRIM_SETTINGS_INCH.finestMark || placement.y % TRIM_SETTINGS_INCH.finestMark || 0).toBe(0);
          const paper = placedPaper(prints.get(photo.printId)!, placement);
          const shown = turnedSize(photo.rect, placement.turn);
          if (shown.width <= paper.width) expect(placement.x >= 0 && placement.x + shown.width <= paper.width).toBe(true);
          if (shown.height <= paper.height) expect(placement.y >= 0 && placement.y + shown.height <= paper.height).toBe(true);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('never changes its input', () => {
    fc.assert(
      fc.property(histories, ([doc, call]) => {
        const copy = plain(doc);
        runCommand(doc, call, newContext());
        expect(doc).toEqual(copy);
      }),
    );
  });
});
