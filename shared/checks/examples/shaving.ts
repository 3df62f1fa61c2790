import { examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { headland } from './pictures';

const COVE = examplePrint({ n: 1, title: 'The cove', width: 5, height: 4, draw: headland });

/** The window so many inches from the paper's left edge. */
const cutAt = (x: number): ExampleSpread => smallPage([['left', 0, 2, 9, 7, inWindow(COVE, x, 0.375)]], [COVE]);

export const shaving: CheckExample = { wrong: cutAt(0.125), right: cutAt(0) };
