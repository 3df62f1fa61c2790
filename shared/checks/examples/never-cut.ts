import { examplePrint, inWindow, mountedWhole, smallPage, type CheckExample } from './parts';
import { person } from './pictures';

const INSTANT = examplePrint({ n: 1, title: 'Nora, instant', width: 2.125, height: 3.375, draw: (w, h) => person(w, h, 0.5), marks: { instantFilm: true } });

export const neverCut: CheckExample = {
  wrong: smallPage([['left', 1, 2, 4, 6, inWindow(INSTANT, 0.25, 0.25)]], [INSTANT]),
  right: smallPage([['left', 1, 2, 6, 8, mountedWhole(INSTANT)]], [INSTANT]),
};
