import { describe, expect, it } from 'vitest';
import { gridOf } from '#shared/geometry/grid';
import { fingerprint } from '#shared/sketches/fingerprint';
import { canonicalForm, parseMats, sketchId, turnsOf } from '#shared/sketches/sketch';
import { formatOf } from '../../support/builders';

describe('parseMats', () => {
  it('reads places, sizes, the focal and panes, in reading order', () => {
    expect(parseMats('4,2,6,6b 0,0,14,10* 4,8,6,6b 15,0,4,4')).toEqual([
      { x: 0, y: 0, w: 14, h: 10, focal: true },
      { x: 15, y: 0, w: 4, h: 4 },
      { x: 4, y: 2, w: 6, h: 6, paneGroup: 1 },
      { x: 4, y: 8, w: 6, h: 6, paneGroup: 1 },
    ]);
  });

  it.each(['1,2,3', '1,2,3,4!', 'a,b,c,d', '-1,0,2,2', ''])('refuses %j', (notation) => {
    expect(() => parseMats(notation)).toThrow('not a mat of a sketch');
  });
});

describe('a sketch’s id', () => {
  const square = formatOf('12x12in');
  const upright = formatOf('a4');
  const mats = parseMats('0,0,14,10* 14,0,8,10 0,10,6,6a 6,10,6,6a');

  it('is the same for all eight turns and mirror images on a square page', () => {
    const turns = turnsOf(mats, gridOf(square));
    expect(new Set(turns.map((turn) => JSON.stringify(turn))).size).toBe(8);
    expect(new Set(turns.map((turn) => sketchId(turn, square))).size).toBe(1);
  });

  it('is the same for the four of an upright page', () => {
    const turns = turnsOf(mats, gridOf(upright));
    expect(new Set(turns.map((turn) => JSON.stringify(turn))).size).toBe(4);
    expect(new Set(turns.map((turn) => sketchId(turn, upright))).size).toBe(1);
  });

  it('does not depend on the focal mark, but on panes and on every step', () => {
    const grid = gridOf(square);
    const form = canonicalForm(mats, grid);
    expect(canonicalForm(parseMats('0,0,14,10 14,0,8,10* 0,10,6,6c 6,10,6,6c'), grid)).toBe(form);
    expect(canonicalForm(parseMats('0,0,14,10* 14,0,8,10 0,10,6,6 6,10,6,6'), grid)).not.toBe(form);
    expect(canonicalForm(parseMats('0,0,14,10* 14,0,8,11 0,10,6,6a 6,10,6,6a'), grid)).not.toBe(form);
  });
});

describe('fingerprint', () => {
  // Published test vectors of FNV-1a, 64 bits (Fowler, Noll, Vo); from memory.
  it.each([
    ['', 'cbf29ce484222325'],
    ['a', 'af63dc4c8601ec8c'],
    ['foobar', '85944171f73967e8'],
  ])('of %j is %s', (text, hash) => expect(fingerprint(text)).toBe(hash));
});
