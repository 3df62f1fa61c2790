import { inches } from '../../model/length';
import { examplePrint, inWindow, smallPage, type CheckExample } from './parts';
import { lighthouse } from './pictures';

const DIGITAL = examplePrint({ n: 1, title: 'The light', width: 6, height: 4, draw: lighthouse, marks: { digital: true }, pxPerInch: 150 });
const scaled = (widthIn: number) => inWindow(DIGITAL, 0.0625, 0.0625, { scaledWidth: inches(widthIn) });

export const lowResolution: CheckExample = {
  wrong: smallPage([['left', 0, 2, 9, 7, scaled(5)]], [DIGITAL]),
  right: smallPage([['left', 0, 2, 6, 4, scaled(3)]], [DIGITAL]),
};
