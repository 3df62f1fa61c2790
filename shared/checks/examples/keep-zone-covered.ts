import { inches } from '../../model/length';
import { CARD, examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { person } from './pictures';

const IVO = examplePrint({ n: 1, title: 'Ivo', width: 6, height: 7, draw: (w, h) => person(w, h, 0.5), keep: [2.2, 0.9, 1.6, 2.15] });

/** A strip with his name laid over his picture, its upper edge at this row. */
const nameAt = (y: number): ExampleSpread =>
  smallPage(
    [
      ['left', 0, 1, 10, 12, inWindow(IVO, 0.6875, 0.5)],
      ['left', 1, y, 8, 2, { kind: 'lettering', text: 'Ivo waves', color: CARD.ink, letterHeight: inches(3 / 8) }, { color: CARD.second, laidOver: true, z: 1 }],
    ],
    [IVO],
  );

export const keepZoneCovered: CheckExample = { wrong: nameAt(4), right: nameAt(10) };
