import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ATKINSON } from '#shared/scene/metrics/atkinson';
import { openFace } from '#shared/scene/metrics/font-metrics';
import { FACES, missingBoxWidth, setLine, settable, sizeForCapHeight, widthOf, wrapText } from '#shared/scene/text';

const SIZE = 1000;

describe('setLine', () => {
  it('adds up advances and kerning', () => {
    const { advance, kern } = FACES['young-serif'];
    const line = setLine('young-serif', SIZE, 'To');
    expect(kern('T', 'o')).toBeLessThan(0);
    expect(line.xs).toEqual([0, advance('T')! + kern('T', 'o')]);
    expect(line.width).toBe(advance('T')! + kern('T', 'o') + advance('o')!);
  });

  it('puts a box where the font has no glyph, and sets what follows after it', () => {
    const line = setLine('atkinson', SIZE, 'aЖb');
    const a = FACES.atkinson.advance('a')!;
    expect(line.text).toBe('ab');
    expect(line.missing).toEqual([a]);
    expect(line.xs).toEqual([0, a + missingBoxWidth(SIZE)]);
  });

  it('never leaves two spaces together, nor one at the end', () => {
    const line = setLine('atkinson', SIZE, 'a Ж b Ж');
    expect(line.text).toBe('a b');
    expect(line.xs).toHaveLength(3);
  });

  it('keeps one place for every code point, whatever the text', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 60 }), (text) => {
        for (const raw of wrapText('atkinson-italic', SIZE, text, 9000, true)) {
          const line = setLine('atkinson-italic', SIZE, raw);
          expect(line.xs).toHaveLength([...line.text].length);
          expect(line.text).not.toMatch(/^ | {2}| $/);
        }
      }),
    );
  });
});

describe('settable', () => {
  it('composes accents and drops marks of direction and joiners', () => {
    expect(settable('e\u0301\u200f\u200d\ufe0f!')).toBe('é!');
  });

  it('keeps line ends of every kind and turns tabs into spaces', () => {
    expect(settable('a\r\nb\rc\u2028d\te')).toBe('a\nb\nc\nd e');
  });
});

describe('wrapText', () => {
  const width = (text: string): number => widthOf('atkinson', SIZE, text);

  it('fills each line with as many words as fit', () => {
    expect(wrapText('atkinson', SIZE, 'one two three', width('one two'), false)).toEqual(['one two', 'three']);
    expect(wrapText('atkinson', SIZE, 'one two three', width('one two') - 1, false)).toEqual(['one', 'two', 'three']);
  });

  it('keeps line ends and empty lines', () => {
    expect(wrapText('atkinson', SIZE, 'one\n\ntwo', 99_999, false)).toEqual(['one', '', 'two']);
  });

  it('lets a word stand over, or breaks it where asked', () => {
    const narrow = width('abc');
    expect(wrapText('atkinson', SIZE, 'x abcdef', narrow, false)).toEqual(['x', 'abcdef']);
    expect(wrapText('atkinson', SIZE, 'x abcdef', narrow, true)).toEqual(['x', 'abc', 'def']);
  });

  it('loses no letter and makes no line wider than asked', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom('a', 'W', 'é', ' ', '.'), maxLength: 80 }), fc.integer({ min: 1500, max: 12_000 }), (text, wide) => {
        const lines = wrapText('atkinson', SIZE, text, wide, true);
        expect(lines.join('').replaceAll(' ', '')).toBe(text.replaceAll(' ', ''));
        for (const line of lines) expect(width(line)).toBeLessThanOrEqual(wide);
      }),
    );
  });
});

describe('sizes', () => {
  it('gives capitals their height', () => {
    // Young Serif's capitals are 750 of 1000 units tall (its OS/2 table).
    expect(sizeForCapHeight('young-serif', 3000)).toBe(4000);
  });

  it('opens a table of any font', () => {
    const face = openFace({ ...ATKINSON, advances: { 97: [500, 600] }, kerning: { a: { '-30': 'b' } } });
    expect([face.advance('b'), face.advance('c'), face.kern('a', 'b'), face.kern('b', 'a')]).toEqual([600, undefined, -30, 0]);
  });
});
