import { describe, expect, it } from 'vitest';
import type { Note } from '#shared/checks/check';
import { anchorOf, layOutNotes, leaderPath } from '@/features/composer/canvas/note-layout';

const note = (key: string, matId: string): Note => ({
  key,
  checkId: 'bare-mat',
  messageId: 'bare-mat',
  severity: 'fix',
  matIds: [matId],
  page: 'left',
  data: { fitting: 0 },
  remedy: null,
});

const rects: Record<string, { x: number; y: number; width: number; height: number }> = {
  high: { x: 20, y: 10, width: 100, height: 60 },
  low: { x: 20, y: 300, width: 100, height: 60 },
  lower: { x: 140, y: 310, width: 100, height: 60 },
};
const anchor = (id: string) => anchorOf(rects[id]!, Object.entries(rects).flatMap(([key, rect]) => (key === id ? [] : [rect])), 'left');
const lay = (notes: Note[], bottom = 528) => layOutNotes(notes, anchor, () => 80, { top: 0, bottom });

describe('notes in a margin', () => {
  it('stand in the order of the mats they mean, whatever order they come in', () => {
    const { placed } = lay([note('b', 'low'), note('a', 'high')]);
    expect(placed.map(({ note: { key } }) => key)).toEqual(['a', 'b']);
  });

  it('are pushed down 24 px apart instead of overlapping', () => {
    const { placed } = lay([note('b', 'low'), note('c', 'lower')]);
    expect(placed[1]!.top - placed[0]!.top).toBe(80 + 24);
  });

  it('never hang past the foot of the page', () => {
    const { placed } = lay([note('a', 'low'), note('b', 'lower')], 400);
    expect(placed.at(-1)!.top + 80).toBeLessThanOrEqual(400);
    expect(placed[0]!.top + 80 + 24).toBeLessThanOrEqual(placed[1]!.top);
  });

  it('fold the least severe away where there is no room', () => {
    const { placed, folded } = lay([note('a', 'high'), note('b', 'low'), note('c', 'lower')], 200);
    expect(placed.map(({ note: { key } }) => key)).toEqual(['a', 'b']);
    expect(folded.map(({ key }) => key)).toEqual(['c']);
  });
});

describe('a leader', () => {
  it('reaches a mat at the outer side straight from the margin', () => {
    const { ring, lineY } = anchor('low');
    expect(lineY).toBe(ring.y);
  });

  it('runs in the gap above a mat that stands behind another', () => {
    const { ring, lineY } = anchor('lower');
    expect(lineY).toBeLessThan(rects.lower!.y);
    expect(ring.y).toBeGreaterThan(rects.lower!.y);
  });

  it('is one horizontal line where note and mat are level', () => {
    expect(leaderPath({ x: 0, y: 50 }, { x: 90, y: 50 })).toBe('M0 50H90');
  });

  it('has one right angle at most', () => {
    expect(leaderPath({ x: 0, y: 50 }, { x: 90, y: 200 }).match(/[HV]/g)).toEqual(['H', 'V']);
  });
});
