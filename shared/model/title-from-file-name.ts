/** Marks that turn the reading direction or have no width: they can disguise a name. */
const INVISIBLE = /[\p{Cc}\u00ad\u200b\u200e\u200f\u2028-\u202e\u2060-\u2069\ufeff]/gu;
const EXTENSION = /\.[\p{L}\p{N}]{1,5}$/u;

/**
 * A title for a print from the name of its file: the last part of a path, without extension, control characters and
 * direction marks, underscores read as spaces, at most `max` code units and never half a character.
 *
 * @returns an empty string where nothing readable is left.
 */
export function titleFromFileName(fileName: string, max: number): string {
  const name = fileName.normalize('NFC').replace(INVISIBLE, '').split(/[\\/]/).at(-1) ?? '';
  const words = name
    .replace(EXTENSION, '')
    .replace(/[\s_]+/gu, ' ')
    .replace(/^[.\s]+|[.\s]+$/gu, '');
  let title = '';
  for (const character of words) {
    if (title.length + character.length > max) break;
    title += character;
  }
  return title.trim();
}
