import { gridOf } from '#shared/geometry/grid';
import { viewSpread } from '#shared/checks/view-spread';
import type { SpreadView } from '#shared/checks/check';
import type { PrintId } from '#shared/model/ids';
import { inches } from '#shared/model/length';
import { DEFAULT_BINDING, PAGE_FORMATS, type PageFormat } from '#shared/model/page-format';
import { inDrawingOrder } from '#shared/model/patch';
import type { OklabRaster, Print, PrintMarks } from '#shared/model/print';
import { SCHEMA_VERSION, type Content, type Mat, type PaneGroup, type Placement, type SpreadDocument, type TrimSettings } from '#shared/model/spread';
import { DEFAULT_REVEAL, TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';

/** The n-th id: a valid UUID, the same in every run. Kinds are kept apart by `space` (0–255). */
export const idOf = (n: number, space = 0): string =>
  `0000${space.toString(16).padStart(4, '0')}-0000-4000-8000-${n.toString(16).padStart(12, '0')}`;

const PRINT_SPACE = 1;
const MAT_SPACE = 2;
const PANES_SPACE = 3;

export const printIdOf = (n: number): string => idOf(n, PRINT_SPACE);
export const matIdOf = (n: number): string => idOf(n, MAT_SPACE);
export const paneGroupIdOf = (n: number): string => idOf(n, PANES_SPACE);

const FORMAT_12: PageFormat = PAGE_FORMATS[0]!;

/** A shipped page format by its id. @throws RangeError for an unknown one. */
export function formatOf(id: string): PageFormat {
  const format = PAGE_FORMATS.find((candidate) => candidate.id === id);
  if (!format) throw new RangeError(`no such page format: ${id}`);
  return format;
}

export type OklabPixel = readonly [l: number, a: number, b: number];

/** A raster in the stored form of `OklabRaster`, from a colour for every pixel. */
export function buildRaster(width: number, height: number, pixel: OklabPixel | ((x: number, y: number) => OklabPixel)): OklabRaster {
  const bytes = new Int8Array(width * height * 3);
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      const [l, a, b] = typeof pixel === 'function' ? pixel(x, y) : pixel;
      bytes.set([Math.round(l * 254 - 127), Math.round(a * 254), Math.round(b * 254)], (y * width + x) * 3);
    }
  }
  let text = '';
  for (const byte of new Uint8Array(bytes.buffer)) text += String.fromCharCode(byte);
  return { width, height, data: btoa(text) };
}

const NO_MARKS: PrintMarks = { noUp: false, oneOfAKind: false, borrowedUntil: null, instantFilm: false, digital: false };

/** Mid grey in OKLab: far enough from both white and dark mats. */
const GREY: OklabPixel = [0.6, 0, 0];

let serial = 0;
/** A number that no earlier call gave; ids that a test does not name are made from it. */
const nextSerial = (): number => (serial += 1) + 1_000_000;

type PrintParts = Partial<Omit<Print, 'marks'>> & { readonly marks?: Partial<PrintMarks> };

/**
 * A 6 × 4 in print of mid grey without a keep zone. Unless said otherwise the picture has 100 px to the
 * inch and the paper shows all of it, so that `keepZone: { x: 100, … }` lies 1 in from the paper's edge.
 */
export function buildPrint(parts: PrintParts = {}): Print {
  const paperWidth = parts.paperWidth ?? inches(6);
  const paperHeight = parts.paperHeight ?? inches(4);
  const imageWidth = parts.imageWidth ?? Math.round((paperWidth * 100) / inches(1));
  const imageHeight = parts.imageHeight ?? Math.round((paperHeight * 100) / inches(1));
  const scale = 64 / Math.max(imageWidth, imageHeight);
  return {
    id: printIdOf(nextSerial()),
    studioId: idOf(1, 9),
    pileId: null,
    position: 0,
    title: 'Lunch on the grass',
    paperWidth,
    paperHeight,
    turns: 0,
    copies: 1,
    imageWidth,
    imageHeight,
    paperRect: { x: 0, y: 0, width: imageWidth, height: imageHeight },
    keepZone: null,
    details: [],
    faces: [],
    horizon: null,
    palette: [{ hex: '#808080', oklch: [0.6, 0, 0], share: 1, role: 'area' }],
    raster: buildRaster(Math.max(1, Math.round(imageWidth * scale)), Math.max(1, Math.round(imageHeight * scale)), GREY),
    revision: 1,
    ...parts,
    marks: { ...NO_MARKS, ...parts.marks },
  };
}

