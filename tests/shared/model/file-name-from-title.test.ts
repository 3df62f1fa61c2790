import { describe, expect, it } from 'vitest';
import { fileNameFromTitle } from '#shared/model/file-name-from-title';

describe('fileNameFromTitle', () => {
  it.each([
    ['Harbour day', 'Harbour day.png'],
    ['../../etc/passwd', 'etc passwd.png'],
    ['a/b\\c:d*e?f"g<h>i|j', 'a b c d e f g h i j.png'],
    ['line\r\nbreak: x', 'line break x.png'],
    ['Café – Ærø 🌊', 'Café – Ærø 🌊.png'],
    ['photo\u202Egnp', 'photo gnp.png'],
    ['...', 'spread.png'],
    ['', 'spread.png'],
    ['NUL', 'spread.png'],
    ['trailing dots...', 'trailing dots.png'],
  ])('makes %j into %j', (title, name) => {
    expect(fileNameFromTitle(title, 'spread', 'png')).toBe(name);
  });

  it('keeps a name short without cutting a character in half', () => {
    expect(fileNameFromTitle('🌊'.repeat(200), 'spread', 'jpg')).toBe(`${'🌊'.repeat(80)}.jpg`);
  });
});
