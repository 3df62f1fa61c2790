import { parseColor } from '../colour/css-color';
import { stashFactsSchema } from '../contracts/stash';
import { UNITS_PER_INCH, UNITS_PER_MM, type Length } from '../model/length';
import { COLOR_SOURCES, DEFAULT_SHEET_SIDE, SIDE_PATTERNS, UNCERTAINTY, type ColorSource, type SidePattern, type StashFacts, type StashSheet, type StashSide } from '../model/stash';
import { formatLength, parseLength } from '../words/measure';
import { formatCsv, parseCsv, readCell } from './csv';

/** Headings of the file, in the order in which they are written. All but `name` and `colour` may be left out. */
export const STASH_COLUMNS = [
  'id',
  'name',
  'maker',
  'width',
  'height',
  'unit',
  'texture',
  'quantity',
  'low at',
  'price',
  'place',
  'colour',
  'colour from',
  'uncertainty',
  'pattern',
  'palette',
  'back colour',
  'back colour from',
  'back uncertainty',
  'back pattern',
  'back palette',
] as const;
export type StashColumn = (typeof STASH_COLUMNS)[number];

/** The stash as a file. Reading it back gives the same sheets. */
export function writeStashCsv(sheets: readonly StashSheet[]): string {
  return formatCsv([STASH_COLUMNS, ...sheets.map(rowOf)]);
}

/** 1/32 in: sizes that are whole numbers of it are written as fractions, all others in mm with every decimal. */
const FINEST_INCH = UNITS_PER_INCH / 32;

function rowOf(sheet: StashSheet): string[] {
  const [front, back] = sheet.sides;
  const unit = sheet.width % FINEST_INCH === 0 && sheet.height % FINEST_INCH === 0 ? 'in' : 'mm';
  const side = (value: Length): string => (unit === 'in' ? formatLength(value, unit) : String(value / UNITS_PER_MM));
  const cells: Record<StashColumn, string> = {
    id: sheet.id,
    name: sheet.name,
    maker: sheet.maker,
    width: side(sheet.width),
    height: side(sheet.height),
    unit,
    texture: sheet.texture,
    quantity: String(sheet.quantity),
    'low at': sheet.lowAt === null ? '' : String(sheet.lowAt),
    price: sheet.price === null ? '' : (sheet.price / 100).toFixed(2),
    place: sheet.place,
    colour: front.hex,
    'colour from': front.source,
    uncertainty: String(front.uncertainty),
    pattern: front.pattern,
    palette: front.palette.join(' '),
    'back colour': back?.hex ?? '',
    'back colour from': back?.source ?? '',
    'back uncertainty': back ? String(back.uncertainty) : '',
    'back pattern': back?.pattern ?? '',
    'back palette': back?.palette.join(' ') ?? '',
  };
  return STASH_COLUMNS.map((column) => cells[column]);
}

/** A row that can be taken in. `id` names sheets that are in the stash already. */
export interface StashRow {
  readonly line: number;
  readonly id: string | null;
  readonly facts: StashFacts;
  readonly text: string;
}

/** A row that cannot, with its own text, so that nothing is lost. */
export interface StashRowFault {
  readonly line: number;
  /** One sentence: what is wrong and what would fit. */
  readonly message: string;
  readonly text: string;
}

export interface ReadStash {
  readonly rows: readonly StashRow[];
  readonly faults: readonly StashRowFault[];
  /** The heading line, as it stands in the file; empty where it could not be used. */
  readonly heading: string;
  /** The headings that we know. */
  readonly columns: ReadonlySet<string>;
}

/** Most rows of one file. */
export const MAX_STASH_ROWS = 2000;

