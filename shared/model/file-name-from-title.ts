/** Not allowed in a file name on one system or another, or invisible there. */
const UNFIT = /[\p{Cc}\u200b\u200e\u200f\u2028-\u202e\u2060-\u2069\ufeff"*/:<>?\\|]+/gu;
/** Device names that Windows keeps for itself, whatever follows the first dot. */
const RESERVED = /^(con|prn|aux|nul|com\d|lpt\d)$/i;
const MAX_BASE = 80;

/**
 * A file name that every common system takes, from what a person called the thing.
 *
 * @param otherwise - the name where the title leaves nothing.
 * @param extension - without its dot.
 */
export function fileNameFromTitle(title: string, otherwise: string, extension: string): string {
  const words = title.normalize('NFC').replace(UNFIT, ' ').replace(/\s+/gu, ' ');
  const base = Array.from(words).slice(0, MAX_BASE).join('').replace(/^[.\s]+|[.\s]+$/gu, '');
  const isFit = base !== '' && !RESERVED.test(base);
  return `${isFit ? base : otherwise}.${extension}`;
}
