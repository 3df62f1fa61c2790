import { examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { person } from './pictures';

const NORA = examplePrint({ n: 1, title: 'Nora', width: 6, height: 4, draw: (w, h) => person(w, h, 0.7), keep: [3.3, 0.6, 1.8, 2.8] });

/** The window so many inches from the paper's left edge. */
const cutAt = (x: number): ExampleSpread => smallPage([['left', 0, 2, 9, 7, inWindow(NORA, x, 0.375)]], [NORA]);

export const keepZoneCut: CheckExample = { wrong: cutAt(0.125), right: cutAt(1.5) };
