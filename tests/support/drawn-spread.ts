import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildSpread, matIdOf, paneGroupIdOf, printContent, printIdOf } from './builders';

/** A drawn snapshot of the demo by its file in server/setup/demo/photos, and its print. */
export interface DemoPicture {
  readonly file: string;
  readonly print: Print;
}

const picture = (n: number, file: string, imageWidth: number, imageHeight: number, widthIn: number, heightIn: number, parts: Partial<Print> = {}): DemoPicture => ({
  file,
  print: buildPrint({ id: printIdOf(n), paperWidth: inches(widthIn), paperHeight: inches(heightIn), imageWidth, imageHeight, ...parts }),
});

/** The ticket's paper shows 40 px of white on every side of its picture. */
export const DEMO_PICTURES: readonly DemoPicture[] = [
  picture(1, 'headland.jpg', 1500, 1000, 6, 4),
  picture(2, 'tower.jpg', 1000, 1400, 5, 7),
  picture(3, 'nora.jpg', 1000, 1000, 4, 4),
  picture(4, 'stair.jpg', 1000, 1500, 4, 6, { marks: { noUp: true, oneOfAKind: false, borrowedUntil: null, instantFilm: false, digital: false } }),
  picture(5, 'ticket.jpg', 1000, 1400, 3.5, 5, { paperRect: { x: -40, y: -40, width: 1080, height: 1480 } }),
];

const HARBOUR = '#1f4f5f';
const SEAGLASS = '#b8cfc4';
const OAT = '#efe6d2';
const LAMP = '#d99e32';
const INK = '#1b1d22';

/**
 * A finished 12 × 12 in spread that holds one of everything a mat can carry: prints in windows, turned
 * and whole, a split print, an inner mat, patterned papers, lettering, journaling, an embellishment and
 * a keepsake.
 */
export function drawnSpread(): SpreadDocument {
  const [headland, tower, nora, stair, ticket] = DEMO_PICTURES.map(({ print }) => print) as [Print, Print, Print, Print, Print];
  const strip = buildPanes(
    headland,
    [0, 3, 6, 9].map((x, i) => buildMat({ id: matIdOf(i + 1), x, y: 0, w: 3, h: 5, color: HARBOUR })),
    { id: paneGroupIdOf(1), x: inches(1 / 4), y: inches(1), run: 'behind' },
  );
  const mats = [
    ...strip.mats,
    buildMat({ id: matIdOf(5), x: 12, y: 0, w: 10, h: 5, color: OAT, content: { kind: 'lettering', text: 'Out to\nthe light', color: HARBOUR, letterHeight: inches(5 / 8) } }),
    buildMat({ id: matIdOf(6), x: 0, y: 5, w: 10, h: 9, color: SEAGLASS, content: printContent(tower, { x: inches(1 / 8), y: inches(1) }) }),
    buildMat({ id: matIdOf(7), x: 10, y: 5, w: 8, h: 9, color: HARBOUR, inner: { color: OAT, reveal: inches(1 / 16) }, content: printContent(nora, { x: inches(1 / 8), y: 0 }) }),
    buildMat({
      id: matIdOf(8),
      x: 18,
      y: 5,
      w: 4,
      h: 9,
      color: OAT,
      content: {
        kind: 'journaling',
        text: 'Saturday. Nora counted every step to the top. Ivo waved at every gate, and every gate waved back.',
        color: INK,
        lineHeight: inches(23 / 64),
      },
    }),
    buildMat({ id: matIdOf(9), x: 0, y: 14, w: 12, h: 8, color: HARBOUR, content: printContent(stair, { x: 0, y: inches(1 / 16), turn: 1 }) }),
    buildMat({ id: matIdOf(10), x: 12, y: 14, w: 6, h: 8, color: LAMP, content: { kind: 'paper', pattern: 'stripe', color: HARBOUR, ground: OAT } }),
    buildMat({ id: matIdOf(11), x: 18, y: 14, w: 4, h: 4, color: SEAGLASS, content: { kind: 'embellishment', name: 'Brass star', color: LAMP } }),
    buildMat({ id: matIdOf(12), x: 18, y: 18, w: 4, h: 4, color: HARBOUR }),
    buildMat({ id: matIdOf(13), page: 'right', x: 0, y: 0, w: 9, h: 12, color: LAMP, content: printContent(ticket, { mode: 'whole' }) }),
    buildMat({ id: matIdOf(14), page: 'right', x: 9, y: 0, w: 7, h: 6, color: HARBOUR, content: { kind: 'paper', pattern: 'dot', color: OAT, ground: SEAGLASS } }),
    buildMat({ id: matIdOf(15), page: 'right', x: 16, y: 0, w: 6, h: 6, color: OAT, content: { kind: 'paper', pattern: 'check', color: LAMP, ground: OAT } }),
    buildMat({
      id: matIdOf(16),
      page: 'right',
      x: 9,
      y: 6,
      w: 13,
      h: 6,
      color: SEAGLASS,
      content: { kind: 'keepsake', name: 'Day return to Skerrow Light', width: inches(3), height: inches(2), thickness: 32, fragile: false, acidic: true },
    }),
    buildMat({ id: matIdOf(17), page: 'right', x: 0, y: 12, w: 12, h: 10, color: HARBOUR, content: printContent(headland, { x: inches(1 / 16), y: -inches(1 / 2) }) }),
    buildMat({ id: matIdOf(18), page: 'right', x: 12, y: 12, w: 10, h: 10, color: SEAGLASS, content: printContent(stair, { x: 0, y: 0, turn: 3 }) }),
  ];
  return buildSpread({ pages: { left: { color: OAT }, right: { color: OAT } }, mats, panes: [strip.group] });
}
