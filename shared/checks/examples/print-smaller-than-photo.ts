import { examplePrint, inWindow, mountedWhole, smallPage, type CheckExample } from './parts';
import { lighthouse } from './pictures';

const TOWER = examplePrint({ n: 1, title: 'The light', width: 3.5, height: 2.5, draw: lighthouse });

export const printSmallerThanPhoto: CheckExample = {
  wrong: smallPage([['left', 0, 2, 9, 7, inWindow(TOWER)]], [TOWER]),
  right: smallPage([['left', 0, 2, 9, 7, mountedWhole(TOWER)]], [TOWER]),
};
