import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';
import { viewFilled, type MatSketch } from '../../support/filled-spread';

const film = () => buildPrint({ marks: { instantFilm: true } });

describe('runChecks', () => {
  it('says nothing about an empty spread', () => {
    expect(runChecks(buildView({ doc: buildSpread() }))).toEqual([]);
  });

  it('puts stops first, then goes by page, from top to bottom, from left to right', () => {
    const prints = [film(), film(), film(), film(), buildPrint({ paperWidth: inches(7), paperHeight: inches(5) })];
    const mats = [
      buildMat({ id: matIdOf(1), page: 'right', x: 0, y: 0, content: printContent(prints[0]!) }),
      buildMat({ id: matIdOf(2), page: 'left', x: 0, y: 8, content: printContent(prints[1]!) }),
      buildMat({ id: matIdOf(3), page: 'left', x: 8, y: 0, content: printContent(prints[2]!) }),
      buildMat({ id: matIdOf(4), page: 'left', x: 4, y: 0, content: printContent(prints[3]!) }),
      // Only to be fixed: a whole print larger than its mat.
      buildMat({ id: matIdOf(5), page: 'left', x: 0, y: 0, content: printContent(prints[4]!, { mode: 'whole' }) }),
    ];
    const notes = runChecks(buildView({ doc: buildSpread({ mats }), prints }));
    expect(notes.map((note) => note.matIds[0])).toEqual([4, 3, 2, 1, 5].map(matIdOf));
    expect(notes.map((note) => note.page)).toEqual(['left', 'left', 'left', 'right', 'left']);
  });

  it('gives a note the same key while its cause lasts, and other keys to other mats', () => {
    const [a, b] = [film(), film()];
    const doc = (x: number) => buildSpread({ mats: [buildMat({ id: matIdOf(1), x, content: printContent(a) }), buildMat({ id: matIdOf(2), y: 8, content: printContent(b) })] });
    const keys = (x: number): string[] => runChecks(buildView({ doc: doc(x), prints: [a, b] })).map((note) => note.key);
    expect(keys(4)).toEqual(keys(6));
    expect(new Set(keys(4)).size).toBe(2);
  });

  it('keeps design checks silent until every page is half covered and three quarters of that carries something', () => {
    const design = (right: readonly MatSketch[]): string[] =>
      runChecks(viewFilled([[0, 0, 22, 11]], right)).map((note) => note.checkId).filter((id) => id === 'no-title');
    expect(design([[0, 0, 22, 11]])).toEqual(['no-title']);
    expect(design([[0, 0, 22, 10]])).toEqual([]);
    const bare = { content: { kind: 'bare' } } as const;
    expect(design([[0, 0, 22, 12], [0, 12, 22, 4, bare]])).toEqual(['no-title']);
    expect(design([[0, 0, 22, 12], [0, 12, 22, 5, bare]])).toEqual([]);
  });

  it('leaves muted checks out, but still offers no remedy that would make their stop', () => {
    // A whole print that overhangs: trimming it would cut film.
    const print = buildPrint({ paperWidth: inches(4), paperHeight: inches(3), marks: { instantFilm: true } });
    const mats = [buildMat({ id: matIdOf(1), w: 7, h: 5, content: printContent(print, { mode: 'whole' }) }), buildMat({ x: 7, h: 5 }), buildMat({ y: 5, w: 7 })];
    const view = buildView({ doc: buildSpread({ mats }), prints: [print] });
    const notes = runChecks(view, { muted: new Set(['never-cut']) });
    expect(notes).toMatchObject([{ checkId: 'whole-overhangs', remedy: { messageId: 'back-to-table' } }]);
    expect(runChecks(view, { muted: new Set(['whole-overhangs']) })).toEqual([]);
  });

  it('passes thresholds on', () => {
    const view = viewFilled([[0, 0, 22, 12, { focal: true }]], [[0, 3, 22, 12, { focal: true }]]);
    const has = (settings = {}): boolean => runChecks(view, settings).some((note) => note.checkId === 'focals-same-place');
    expect(has()).toBe(false);
    expect(has({ thresholds: { 'focals-same-place': { distance: 3 } } })).toBe(true);
  });

  it('speaks of a print that was used elsewhere since, without a change of the spread', () => {
    const print = buildPrint();
    const doc = buildSpread({ mats: [buildMat({ content: printContent(print) })] });
    const ids = (usedElsewhere: Record<string, number>) => runChecks(buildView({ doc, prints: [print], usedElsewhere })).map((note) => note.checkId);
    expect(ids({})).not.toContain('more-placements-than-copies');
    expect(ids({ [print.id]: 1 })).toContain('more-placements-than-copies');
  });

  it('does not trip over a print that it does not know', () => {
    const doc = buildSpread({ mats: [buildMat({ content: printContent('00000001-0000-4000-8000-00000000ffff') })] });
    expect(runChecks(buildView({ doc }))).toEqual([]);
  });
});
