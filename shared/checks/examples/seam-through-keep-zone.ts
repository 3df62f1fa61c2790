import { examplePrint, smallPage, splitOver, type CheckExample, type ExampleSpread } from './parts';
import { person } from './pictures';

const IVO = examplePrint({ n: 1, title: 'Ivo', width: 6, height: 4, draw: (w, h) => person(w, h, 0.35), keep: [1.7, 0.65, 0.8, 1.1] });

/** A print split over three panes, its window starting so many inches from the paper's left edge. */
function split(x: number): ExampleSpread {
  const { group, content } = splitOver(IVO, 3, x, 0.5);
  return smallPage([['left', 0, 2, 3, 6, content], ['left', 3, 2, 3, 6, content], ['left', 6, 2, 3, 6, content]], [IVO], { panes: [group] });
}

export const seamThroughKeepZone: CheckExample = { wrong: split(0.5), right: split(1.5) };
