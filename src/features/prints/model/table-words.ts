import { smallestCuts } from '#shared/geometry/smallest-cut';
import type { Length } from '#shared/model/length';
import type { PageFormat } from '#shared/model/page-format';
import type { Print } from '#shared/model/print';
import type { TrimSettings } from '#shared/model/spread';
import { formatLength, formatSize, type Unit } from '#shared/words/measure';

/** What the smallest cut of a print depends on. */
export interface Sizing {
  readonly format: PageFormat;
  readonly reveal: Length;
  readonly trim: TrimSettings;
  readonly unit: Unit;
}

export interface PrintTag {
  readonly words: string;
  readonly tone: 'plain' | 'stop' | 'quiet';
}

/** The tag under a print on the table: its smallest cut, or what must not happen to it. */
export function tagOf(print: Print, { format, reveal, trim, unit }: Sizing): PrintTag {
  if (print.marks.instantFilm) return { words: 'Do not cut', tone: 'stop' };
  const cuts = smallestCuts(print, format, reveal, trim);
  return { words: cuts.map(({ width, height }) => `${formatLength(width, unit)} × ${formatLength(height, unit)}`).join(' or '), tone: 'plain' };
}

/** A print's name as a screen reader says it. */
export function describePrint(print: Print, unit: Unit): string {
  const { marks } = print;
  return [
    print.title,
    formatSize({ width: print.paperWidth, height: print.paperHeight }, unit),
    marks.digital && 'digital, not printed yet',
    marks.instantFilm && 'instant film, do not cut',
    marks.oneOfAKind && 'one of a kind',
    marks.borrowedUntil !== null && `borrowed until ${marks.borrowedUntil}`,
    print.copies > 1 && `${print.copies} copies`,
  ]
    .filter(Boolean)
    .join(', ');
}

/** The cautions of a print's marks, gravest first: what must not happen, and what to do instead. */
export function cautionsOf({ marks, copies }: Pick<Print, 'marks' | 'copies'>): string[] {
  return [
    marks.instantFilm && 'Never cut instant film: cutting it can let caustic paste out. Copy it and cut the copy.',
    marks.oneOfAKind && 'There is no other: copy it first and cut the copy, or mount it whole.',
    marks.borrowedUntil !== null && 'Borrowed: do not glue it. Mount it whole, with photo corners or in a sleeve.',
    marks.oneOfAKind && copies > 1 && 'It is marked one of a kind, yet has more than one copy: one of the two is not so.',
  ].filter((caution) => caution !== false);
}
