import { examplePrint, inWindow, smallPage, type CheckExample } from './parts';
import { person } from './pictures';

const IVO = examplePrint({ n: 1, title: 'Ivo', width: 4.5, height: 5.5, draw: (w, h) => person(w, h, 0.5) });

export const againstPrint: CheckExample = {
  wrong: smallPage([['left', 0, 3, 9, 7, inWindow(IVO, 0, 0.625)]], [IVO]),
  right: smallPage([['left', 1, 2, 7, 9, inWindow(IVO, 0.625, 0.625)]], [IVO]),
};