/** Reads a stash file. Every row comes back: taken, or with what is wrong with it. */
export function readStashCsv(csv: string): ReadStash {
  const [heading, ...records] = parseCsv(csv);
  if (!heading) return { rows: [], faults: [{ line: 1, message: 'The file is empty: it needs a line of headings, then one line per sheet.', text: '' }], heading: '', columns: new Set() };
  const names = heading.cells.map((cell) => cell.trim().toLowerCase());
  const missing = (['name', 'colour'] as const).filter((column) => !names.includes(column) && !(column === 'colour' && names.includes('color')));
  if (missing.length > 0) {
    const message = `The first line has no heading “${missing.join('” and no “')}”: its headings can be ${STASH_COLUMNS.join(', ')}.`;
    return { rows: [], faults: [heading, ...records].map(({ line, text }, i) => ({ line, text, message: i === 0 ? message : 'Not read, since the headings do not fit.' })), heading: '', columns: new Set() };
  }
  const rows: StashRow[] = [];
  const faults: StashRowFault[] = [];
  records.forEach(({ line, cells, text, isBroken }, i) => {
    const row = isBroken ? 'A quote is opened and not closed, or text follows a closed one.' : i >= MAX_STASH_ROWS ? `A file brings in ${MAX_STASH_ROWS} rows at most: put the rest into another one.` : readRow(names, cells);
    if (typeof row === 'string') faults.push({ line, message: row, text });
    else rows.push({ line, text, ...row });
  });
  return { rows, faults, heading: heading.text, columns: new Set(names.map((name) => name.replace('color', 'colour'))) };
}

/** A sheet as a row changes it: only in the columns that the file has, so that a short file loses nothing. */
export function mergeStashRow(there: StashFacts, row: StashFacts, columns: ReadonlySet<string>): StashFacts {
  const pick = <K extends keyof StashFacts>(key: K, column: StashColumn): StashFacts[K] => (columns.has(column) ? row[key] : there[key]);
  const hasSize = columns.has('width') && columns.has('height');
  const [front, back] = row.sides;
  const [frontThere, backThere] = there.sides;
  const isSameFront = front.hex === frontThere.hex;
  const mergedFront: StashSide = {
    hex: front.hex,
    source: columns.has('colour from') || !isSameFront ? front.source : frontThere.source,
    uncertainty: columns.has('uncertainty') || !isSameFront ? front.uncertainty : frontThere.uncertainty,
    pattern: columns.has('pattern') ? front.pattern : frontThere.pattern,
    palette: columns.has('palette') ? front.palette : frontThere.palette,
  };
  const mergedBack = columns.has('back colour') ? back : backThere;
  return {
    name: row.name,
    maker: pick('maker', 'maker'),
    texture: pick('texture', 'texture'),
    place: pick('place', 'place'),
    width: hasSize ? row.width : there.width,
    height: hasSize ? row.height : there.height,
    quantity: pick('quantity', 'quantity'),
    lowAt: pick('lowAt', 'low at'),
    price: pick('price', 'price'),
    sides: mergedBack ? [mergedFront, mergedBack] : [mergedFront],
  };
}

const FIELD_COLUMNS: Readonly<Record<string, string>> = { lowAt: 'low at' };

