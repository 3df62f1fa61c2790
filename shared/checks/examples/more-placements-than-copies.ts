import { examplePrint, inWindow, smallPage, type CheckExample } from './parts';
import { headland, lighthouse } from './pictures';

const HEADLAND = examplePrint({ n: 1, title: 'The headland', width: 6, height: 4, draw: headland });
const TOWER = examplePrint({ n: 2, title: 'The light', width: 6, height: 4, draw: lighthouse });

export const morePlacementsThanCopies: CheckExample = {
  wrong: smallPage([['left', 0, 1, 8, 4, inWindow(HEADLAND, 1.5, 1)], ['left', 0, 6, 8, 4, inWindow(HEADLAND, 1.5, 1)]], [HEADLAND, TOWER]),
  right: smallPage([['left', 0, 1, 8, 4, inWindow(HEADLAND, 1.5, 1)], ['left', 0, 6, 8, 4, inWindow(TOWER, 1, 1)]], [HEADLAND, TOWER]),
};
