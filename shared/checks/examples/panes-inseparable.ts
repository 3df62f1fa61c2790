import { examplePrint, smallPage, splitOver, type CheckExample, type ExampleSpread } from './parts';
import { headland } from './pictures';

const PRINT = examplePrint({ n: 1, title: 'The headland', width: 5.5, height: 5.5, draw: headland });
type Cells = readonly [x: number, y: number, w: number, h: number];

/** A print split over four mats at these steps. */
function split(panes: readonly Cells[]): ExampleSpread {
  const { group, content } = splitOver(PRINT, panes.length, 0.375, 0.375);
  return smallPage(panes.map(([x, y, w, h]) => ['left', x, y, w, h, content] as const), [PRINT], { panes: [group] });
}

export const panesInseparable: CheckExample = {
  wrong: split([[0, 2, 6, 4], [6, 2, 4, 6], [4, 8, 6, 4], [0, 6, 4, 6]]),
  right: split([[0, 2, 6, 4], [6, 2, 4, 4], [0, 6, 4, 6], [4, 6, 6, 6]]),
};
