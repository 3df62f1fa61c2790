import { inches } from '../../model/length';
import { examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { headland } from './pictures';

const COVE = examplePrint({ n: 1, title: 'The cove', width: 5, height: 4, draw: headland });

/** The binding hides three quarters of an inch at the right, along the gutter; the mat starts at this step. */
const boundAt = (x: number): ExampleSpread =>
  smallPage([['left', x, 3, 8, 7, inWindow(COVE, 0.5, 0.5)]], [COVE], { binding: { hiddenEdge: { left: inches(3 / 4), right: inches(3 / 4) } } });

export const underBinding: CheckExample = { wrong: boundAt(2), right: boundAt(0) };
