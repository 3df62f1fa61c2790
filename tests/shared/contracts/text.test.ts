import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lineSchema, textSchema } from '#shared/contracts/common';

const line = lineSchema(10_000);
const text = textSchema(10_000);

describe('text that people type', () => {
  it.each([
    ['control characters', 'a\u0000b\u001fc\u009bd', 'abcd'],
    ['marks that turn the reading direction', 'photo\u202egpj.exe\u2069', 'photogpj.exe'],
    ['halves of characters', 'a\ud83d b\ude00', 'a b'],
    ['blanks at its ends', '  the pier\t', 'the pier'],
  ])('loses %s', (_name, typed, kept) => {
    expect(line.parse(typed)).toBe(kept);
  });

  it('keeps whole characters beyond the basic plane, letters of every script and joined signs', () => {
    const typed = '東京 🌊 👩‍👧 שלום';
    expect(line.parse(typed)).toBe(typed);
  });

  it('is in composed form, also where a mark stood between a letter and its accent', () => {
    expect([line.parse('Cafe\u0301'), line.parse('Cafe\u200e\u0301'), text.parse('Cafe\ud800\u0301')]).toEqual(['Café', 'Café', 'Café']);
  });

  it('is refused as a line where nothing is left of it', () => {
    expect(line.safeParse('\ud83d\u202e \n').success).toBe(false);
  });

  it('keeps its lines where it may have several', () => {
    expect(text.parse('one\ntwo\r\n')).toBe('one\ntwo\n');
  });

  const units = fc.array(fc.constantFrom('a', ' ', '\n', '\u0301', '\u200e', '\u202e', '\ud83d', '\ude00', '\u0000', 'é', '\u212b'), { maxLength: 12 });
  it('does not change any more when it is read again', () => {
    fc.assert(
      fc.property(units, (parts) => {
        const typed = `x${parts.join('')}`;
        for (const schema of [line, text]) {
          const once = schema.parse(typed);
          expect(schema.parse(once)).toBe(once);
          expect(once).not.toMatch(/\p{Cs}/u);
        }
      }),
    );
  });
});
