import { examplePrint, smallPage, splitOver, type CheckExample, type ExampleSpread } from './parts';
import { lighthouse } from './pictures';

const TOWER = examplePrint({ n: 1, title: 'The light', width: 6, height: 6, draw: lighthouse });

type Cells = readonly [x: number, y: number, w: number, h: number];

/** A print split over four panes, given in steps. */
function split(cells: readonly [Cells, Cells, Cells, Cells]): ExampleSpread {
  const { group, content } = splitOver(TOWER, cells.length, 0.5, 0.5);
  return smallPage(cells.map(([x, y, w, h]) => ['left', x, y, w, h, content] as const), [TOWER], { panes: [group] });
}

export const panesInseparable: CheckExample = {
  wrong: split([[0, 2, 6, 4], [6, 2, 4, 6], [4, 8, 6, 4], [0, 6, 4, 6]]),
  right: split([[0, 2, 6, 4], [6, 2, 4, 4], [4, 6, 6, 6], [0, 6, 4, 6]]),
};
