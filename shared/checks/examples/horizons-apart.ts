import { examplePrint, inWindow, smallPage, type CheckExample, type ExamplePrint, type ExampleSpread } from './parts';
import { headland, person } from './pictures';

/** The same print with its horizon marked, level at this share of its height. */
function withHorizon({ print, picture }: ExamplePrint, at: number): ExamplePrint {
  const y = Math.round(at * print.imageHeight);
  return { picture, print: { ...print, horizon: { x1: 0, y1: y, x2: print.imageWidth - 1, y2: y } } };
}

const BAY = withHorizon(examplePrint({ n: 1, title: 'The bay', width: 4, height: 5, draw: headland }), 0.55);
const IVO = withHorizon(examplePrint({ n: 2, title: 'Ivo in the bay', width: 4, height: 5, draw: (w, h) => person(w, h, 0.5) }), 0.5);

/** Two photos in a row, the second one's window so many inches from the top of its paper. */
const row = (y: number): ExampleSpread =>
  smallPage([['left', 0, 3, 5, 7, inWindow(BAY, 0.875, 0.75)], ['left', 5, 3, 5, 7, inWindow(IVO, 0.875, y)]], [BAY, IVO]);

export const horizonsApart: CheckExample = { wrong: row(0), right: row(0.5) };
