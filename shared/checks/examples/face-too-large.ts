import { examplePrint, inWindow, smallPage, type CheckExample, type ExamplePrint, type MatPlan } from './parts';
import { person } from './pictures';

/** A print with the head that `person` draws in its middle marked as a face. */
function withFace({ print, picture }: ExamplePrint): ExamplePrint {
  const { imageWidth, imageHeight } = print;
  const width = Math.round(0.21 * imageHeight);
  const rect = { x: Math.round((imageWidth - width) / 2), y: Math.round(0.14 * imageHeight), width, height: Math.round(0.29 * imageHeight) };
  return { picture, print: { ...print, faces: [{ rect }] } };
}

const NORA = withFace(examplePrint({ n: 1, title: 'Nora', width: 4, height: 5, draw: (w, h) => person(w, h, 0.5) }));

/** Her mat, in steps, and how far its window lies from the paper's corner, in inches. */
const nora = (x: number, y: number, w: number, h: number, fromLeft: number, fromTop: number): MatPlan => ['left', x, y, w, h, inWindow(NORA, fromLeft, fromTop)];

export const faceTooLarge: CheckExample = {
  wrong: smallPage([nora(3, 4, 3, 3, 1.4375, 0.875)], [NORA]),
  right: smallPage([nora(2, 3, 6, 8, 0.6875, 0.25)], [NORA]),
};
