import type { CheckId } from '../check-ids';
import type { PrintId, Side } from '../../model/ids';
import { inches } from '../../model/length';
import { DEFAULT_BINDING, PAGE_FORMATS, type Binding, type PageFormat } from '../../model/page-format';
import { inDrawingOrder } from '../../model/patch';
import type { Print, PrintMarks, PxRect } from '../../model/print';
import { SCHEMA_VERSION, type Content, type Mat, type PaneGroup, type Placement, type SpreadDocument } from '../../model/spread';
import { DEFAULT_REVEAL } from '../../model/trim-settings';
import { readDrawn, type DrawnPicture } from './drawn-picture';

export interface ExamplePrint {
  readonly print: Print;
  readonly picture: DrawnPicture;
}

/** A spread with the prints on it, all that is needed to draw it and to run checks on it. */
export interface ExampleSpread {
  readonly doc: SpreadDocument;
  readonly prints: readonly ExamplePrint[];
}

/** The wrong spread raises the check's note, and no note that the right one does not; the right one never raises it. */
export interface CheckExample {
  readonly wrong: ExampleSpread;
  readonly right: ExampleSpread;
}

export type CheckExamples = { readonly [Id in CheckId]: CheckExample };

/** Card of the examples. */
export const CARD = { page: '#efe6d2', main: '#1f4f5f', second: '#b8cfc4', accent: '#d99e32', ink: '#1b1d22' } as const;

const id = (n: number, space: number): string => `0000000${space}-0000-4000-8000-${n.toString(16).padStart(12, '0')}`;
export const examplePrintId = (n: number): PrintId => id(n, 4);
export const exampleMatId = (n: number): string => id(n, 5);

const PX_PER_INCH = 100;
const NO_MARKS: PrintMarks = { noUp: false, oneOfAKind: false, borrowedUntil: null, instantFilm: false, digital: false };

interface PrintParts {
  readonly n: number;
  readonly title: string;
  /** Inches. */
  readonly width: number;
  readonly height: number;
  readonly draw: (width: number, height: number) => DrawnPicture;
  /** Inches on the paper. */
  readonly keep?: readonly [x: number, y: number, width: number, height: number];
  readonly marks?: Partial<PrintMarks>;
  readonly pxPerInch?: number;
}

/** A print whose paper shows all of its picture. */
export function examplePrint({ n, title, width, height, draw, keep, marks, pxPerInch = PX_PER_INCH }: PrintParts): ExamplePrint {
  const imageWidth = Math.round(width * pxPerInch);
  const imageHeight = Math.round(height * pxPerInch);
  const picture = draw(imageWidth, imageHeight);
  const keepZone = keep ? pixels(keep, pxPerInch) : null;
  return {
    picture,
    print: {
      id: examplePrintId(n),
      studioId: id(0, 6),
      pileId: null,
      position: n,
      title,
      paperWidth: inches(width),
      paperHeight: inches(height),
      turns: 0,
      copies: 1,
      marks: { ...NO_MARKS, ...marks },
      imageWidth,
      imageHeight,
      paperRect: { x: 0, y: 0, width: imageWidth, height: imageHeight },
      keepZone,
      details: [],
      faces: [],
      horizon: null,
      ...readDrawn(picture),
      revision: 1,
    },
  };
}

const pixels = ([x, y, width, height]: readonly [number, number, number, number], perInch: number): PxRect => ({
  x: Math.round(x * perInch),
  y: Math.round(y * perInch),
  width: Math.round(width * perInch),
  height: Math.round(height * perInch),
});

/** A print in its window; x and y in inches on the paper. */
export const inWindow = ({ print }: ExamplePrint, x = 0, y = 0, parts: Partial<Placement> = {}): Content => ({
  kind: 'print',
  printId: print.id,
  mode: 'window',
  x: inches(x),
  y: inches(y),
  turn: 0,
  scaledWidth: null,
  detailId: null,
  ...parts,
});
export const mountedWhole = (print: ExamplePrint): Content => inWindow(print, 0, 0, { mode: 'whole' });

/** Place in steps, what the mat carries, then what differs from a mat of the main card. */
export type MatPlan = readonly [page: Side, x: number, y: number, w: number, h: number, content: Content, parts?: Partial<Mat>];

interface SpreadParts {
  readonly mats: readonly MatPlan[];
  readonly prints: readonly ExamplePrint[];
  readonly format?: string;
  readonly pages?: readonly Side[];
  readonly binding?: Partial<Binding>;
  readonly panes?: readonly PaneGroup[];
}

/** A spread from a plan; mats are numbered from 1 in its order. */
export function exampleSpread({ mats, prints, format = '12x12in', pages = ['left', 'right'], binding = {}, panes = [] }: SpreadParts): ExampleSpread {
  const page = { color: CARD.page };
  return {
    prints,
    doc: {
      schemaVersion: SCHEMA_VERSION,
      format: formatOf(format),
      binding: { ...DEFAULT_BINDING, ...binding },
      pages: { left: pages.includes('left') ? page : null, right: pages.includes('right') ? page : null },
      reveal: DEFAULT_REVEAL,
      mats: mats.map(matOf).sort(inDrawingOrder),
      panes,
      table: prints.map(({ print }) => print.id),
      scheme: null,
    },
  };
}

function formatOf(name: string): PageFormat {
  const format = PAGE_FORMATS.find((candidate) => candidate.id === name);
  if (!format) throw new RangeError(`no such page format: ${name}`);
  return format;
}

const matOf = ([page, x, y, w, h, content, parts]: MatPlan, i: number): Mat => ({
  id: exampleMatId(i + 1),
  page,
  x,
  y,
  w,
  h,
  z: 0,
  color: CARD.main,
  reveal: null,
  inner: null,
  trueSize: null,
  laidOver: false,
  focal: false,
  content,
  ...parts,
});

/** One small page, on which a single thing can be seen large. */
export const smallPage = (mats: readonly MatPlan[], prints: readonly ExamplePrint[], parts: Partial<SpreadParts> = {}): ExampleSpread =>
  exampleSpread({ mats, prints, format: '6x8in', pages: ['left'], ...parts });

/** A print split over the first mats of a plan, its window at (x, y) inches of the paper. */
export function splitOver({ print }: ExamplePrint, count: number, x: number, y: number): { readonly group: PaneGroup; readonly content: Content } {
  const groupId = id(1, 7);
  const matIds = Array.from({ length: count }, (_, i) => exampleMatId(i + 1));
  return {
    group: { id: groupId, matIds, content: { printId: print.id, mode: 'window', x: inches(x), y: inches(y), turn: 0, scaledWidth: null, detailId: null, run: 'behind' } },
    content: { kind: 'pane', groupId },
  };
}
