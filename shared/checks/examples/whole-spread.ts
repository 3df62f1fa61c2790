import { inches } from '../../model/length';
import type { Content, Mat } from '../../model/spread';
import { CARD, examplePrint, exampleSpread, inWindow, type ExampleSpread, type MatPlan } from './parts';
import { headland, lighthouse, person } from './pictures';

export const TITLE: Content = { kind: 'lettering', text: 'Out to the light', color: CARD.ink, letterHeight: inches(3 / 4) };
export const WORDS = {
  kind: 'journaling',
  text: 'Saturday. Nora counted every step to the top and lost count twice. Ivo waved at every gate, and every gate waved back.',
  color: CARD.ink,
  lineHeight: inches(3 / 8),
} satisfies Content;

const HEADLAND = examplePrint({ n: 1, title: 'The headland', width: 8, height: 6, draw: headland });
const TOWER = examplePrint({ n: 2, title: 'The light', width: 5, height: 7, draw: lighthouse });
const NORA = examplePrint({ n: 3, title: 'Nora', width: 4, height: 4, draw: (w, h) => person(w, h, 0.5) });
const IVO = examplePrint({ n: 4, title: 'Ivo', width: 4, height: 5, draw: (w, h) => person(w, h, 0.5) });
const COVE = examplePrint({ n: 5, title: 'The cove', width: 7, height: 5, draw: headland });
const STAIR = examplePrint({ n: 6, title: 'The stair', width: 4, height: 6, draw: lighthouse });

export const PRINTS = { headland: HEADLAND, tower: TOWER, nora: NORA, ivo: IVO, cove: COVE, stair: STAIR } as const;
export const ALL_PRINTS = Object.values(PRINTS);

/** The mats of a finished spread with nothing to note, by name, so that an example can change the one that it is about. */
export const FINISHED = {
  headland: ['left', 0, 0, 14, 11, inWindow(HEADLAND), { focal: true }],
  words: ['left', 14, 0, 8, 11, WORDS, { color: CARD.second }],
  nora: ['left', 0, 11, 7, 7, inWindow(NORA)],
  ivo: ['left', 7, 11, 7, 7, inWindow(IVO)],
  paper: ['left', 14, 11, 8, 7, { kind: 'paper', pattern: 'stripe', color: CARD.accent, ground: CARD.page }, { color: CARD.accent }],
  title: ['left', 0, 18, 22, 4, TITLE, { color: CARD.second }],
  tower: ['right', 0, 0, 9, 13, inWindow(TOWER)],
  cove: ['right', 9, 0, 13, 9, inWindow(COVE)],
  stair: ['right', 9, 9, 7, 11, inWindow(STAIR)],
  rightPaper: ['right', 16, 9, 6, 11, { kind: 'paper', pattern: 'stripe', color: CARD.accent, ground: CARD.page }, { color: CARD.accent }],
} as const satisfies Readonly<Record<string, MatPlan>>;

type MatName = keyof typeof FINISHED;

/** The finished spread with some of its mats changed or, where null, taken away. */
export function finished(changes: { readonly [Name in MatName]?: MatPlan | null } = {}): ExampleSpread {
  const mats = (Object.keys(FINISHED) as MatName[]).flatMap((name): MatPlan[] => {
    const change = changes[name];
    return change === null ? [] : [change ?? FINISHED[name]];
  });
  return exampleSpread({ mats, prints: ALL_PRINTS });
}

/** One of the finished spread's mats with something changed about it. */
export const but = (name: MatName, parts: Partial<Mat>): MatPlan => {
  const [page, x, y, w, h, content, own]: MatPlan = FINISHED[name];
  return [page, x, y, w, h, content, { ...own, ...parts }];
};

/** One of them at another place or size, in steps, and perhaps with something changed. */
export const at = (name: MatName, x: number, y: number, w: number, h: number, parts: Partial<Mat> = {}): MatPlan => {
  const [page, , , , , content, own]: MatPlan = FINISHED[name];
  return [page, x, y, w, h, content, { ...own, ...parts }];
};