/** A bare 4 × 4 step mat in the left page's top-left corner. */
export function buildMat(parts: Partial<Mat> = {}): Mat {
  return {
    id: matIdOf(nextSerial()),
    page: 'left',
    x: 0,
    y: 0,
    w: 4,
    h: 4,
    z: 0,
    color: '#1f4e5f',
    reveal: null,
    inner: null,
    trueSize: null,
    laidOver: false,
    focal: false,
    content: { kind: 'bare' },
    ...parts,
  };
}

/** A print's place on a mat: its window at the paper's top-left corner. */
export function buildPlacement(print: Print | PrintId, parts: Partial<Placement> = {}): Placement {
  const printId = typeof print === 'string' ? print : print.id;
  return { printId, mode: 'window', x: 0, y: 0, turn: 0, scaledWidth: null, detailId: null, ...parts };
}

/** What a mat carries when it carries this print. */
export const printContent = (print: Print | PrintId, parts: Partial<Placement> = {}): Content => ({
  kind: 'print',
  ...buildPlacement(print, parts),
});

/** A split print over mats: the group, and its mats with their content set to it. */
export function buildPanes(
  print: Print | PrintId | null,
  mats: readonly Mat[],
  parts: Partial<Placement> & { readonly id?: string; readonly run?: 'behind' | 'apart' } = {},
): { readonly group: PaneGroup; readonly mats: readonly Mat[] } {
  const { id = paneGroupIdOf(nextSerial()), run = 'behind', ...placement } = parts;
  return {
    group: { id, matIds: mats.map((mat) => mat.id), content: print ? { ...buildPlacement(print, placement), mode: 'window', run } : null },
    mats: mats.map((mat) => ({ ...mat, content: { kind: 'pane', groupId: id } })),
  };
}

/** An empty 12 × 12 in spread with two white pages; mats and pane groups are put in document order. */
export function buildSpread(parts: Partial<SpreadDocument> = {}): SpreadDocument {
  return {
    schemaVersion: SCHEMA_VERSION,
    format: FORMAT_12,
    binding: DEFAULT_BINDING,
    pages: { left: { color: '#ffffff' }, right: { color: '#ffffff' } },
    reveal: DEFAULT_REVEAL,
    table: [],
    scheme: null,
    ...parts,
    mats: [...(parts.mats ?? [])].sort(inDrawingOrder),
    panes: [...(parts.panes ?? [])].sort((a, b) => (a.id < b.id ? -1 : 1)),
  };
}

interface ViewParts {
  readonly doc: SpreadDocument;
  readonly prints?: readonly Print[];
  readonly trim?: TrimSettings;
  readonly usedElsewhere?: Readonly<Record<PrintId, number>>;
}

export const printsById = (prints: readonly Print[]): ReadonlyMap<PrintId, Print> => new Map(prints.map((print) => [print.id, print]));

/** The view of a spread that checks read, with an inch trimmer and no other spreads. */
export function buildView({ doc, prints = [], trim = TRIM_SETTINGS_INCH, usedElsewhere = {} }: ViewParts): SpreadView {
  return viewSpread({ doc, prints: printsById(prints), trim, usedElsewhere });
}

/** Grid columns and rows of a spread's pages. */
export const gridSizeOf = (doc: SpreadDocument): { readonly columns: number; readonly rows: number } => gridOf(doc.format);
