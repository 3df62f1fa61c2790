import type { Side } from '../../model/ids';
import { examplePrint, exampleSpread, inWindow, type CheckExample, type ExampleSpread, type MatPlan } from './parts';
import { headland, lighthouse, person } from './pictures';
import { ALL_PRINTS, FINISHED, at } from './whole-spread';

const small = [headland, lighthouse, (w: number, h: number) => person(w, h, 0.5)];
const STRIP = Array.from({ length: 6 }, (_, i) => examplePrint({ n: 11 + i, title: `Strip ${i + 1}`, width: 3, height: 4, draw: small[i % 3]! }));

/** Three mats of one size in a row. */
const strip = (page: Side, first: number, y: number): readonly MatPlan[] => [0, 1, 2].map((i) => [page, 5 * i, y, 5, 7, inWindow(STRIP[first + i]!)]);

/** A strip across both pages, the right one starting at this row; what stands beside it moves out of its way. */
function strips(y: number): ExampleSpread {
  const beside = y === 11 ? 0 : 7;
  return exampleSpread({
    mats: [
      FINISHED.headland,
      FINISHED.words,
      ...strip('left', 0, 11),
      at('paper', 15, 11, 7, 7),
      FINISHED.title,
      ...strip('right', 3, y),
      at('cove', 0, beside, 13, 9),
      at('tower', 13, beside, 9, 11),
      at('rightPaper', 15, y, 7, 7),
    ],
    prints: [...ALL_PRINTS, ...STRIP],
  });
}

export const motifCopied: CheckExample = { wrong: strips(11), right: strips(0) };
