import { describe, expect, it } from 'vitest';
import { copiesNeeded, type CopyUse } from '#shared/geometry/copies';
import { morePlacementsThanCopies } from '#shared/checks/more-placements-than-copies';
import { runChecks } from '#shared/checks/run-checks';
import { canSeparate } from '#shared/geometry/separable';
import { inches } from '#shared/model/length';
import type { Placement } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';

/** Mats of 4 × 4 steps, photos of 1 5/8 in, each with a placement of one 6 × 4 in print. */
function viewOf(placements: readonly Partial<Placement>[], { copies = 1, elsewhere = 0, digital = false } = {}) {
  const print = buildPrint({ copies, marks: { digital } });
  const mats = placements.map((placement, i) => buildMat({ id: matIdOf(i + 1), x: i * 4, content: printContent(print, placement) }));
  return buildView({ doc: buildSpread({ mats }), prints: [print], usedElsewhere: { [print.id]: elsewhere } });
}
const at = (x: number, y = 0): Partial<Placement> => ({ x: inches(x), y: inches(y) });
const run = (...args: Parameters<typeof viewOf>) => morePlacementsThanCopies.run(viewOf(...args));

describe('more-placements-than-copies', () => {
  it('stops a print that is placed twice at the same place, and counts what is needed', () => {
    expect(run([at(0), at(0)])).toMatchObject([
      { messageId: 'more-placements', data: { needed: 2, copies: 1, elsewhere: 0 }, matIds: [matIdOf(2), matIdOf(1)] },
    ]);
    expect(run([at(0), at(0)], { copies: 2 })).toEqual([]);
  });

  it('lets pieces share a copy from the tolerance apart on, and not nearer', () => {
    expect(run([at(0), at(1.625 + 1 / 16)])).toEqual([]);
    expect(run([at(0), { x: inches(1.625 + 1 / 16) - 1, y: 0 }])).toHaveLength(1);
  });

  it('gives a whole print a copy of its own', () => {
    expect(run([at(0), { mode: 'whole' }])).toHaveLength(1);
  });

  it('counts the copies that other spreads use', () => {
    expect(run([at(0)], { copies: 2, elsewhere: 1 })).toEqual([]);
    expect(run([at(0)], { copies: 2, elsewhere: 2 })).toMatchObject([{ data: { needed: 3, copies: 2, elsewhere: 2 } }]);
  });

  it('never runs short of a digital photo', () => {
    expect(run([at(0), at(0)], { digital: true })).toEqual([]);
  });

  it('takes all panes of one group for one copy', () => {
    const print = buildPrint();
    const { group, mats } = buildPanes(print, [buildMat({ x: 0 }), buildMat({ x: 4 })]);
    const doc = buildSpread({ mats, panes: [group] });
    expect(morePlacementsThanCopies.run(buildView({ doc, prints: [print] }))).toEqual([]);
    const more = buildSpread({ mats: [...mats, buildMat({ x: 8, content: printContent(print) })], panes: [group] });
    expect(morePlacementsThanCopies.run(buildView({ doc: more, prints: [print] }))).toHaveLength(1);
  });

  it('puts back as many as are too many, the last ones placed', () => {
    const note = runChecks(viewOf([at(0), at(0), at(0)], { copies: 1 })).find(({ checkId }) => checkId === 'more-placements-than-copies');
    expect(note?.remedy).toMatchObject({ messageId: 'back-to-table', call: { id: 'prints.lift', args: { matIds: [matIdOf(2), matIdOf(3)] } } });
  });
});

describe('copiesNeeded', () => {
  const piece = (x: number, y: number, width: number, height: number): CopyUse => ({ kind: 'piece', window: { x, y, width, height } });

  it('tries every way of sharing pieces out, where first come, first served would take one more', () => {
    // Each overlaps the next of a, b, c, d: a with c and b with d need two copies; a and d first, then b, then c, would need three.
    const [a, b, c, d] = [0, 8, 16, 24].map((x) => piece(x, 0, 10, 10));
    expect(copiesNeeded([a!, d!, b!, c!], 0)).toBe(2);
  });

  it('gives four pieces that stand like a pinwheel two copies, since no edge-to-edge cut parts them', () => {
    const pinwheel = [piece(0, 0, 20, 10), piece(20, 0, 10, 20), piece(10, 20, 20, 10), piece(0, 10, 10, 20)];
    expect(copiesNeeded(pinwheel, 0)).toBe(2);
    expect(copiesNeeded(pinwheel.slice(1), 0)).toBe(1);
  });
});

describe('canSeparate', () => {
  const rect = (x: number, y: number, width: number, height: number) => ({ x, y, width, height });
  it('parts a grid, touching edges included', () => {
    expect(canSeparate([rect(0, 0, 5, 5), rect(5, 0, 5, 5), rect(0, 5, 5, 5), rect(5, 5, 5, 5)])).toBe(true);
  });
  it('finds a pinwheel inside what a first cut leaves', () => {
    const pinwheel = [rect(0, 0, 20, 10), rect(20, 0, 10, 20), rect(10, 20, 20, 10), rect(0, 10, 10, 20)];
    expect(canSeparate([...pinwheel, rect(40, 0, 5, 30)])).toBe(false);
    expect(canSeparate([...pinwheel.slice(0, 3), rect(40, 0, 5, 30)])).toBe(true);
  });
});
