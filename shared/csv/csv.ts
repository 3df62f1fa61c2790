/** One record of a CSV text. */
export interface CsvRecord {
  /** The line on which it begins, counted from 1; a quoted cell may run over several. */
  readonly line: number;
  readonly cells: readonly string[];
  /** The record as it stands in the text, without its line end. */
  readonly text: string;
  /** A quoted cell that is never closed, or text after a closing quote: the cells are a guess. */
  readonly isBroken: boolean;
}

const BYTE_ORDER_MARK = '\uFEFF';

/**
 * Splits a CSV text into records: RFC 4180, with any of its line ends. The separator is the one of comma, semicolon
 * and tab that stands most often in the first line outside quotes, since spreadsheets of many countries write semicolons.
 * Records without anything in them are left out.
 */
export function parseCsv(csv: string): readonly CsvRecord[] {
  const text = csv.startsWith(BYTE_ORDER_MARK) ? csv.slice(1) : csv;
  const separator = separatorOf(text);
  const records: CsvRecord[] = [];
  let at = 0;
  let line = 1;
  while (at < text.length) {
    const { cells, end, isBroken } = readRecord(text, at, separator);
    const raw = text.slice(at, end);
    if (cells.some((cell) => cell.trim() !== '')) records.push({ line, cells, text: raw, isBroken });
    line += countLineEnds(raw) + 1;
    at = end + (text.startsWith('\r\n', end) ? 2 : 1);
  }
  return records;
}

function separatorOf(text: string): string {
  const bare = text.replace(/"[^"]*"/g, '');
  const first = bare.slice(0, bare.search(/[\r\n]|$/));
  const count = (separator: string): number => first.split(separator).length;
  return [',', ';', '\t'].reduce((best, candidate) => (count(candidate) > count(best) ? candidate : best));
}

const countLineEnds = (text: string): number => text.match(/\r\n|\r|\n/g)?.length ?? 0;

function readRecord(text: string, start: number, separator: string): { cells: string[]; end: number; isBroken: boolean } {
  const cells: string[] = [];
  let isBroken = false;
  let at = start;
  for (;;) {
    let cell = '';
    if (text[at] === '"') {
      const closing = closingQuote(text, at + 1);
      if (closing < 0) isBroken = true;
      const stop = closing < 0 ? text.length : closing;
      cell = text.slice(at + 1, stop).replaceAll('""', '"');
      at = Math.min(text.length, stop + 1);
    }
    const from = at;
    while (at < text.length && text[at] !== separator && text[at] !== '\n' && text[at] !== '\r') at += 1;
    const rest = text.slice(from, at);
    if (from > start && text[from - 1] === '"' && rest.trim() !== '') isBroken = true;
    cells.push(cell + rest);
    if (text[at] !== separator) return { cells, end: at, isBroken };
    at += 1;
  }
}

/** Where the quote that ends a cell stands; −1 where there is none. A doubled quote is part of the cell. */
function closingQuote(text: string, from: number): number {
  let at = text.indexOf('"', from);
  while (at >= 0 && text[at + 1] === '"') at = text.indexOf('"', at + 2);
  return at;
}

/** A cell that a spreadsheet would run as a formula (OWASP, "CSV Injection"), or one that was written to be none. */
const FORMULA = /^'*[=+\-@\t\r]/;

/** Rows as CSV: CRLF, quotes where they are needed, and no cell that a spreadsheet takes for a formula. */
export function formatCsv(rows: readonly (readonly string[])[]): string {
  return rows.map((cells) => `${cells.map(formatCell).join(',')}\r\n`).join('');
}

function formatCell(cell: string): string {
  const safe = FORMULA.test(cell) ? `'${cell}` : cell;
  return /[",;\t\r\n]|^\s|\s$/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** A cell as it was before `formatCsv` made it harmless. */
export const readCell = (cell: string): string => (/^'/.test(cell) && FORMULA.test(cell) ? cell.slice(1) : cell);
