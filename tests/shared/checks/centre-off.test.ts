import { describe, expect, it } from 'vitest';
import { centreOff } from '#shared/checks/centre-off';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import { viewFilled, type MatSketch } from '../../support/filled-spread';

const BARE = { content: { kind: 'bare' } } as const;
/** Bare card of one tone, whose weight is in proportion to its area, from that row on. */
const band = (y: number, h: number): MatSketch => [0, y, 22, h, BARE];
const both = (y: number, h: number) => viewFilled([band(y, h)], [band(y, h)]);

describe('centre-off', () => {
  it('notes weight that gathers at the foot or the top, and by how much', () => {
    // Rows 10 to 22: the middle of the cards lies 2 1/2 in under the page's, 41 % of the way to its edge.
    expect(centreOff.run(both(10, 12))).toMatchObject([{ messageId: 'centre-off', data: { edge: 'bottom', off: inches(2, 1 / 2) }, matIds: [] }]);
    expect(centreOff.run(both(0, 12))).toMatchObject([{ data: { edge: 'top' } }]);
  });

  it('is content with a centre near the middle, and draws the line where it is told', () => {
    expect(centreOff.run(both(0, 22))).toEqual([]);
    // 1 in off: 16.7 % of the way.
    expect(centreOff.run(both(4, 18))).toEqual([]);
    expect(centreOff.run(both(4, 18), { deviation: 16 })).toHaveLength(1);
    expect(centreOff.run(both(4, 18), { deviation: 17 })).toEqual([]);
  });

  it('leaves it to pages-unequal where one page is much heavier', () => {
    const view = viewFilled([band(10, 12)], [[0, 10, 4, 12, BARE]]);
    expect(centreOff.run(view)).toEqual([]);
  });

  it('speaks of a single page as well', () => {
    const [note] = centreOff.run(viewFilled([[0, 0, 8, 22, BARE]], [], { pages: { left: { color: '#ffffff' }, right: null } }));
    expect(note).toMatchObject({ data: { edge: 'left' } });
  });

  it('is silent while pages are half filled', () => {
    expect(runChecks(both(18, 4)).map((note) => note.checkId)).not.toContain('centre-off');
  });
});