/** One row, or the sentence that says what is wrong with it. */
function readRow(names: readonly string[], cells: readonly string[]): Omit<StashRow, 'line' | 'text'> | string {
  if (cells.length > names.length && cells.slice(names.length).some((cell) => cell.trim() !== '')) {
    return `There are ${cells.length} cells under ${names.length} headings: put quotes round a cell with a comma in it.`;
  }
  const cell = (column: StashColumn): string => {
    const at = names.indexOf(column);
    const other = at < 0 ? names.indexOf(column.replace('colour', 'color')) : at;
    return readCell((cells[other] ?? '').trim());
  };
  try {
    const unit = oneOf(cell('unit') || 'in', ['in', 'mm', 'cm'], 'unit');
    const id = cell('id').toLowerCase() || null;
    if (id !== null && !/^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/.test(id)) throw new RowFault('id', 'is not one of ours: leave it empty for a new sheet');
    const front = readSide(cell, '');
    if (!front) throw new RowFault('colour', 'is missing: write #1d4f5c, a CSS name, or rgb(29 79 92)');
    const back = readSide(cell, 'back ');
    const facts = {
      name: cell('name'),
      maker: cell('maker'),
      texture: cell('texture'),
      place: cell('place'),
      width: length(cell('width'), unit, 'width'),
      height: length(cell('height'), unit, 'height'),
      quantity: whole(cell('quantity') || '1', 'quantity'),
      lowAt: cell('low at') === '' ? null : whole(cell('low at'), 'low at'),
      price: cell('price') === '' ? null : price(cell('price')),
      sides: back ? [front, back] : [front],
    };
    const parsed = stashFactsSchema.safeParse(facts);
    if (parsed.success) return { id, facts: parsed.data };
    const issue = parsed.error.issues[0]!;
    const field = String(issue.path[0] ?? 'row');
    if (field === 'name' && facts.name === '') throw new RowFault('name', 'is missing');
    throw new RowFault(FIELD_COLUMNS[field] ?? field, `does not fit (${issue.message})`);
  } catch (error) {
    if (error instanceof RowFault) return error.message;
    throw error;
  }
}

class RowFault extends Error {
  constructor(column: string, what: string) {
    super(`“${column}” ${what}.`);
  }
}

function readSide(cell: (column: StashColumn) => string, prefix: '' | 'back '): StashSide | null {
  const column = (name: 'colour' | 'colour from' | 'uncertainty' | 'pattern' | 'palette'): StashColumn => `${prefix}${name}`;
  const text = cell(column('colour'));
  if (text === '') return null;
  const hex = color(text, column('colour'));
  const source: ColorSource = oneOf(cell(column('colour from')) || 'typed', COLOR_SOURCES, column('colour from'));
  const pattern: SidePattern = oneOf(cell(column('pattern')) || 'plain', SIDE_PATTERNS, column('pattern'));
  const written = cell(column('uncertainty'));
  const uncertainty = written === '' ? (source === 'photographed' ? UNCERTAINTY.picked : UNCERTAINTY[source]) : decimal(written);
  if (!(uncertainty > 0 && uncertainty <= 100)) throw new RowFault(column('uncertainty'), 'is a number above 0, up to 100');
  const palette = cell(column('palette')).split(/\s+/).filter(Boolean).map((part) => color(part, column('palette')));
  return { hex, source, uncertainty, pattern, palette };
}

function color(text: string, column: string): string {
  const hex = parseColor(text);
  if (hex === null) throw new RowFault(column, `holds “${short(text)}”, which is no colour: write #1d4f5c, a CSS name, or rgb(29 79 92)`);
  return hex;
}

const short = (text: string): string => (text.length > 24 ? `${text.slice(0, 24)}…` : text);

function oneOf<T extends string>(text: string, allowed: readonly T[], column: string): T {
  const found = allowed.find((word) => word === text.toLowerCase());
  if (found === undefined) throw new RowFault(column, `holds “${short(text)}”: it can be ${allowed.join(', ')}`);
  return found;
}

function whole(text: string, column: string): number {
  if (!/^\d{1,9}$/.test(text)) throw new RowFault(column, `holds “${short(text)}”: it is a whole number, 0 or more`);
  return Number(text);
}

/** A number with a point or a comma before its decimals; NaN for anything else. */
const decimal = (text: string): number => (/^\d+([.,]\d+)?$/.test(text) ? Number(text.replace(',', '.')) : Number.NaN);

function price(text: string): number {
  const value = decimal(text);
  if (Number.isNaN(value)) throw new RowFault('price', `holds “${short(text)}”: write it as 1.25, without a sign of currency`);
  return Math.round(value * 100);
}

function length(text: string, unit: 'in' | 'mm' | 'cm', column: string): Length {
  if (text === '') return DEFAULT_SHEET_SIDE;
  const read = parseLength(text, unit);
  if (read === null) throw new RowFault(column, `holds “${short(text)}”: write 12, 8.5 or 8 1/2`);
  return read;
}
