import { inches } from '../../model/length';
import type { Mat } from '../../model/spread';
import { examplePrint, inWindow, smallPage, type CheckExample, type ExampleSpread } from './parts';
import { night } from './pictures';

const HARBOUR = examplePrint({ n: 1, title: 'Harbour lights', width: 5, height: 4, draw: night });
const DARK = '#1d3540';

const onDarkCard = (parts: Partial<Mat>): ExampleSpread => smallPage([['left', 0, 2, 9, 7, inWindow(HARBOUR, 0.375, 0.375), { color: DARK, ...parts }]], [HARBOUR]);

export const photoSinks: CheckExample = { wrong: onDarkCard({}), right: onDarkCard({ inner: { color: '#f7f3ea', reveal: inches(1 / 8) } }) };
