import { inches } from '../../model/length';
import { CARD, examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { lighthouse } from './pictures';

const TOWER = examplePrint({ n: 1, title: 'The light', width: 5, height: 6, draw: lighthouse });

/** A title under a picture, its capitals so many inches high. */
const titled = (letterHeight: number): ExampleSpread =>
  smallPage(
    [
      ['left', 0, 0, 10, 11, inWindow(TOWER, 0, 0.25)],
      ['left', 0, 11, 10, 3, { kind: 'lettering', text: 'Out to the light', color: CARD.ink, letterHeight: inches(letterHeight) }, { color: CARD.second }],
    ],
    [TOWER],
  );

export const titleOverflows: CheckExample = { wrong: titled(0.75), right: titled(0.375) };
