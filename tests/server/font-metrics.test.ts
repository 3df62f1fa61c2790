import { describe, expect, it } from 'vitest';
import { STATIC_FONT_FILES } from '#server/images/font-files';
import { glyphPath } from '#server/images/glyph-paths';
import { readFontMetrics } from '#server/setup/make-font-metrics';
import type { FontId } from '#shared/scene/scene';
import { FACES } from '#shared/scene/text';

const IDS = Object.keys(STATIC_FONT_FILES) as FontId[];

describe('the tables of font metrics', () => {
  it.each(IDS)('hold for %s exactly what its files in fonts/ hold', (id) => {
    expect(FACES[id].metrics).toEqual(readFontMetrics(id));
  });

  it.each(IDS)('cover for %s what people write in Latin script', (id) => {
    const wanted = [..."AaZz09 .,;:!?-–—‘’“”()&%€£ÀÉÎÕÜßæøåçñŁłŐőŠšŽžĞğİı"];
    expect(wanted.filter((character) => FACES[id].advance(character) === undefined)).toEqual([]);
  });

  it('know no Cyrillic or Hebrew, which the fonts have not', () => {
    expect(FACES['young-serif'].advance('Ж')).toBeUndefined();
    expect(FACES.atkinson.advance('א')).toBeUndefined();
  });
});

describe('glyphPath', () => {
  it('gives outlines from the file that holds the character', () => {
    expect(glyphPath('young-serif', 'O')).toMatch(/^M.*Z$/);
    expect(glyphPath('young-serif', 'ő')).toMatch(/^M.*Z$/);
  });

  it('gives nothing for a space or a character without a glyph', () => {
    expect([glyphPath('atkinson', ' '), glyphPath('atkinson', 'Ж')]).toEqual(['', '']);
  });
});
