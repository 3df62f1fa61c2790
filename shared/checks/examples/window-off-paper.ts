import { examplePrint, smallPage, splitOver, type CheckExample, type ExampleSpread } from './parts';
import { headland } from './pictures';

const PRINT = examplePrint({ n: 1, title: 'The headland', width: 6, height: 4, draw: headland });

/** A print split over three panes, its window starting so many inches from the paper's left edge. */
function split(x: number): ExampleSpread {
  const { group, content } = splitOver(PRINT, 3, x, 0.5);
  return smallPage([['left', 0, 2, 3, 6, content], ['left', 3, 2, 3, 6, content], ['left', 6, 2, 3, 6, content]], [PRINT], { panes: [group] });
}

export const windowOffPaper: CheckExample = { wrong: split(2.75), right: split(0.75) };
