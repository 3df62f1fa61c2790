import { describe, expect, it } from 'vitest';
import { bareMat } from '#shared/checks/bare-mat';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import { buildPrint, buildSpread, buildView, matIdOf } from '../../support/builders';
import { buildFilled, type MatSketch } from '../../support/filled-spread';

const FULL: readonly MatSketch[] = [[0, 0, 22, 15]];
/** A bare mat of 7 × 5 steps, photo 3 1/8 × 2 1/8 in, under a large picture. */
const BARE: MatSketch = [0, 15, 7, 5, { content: { kind: 'bare' } }];

function viewOf(onTable: readonly Print[], usedElsewhere: Record<string, number> = {}) {
  const { doc, prints } = buildFilled([...FULL, BARE], FULL);
  return buildView({ doc: buildSpread({ ...doc, table: onTable.map((print) => print.id) }), prints: [...prints, ...onTable], usedElsewhere });
}
const fitting = (...args: Parameters<typeof viewOf>) => bareMat.run(viewOf(...args))[0]?.data;
/** Hundredths of an inch. */
const withZone = (width: number, height: number, parts: Parameters<typeof buildPrint>[0] = {}) =>
  buildPrint({ keepZone: { x: 100, y: 50, width, height }, ...parts });

describe('bare-mat', () => {
  it('notes a bare mat, with no print to offer', () => {
    expect(bareMat.run(viewOf([]))).toMatchObject([{ messageId: 'bare-mat', data: { fitting: 0 }, matIds: [matIdOf(2)] }]);
  });

  it('counts prints whose keep zone fits with the tolerance to spare', () => {
    expect(fitting([withZone(300, 200)])).toEqual({ fitting: 1 });
    expect(fitting([withZone(301, 200)])).toEqual({ fitting: 0 });
    expect(fitting([withZone(200, 300)])).toEqual({ fitting: 0 });
    expect(fitting([withZone(200, 300, { marks: { noUp: true } })])).toEqual({ fitting: 1 });
  });

  it('counts a print that must not be cut only where all of it fits', () => {
    const film = (width: number) => buildPrint({ paperWidth: inches(width), paperHeight: inches(2), marks: { instantFilm: true } });
    expect(fitting([film(3), film(4)])).toEqual({ fitting: 1 });
  });

  it('leaves out prints of which no copy is left', () => {
    const print = withZone(100, 100, { copies: 2 });
    expect(fitting([print], { [print.id]: 1 })).toEqual({ fitting: 1 });
    expect(fitting([print], { [print.id]: 2 })).toEqual({ fitting: 0 });
  });

  it('offers to place the print of which the least is lost', () => {
    const large = withZone(100, 100, { title: 'Large', paperWidth: inches(7), paperHeight: inches(5) });
    const near = withZone(100, 100, { title: 'Near', paperWidth: inches(3.5), paperHeight: inches(2.5) });
    const note = runChecks(viewOf([large, near])).find(({ checkId }) => checkId === 'bare-mat');
    expect(note?.remedy).toMatchObject({ messageId: 'place-best-fit', call: { id: 'prints.place', args: { printId: near.id, matId: matIdOf(2) } } });
  });

  it('keeps silent while the pages are half filled', () => {
    const bare: MatSketch = [0, 0, 22, 15, { content: { kind: 'bare' } }];
    const { doc, prints } = buildFilled([bare], FULL);
    expect(runChecks(buildView({ doc, prints })).map((note) => note.checkId)).not.toContain('bare-mat');
  });
});
