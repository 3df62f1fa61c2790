import { describe, expect, it } from 'vitest';
import { titleFromFileName } from '#shared/model/title-from-file-name';

describe('titleFromFileName', () => {
  it.each([
    ['beach_day.JPG', 'beach day'],
    ['Grandma’s 80th.jpeg', 'Grandma’s 80th'],
    ['../../etc/passwd.png', 'passwd'],
    ['C:\\Users\\me\\Nora.tif', 'Nora'],
    ['..jpg', ''],
    ['photo\u202Egpj.exe', 'photogpj'],
    ['\u200Fשבת\u200F.jpg', 'שבת'],
    ['a\u0000b\nc.jpg', 'abc'],
    ['Cafe\u0301.jpg', 'Café'],
    ['two   spaces.webp', 'two spaces'],
    ['no extension', 'no extension'],
    ['v1.2 final.jpg', 'v1.2 final'],
    ['.jpg', ''],
    ['', ''],
    ['../', ''],
  ])('reads %j as %j', (name, title) => {
    expect(titleFromFileName(name, 120)).toBe(title);
  });

  it('cuts a name of 500 characters, and never half a character', () => {
    expect(titleFromFileName(`${'x'.repeat(500)}.jpg`, 120)).toBe('x'.repeat(120));
    expect(titleFromFileName(`${'x'.repeat(119)}🌊.jpg`, 120)).toBe('x'.repeat(119));
  });
});
