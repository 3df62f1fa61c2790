import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { seamThroughKeepZone } from '#shared/checks/seam-through-keep-zone';
import { inches } from '#shared/model/length';
import type { PxRect } from '#shared/model/print';
import { buildMat, buildPanes, buildPrint, buildSpread, buildView } from '../../support/builders';

/**
 * Two 4 × 4 step mats side by side, photos 1 5/8 in square, 3/8 in apart. Behind, the windows show the paper
 * from 0 to 1 5/8 and from 2 to 3 5/8 in; apart, from 0 to 1 5/8 and on to 3 1/4 in.
 */
function viewOf(run: 'behind' | 'apart', keepZone: PxRect | null, x = 0, paperWidth = inches(6)) {
  const print = buildPrint({ keepZone, paperWidth });
  const { group, mats } = buildPanes(print, [buildMat({ x: 0 }), buildMat({ x: 4 })], { run, x });
  return buildView({ doc: buildSpread({ mats, panes: [group] }), prints: [print] });
}
const zone = (x: number, width: number): PxRect => ({ x, y: 30, width, height: 50 });

describe('seam-through-keep-zone', () => {
  it('accepts a keep zone that lies within one pane with the tolerance to spare', () => {
    expect(seamThroughKeepZone.run(viewOf('behind', zone(20, 100)))).toEqual([]);
    expect(seamThroughKeepZone.run(viewOf('behind', zone(220, 100)))).toEqual([]);
    // From 2 1/16 in on, to the hundredth.
    expect(seamThroughKeepZone.run(viewOf('behind', zone(207, 100)))).toEqual([]);
    expect(seamThroughKeepZone.run(viewOf('behind', zone(206, 100)))).toHaveLength(1);
  });

  it('stops where the gap swallows part of it', () => {
    expect(seamThroughKeepZone.run(viewOf('behind', zone(150, 40)))).toMatchObject([{ messageId: 'seam-behind' }]);
  });

  it('stops where a cut goes through it, though nothing is swallowed', () => {
    expect(seamThroughKeepZone.run(viewOf('apart', zone(140, 60)))).toMatchObject([{ messageId: 'seam-apart' }]);
    expect(seamThroughKeepZone.run(viewOf('apart', zone(175, 100)))).toEqual([]);
  });

  it('slides the whole window by as little as brings the zone into one pane', () => {
    // The zone needs 1 7/16 to 1 9/16 + its width; from −3/8 in on, the second pane would hold it, which is off the paper.
    const [note] = runChecks(viewOf('behind', zone(150, 40)));
    expect(note).toMatchObject({ severity: 'stop', remedy: { messageId: 'slide-window', call: { id: 'window.slide', args: { x: inches(3 / 8) } } } });
  });

  it('runs the picture the other way where sliding cannot help', () => {
    // The zone needs 1.84 to 3.26 in; 3 3/4 in of paper leave no room to slide. Apart, about the same centre, a pane shows 1.81 to 3.44.
    const [note] = runChecks(viewOf('behind', zone(190, 130), 0, inches(3.75)));
    expect(note).toMatchObject({ checkId: 'seam-through-keep-zone', remedy: { messageId: 'spread-apart', call: { args: { run: 'apart' } } } });
  });

  it('leaves a zone outside the window to keep-zone-cut', () => {
    expect(seamThroughKeepZone.run(viewOf('behind', zone(400, 100)))).toEqual([]);
    const notes = runChecks(viewOf('behind', zone(400, 100))).filter((note) => note.severity === 'stop');
    expect(notes.map((note) => note.checkId)).toEqual(['keep-zone-cut']);
  });

  it('has nothing to hold without a keep zone', () => {
    expect(seamThroughKeepZone.run(viewOf('behind', null))).toEqual([]);
  });
});
