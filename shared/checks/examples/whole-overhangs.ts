import { examplePrint, mountedWhole, smallPage, type CheckExample } from './parts';
import { headland } from './pictures';

const COVE = examplePrint({ n: 1, title: 'The cove', width: 4, height: 3, draw: headland });

export const wholeOverhangs: CheckExample = {
  wrong: smallPage([['left', 1, 3, 7, 5, mountedWhole(COVE)]], [COVE]),
  right: smallPage([['left', 0, 2, 9, 7, mountedWhole(COVE)]], [COVE]),
};
