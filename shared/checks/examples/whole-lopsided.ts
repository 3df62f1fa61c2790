import { examplePrint, mountedWhole, smallPage, type CheckExample } from './parts';
import { person } from './pictures';

const NORA = examplePrint({ n: 1, title: 'Nora', width: 2.5, height: 3, draw: (w, h) => person(w, h, 0.5) });

export const wholeLopsided: CheckExample = {
  wrong: smallPage([['left', 0, 2, 9, 7, mountedWhole(NORA)]], [NORA]),
  right: smallPage([['left', 1, 2, 6, 7, mountedWhole(NORA)]], [NORA]),
};
