import { inches } from '../../model/length';
import { CARD, examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { headland } from './pictures';

const COVE = examplePrint({ n: 1, title: 'The cove', width: 5, height: 5, draw: headland });
const STORY = 'Saturday. Nora counted every step to the top and lost count twice. Ivo waved at every gate, and every gate waved back. From the gallery we saw four boats and no land at all, and nobody wanted to go down before supper.';

/** A picture so many steps high, and the rest of the page for the story under it. */
const storyUnder = (rows: number): ExampleSpread =>
  smallPage(
    [
      ['left', 0, 0, 10, rows, inWindow(COVE)],
      ['left', 0, rows, 10, 14 - rows, { kind: 'journaling', text: STORY, color: CARD.ink, lineHeight: inches(3 / 8) }, { color: CARD.second }],
    ],
    [COVE],
  );

export const journalingOverflows: CheckExample = { wrong: storyUnder(10), right: storyUnder(8) };
