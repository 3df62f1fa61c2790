import type { DrawnPicture } from './drawn-picture';
import { examplePrint, exampleSpread, inWindow, type CheckExample, type ExamplePrint, type ExampleSpread, type MatPlan } from './parts';
import { person } from './pictures';
import { ALL_PRINTS, FINISHED, PRINTS, at } from './whole-spread';

/** Somebody in profile, the nose to the left. */
function profile(width: number, height: number): DrawnPicture {
  const picture = person(width, height, 0.5);
  const nose = [[0.5 * width - 0.08 * height, 0.26 * height], [0.5 * width - 0.14 * height, 0.32 * height], [0.5 * width - 0.08 * height, 0.34 * height]] as const;
  return {
    ...picture,
    shapes: [
      ...picture.shapes,
      { kind: 'polygon', points: nose, fill: '#c98f6a' },
      { kind: 'ellipse', cx: 0.5 * width + 0.05 * height, cy: 0.27 * height, rx: 0.065 * height, ry: 0.12 * height, fill: '#4a3527' },
    ],
  };
}

const PLAIN = examplePrint({ n: 3, title: 'Nora', width: 4, height: 4, draw: profile });
const NORA: ExamplePrint = { ...PLAIN, print: { ...PLAIN.print, faces: [{ rect: { x: 144, y: 68, width: 96, height: 104 }, facing: 'left' }] } };
const PRINTED = ALL_PRINTS.map((print) => (print === PRINTS.nora ? NORA : print));

/** The finished spread's row of three, in which she stands this far along. */
function withNora(x: number, row: Pick<Readonly<Record<keyof typeof FINISHED, MatPlan>>, 'ivo' | 'paper'>): ExampleSpread {
  const mats: readonly MatPlan[] = Object.values({ ...FINISHED, ...row, nora: ['left', x, 11, 7, 7, inWindow(NORA)] satisfies MatPlan });
  return exampleSpread({ mats, prints: PRINTED });
}

export const looksOffPage: CheckExample = {
  wrong: withNora(0, { ivo: FINISHED.ivo, paper: FINISHED.paper }),
  right: withNora(15, { ivo: at('ivo', 8, 11, 7, 7), paper: at('paper', 0, 11, 8, 7) }),
};
