import { gridOf } from '#shared/geometry/grid';
import type { Side } from '#shared/model/ids';
import { inches } from '#shared/model/length';
import type { PageFormat } from '#shared/model/page-format';
import type { Face, Print } from '#shared/model/print';
import type { Content, Mat, PaneGroup, SchemeCharacter, SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildRaster, buildSpread, formatOf, matIdOf, paneGroupIdOf, printContent, printIdOf } from './builders';

export type Random = () => number;

/** Mulberry32: a small generator of numbers 0–1, the same for the same seed on every engine. */
export function randomOf(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t = (t + Math.imul(t ^ (t >>> 7), t | 61)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const pick = <T>(random: Random, from: readonly T[]): T => from[Math.floor(random() * from.length)]!;
const between = (random: Random, least: number, most: number): number => least + Math.floor(random() * (most - least + 1));

const CARD = ['#1f4e5f', '#eadfc8', '#a8c5bd', '#d9a441', '#ffffff', '#2b2b2b', '#7f7f7f'] as const;
const PAPERS = [
  [6, 4],
  [4, 6],
  [4, 4],
  [5, 7],
  [7, 5],
  [3.5, 5],
] as const;

/**
 * Prints of all kinds of sizes, tones, keep zones and marks.
 *
 * @param rasterSize - px on the long side; 64 as at intake, fewer where making it costs too much.
 */
export function randomPrints(random: Random, count: number, rasterSize = 64): Print[] {
  return Array.from({ length: count }, (_, i) => {
    const [width, height] = pick(random, PAPERS);
    const px = { width: width * 100, height: height * 100 };
    const zone = { width: between(random, 40, px.width - 60), height: between(random, 40, px.height - 60) };
    const tone = random();
    const mark = random();
    return buildPrint({
      id: printIdOf(i + 1),
      title: `Print ${i + 1}`,
      paperWidth: inches(width),
      paperHeight: inches(height),
      copies: random() < 0.2 ? 2 : 1,
      keepZone:
        random() < 0.8 ? { x: between(random, 0, px.width - zone.width), y: between(random, 0, px.height - zone.height), ...zone } : null,
      marks: { oneOfAKind: mark < 0.06, instantFilm: mark > 0.96, noUp: mark > 0.4 && mark < 0.55, digital: mark > 0.9 && mark < 0.94 },
      palette: [
        { hex: '#336699', oklch: [tone, random() * 0.2, random() * 360], share: 0.5, role: 'vibrant' },
        { hex: '#808080', oklch: [random(), 0, 0], share: 0.4, role: 'area' },
      ],
      raster: buildRaster(width >= height ? rasterSize : Math.round((rasterSize * width) / height), width >= height ? Math.round((rasterSize * height) / width) : rasterSize, (x, y) => [Math.min(1, Math.max(0, tone + ((x * 7 + y * 13) % 11) / 40 - 0.12)), (x % 5) / 40, (y % 7) / 40]),
    });
  });
}

export interface RandomSpread {
  readonly doc: SpreadDocument;
  readonly prints: readonly Print[];
}

interface RandomParts {
  readonly mats: number;
  readonly prints: number;
  readonly format?: PageFormat;
  readonly rasterSize?: number;
  /** Whether some mats are grouped into split prints. */
  readonly withPanes?: boolean;
}

/** A valid spread whose pages are filled by random splits; as many mats as asked, or as many as the grid holds. */
export function randomSpread(random: Random, { mats: count, prints: printCount, format = formatOf('12x12in'), withPanes = true, rasterSize }: RandomParts): RandomSpread {
  const prints = randomPrints(random, Math.max(1, printCount), rasterSize);
  const cells = (['left', 'right'] as const).flatMap((page, i) => splitPage(random, format, page, Math.floor((count + i) / 2)));
  const mats = cells.map((cell, i) => buildMat({ ...cell, id: matIdOf(i + 1), color: pick(random, CARD), content: randomContent(random, prints[i % prints.length]!) }));
  const grouped = withPanes ? groupSome(random, mats, prints) : { mats, panes: [] };
  const focal = Math.floor(random() * mats.length * 2);
  const laid = grouped.mats.slice(0, random() < 0.3 ? 1 : 0).map((mat) => buildMat({ ...mat, id: matIdOf(900), laidOver: true, z: 5, focal: false, content: { kind: 'lettering', text: 'Out to the light', color: '#1f4e5f', letterHeight: inches(1) } }));
  return {
    doc: buildSpread({
      format,
      pages: { left: { color: pick(random, CARD) }, right: { color: pick(random, CARD) } },
      mats: [...grouped.mats.map((mat, i) => (i === focal ? { ...mat, focal: true } : mat)), ...laid],
      panes: grouped.panes,
      table: prints.map((print) => print.id),
    }),
    prints,
  };
}

type Cell = Pick<Mat, 'page' | 'x' | 'y' | 'w' | 'h'>;

function splitPage(random: Random, format: PageFormat, page: Side, count: number): Cell[] {
  const grid = gridOf(format);
  const done: Cell[] = count > 0 ? [{ page, x: 0, y: 0, w: grid.columns, h: grid.rows }] : [];
  while (done.length < count) {
    done.sort((a, b) => b.w * b.h - a.w * a.h);
    const cell = done.find((candidate) => Math.max(candidate.w, candidate.h) >= 4);
    if (!cell) break;
    done.splice(done.indexOf(cell), 1);
    const isAcross = cell.w > cell.h || (cell.w === cell.h && random() < 0.5);
    const at = between(random, 2, (isAcross ? cell.w : cell.h) - 2);
    if (isAcross) done.push({ ...cell, w: at }, { ...cell, x: cell.x + at, w: cell.w - at });
    else done.push({ ...cell, h: at }, { ...cell, y: cell.y + at, h: cell.h - at });
  }
  return done;
}

function randomContent(random: Random, print: Print): Content {
  const kind = random();
  if (kind < 0.08) return { kind: 'bare' };
  if (kind < 0.12) return { kind: 'journaling', text: 'Nora counted every step.', color: '#333333', lineHeight: inches(3 / 8) };
  if (kind < 0.16) return { kind: 'paper', pattern: 'stripe', color: '#1f4e5f', ground: '#eadfc8' };
  const mark = inches(1 / 16);
  return printContent(print, {
    mode: random() < 0.15 ? 'whole' : 'window',
    x: between(random, -8, 64) * mark,
    y: between(random, -8, 48) * mark,
    turn: print.marks.noUp ? pick(random, [0, 1, 2, 3] as const) : 0,
    scaledWidth: print.marks.digital ? inches(between(random, 2, 8)) : null,
  });
}

/** Turns some runs of two to four mats of one page into split prints. */
function groupSome(random: Random, mats: readonly Mat[], prints: readonly Print[]): { mats: Mat[]; panes: PaneGroup[] } {
  const out: Mat[] = [];
  const panes: PaneGroup[] = [];
  for (let i = 0; i < mats.length; ) {
    const size = random() < 0.12 ? between(random, 2, 4) : 1;
    const run = mats.slice(i, i + size).filter((mat) => mat.page === mats[i]!.page);
    if (run.length > 1) {
      const print = random() < 0.9 ? pick(random, prints) : null;
      const built = buildPanes(print, run, { id: paneGroupIdOf(i + 1), x: between(random, 0, 20) * inches(1 / 16), run: random() < 0.5 ? 'behind' : 'apart' });
      out.push(...built.mats);
      panes.push(built.group);
    } else out.push(...run);
    i += run.length;
  }
  return { mats: out, panes };
}

/** The spread as it looks in a mirror between its pages: pages change sides, mats are mirrored, pictures are not. */
export function mirrorSpread(doc: SpreadDocument): SpreadDocument {
  const { columns } = gridOf(doc.format);
  const other = (side: Side): Side => (side === 'left' ? 'right' : 'left');
  const { left, right } = doc.binding.hiddenEdge;
  return buildSpread({
    ...doc,
    pages: { left: doc.pages.right, right: doc.pages.left },
    binding: { ...doc.binding, hiddenEdge: { left: right, right: left } },
    mats: doc.mats.map((mat) => ({ ...mat, page: other(mat.page), x: columns - mat.x - mat.w })),
  });
}

/** The spread with faces and horizons marked on its prints, a scheme, inner mats, a title and journaling of any length. */
export function withSubjects(random: Random, { doc, prints }: RandomSpread): RandomSpread {
  const facing = (): Face['facing'] => pick(random, ['left', 'right', 'ahead', undefined] as const);
  const marked = prints.map((print): Print => {
    const { imageWidth: width, imageHeight: height } = print;
    const face = (): Face => ({ rect: { x: between(random, 0, width - 30), y: between(random, 0, height - 30), width: between(random, 10, 300), height: between(random, 10, 300) }, facing: facing() });
    const y = (): number => between(random, 0, height);
    return {
      ...print,
      faces: Array.from({ length: between(random, 0, 3) }, face),
      horizon: random() < 0.5 ? { x1: between(random, -20, 40), y1: y(), x2: width - between(random, -20, 40), y2: y() } : null,
    };
  });
  const color = () => ({ hex: pick(random, CARD), printIds: random() < 0.5 ? [prints[0]!.id] : [] });
  const scheme = { character: pick(random, ['echo', 'quiet', 'lift'] as const satisfies SchemeCharacter[]), colors: { base: color(), main: color(), second: color(), accent: color() } };
  const mats = doc.mats.map((mat): Mat => {
    const kind = random();
    if (mat.content.kind === 'pane' || kind > 0.2) return random() < 0.2 ? { ...mat, inner: { color: pick(random, CARD), reveal: inches(1 / 16) } } : mat;
    const text = 'Ada saw the light '.repeat(between(random, 0, 6)).trim();
    const content: Content =
      kind < 0.1 ? { kind: 'lettering', text, color: pick(random, CARD), letterHeight: between(random, 100, 8000) } : { kind: 'journaling', text, color: pick(random, CARD), lineHeight: between(random, 200, 3000) };
    return { ...mat, content };
  });
  return { doc: buildSpread({ ...doc, mats, scheme: random() < 0.5 ? scheme : null }), prints: marked };
}
