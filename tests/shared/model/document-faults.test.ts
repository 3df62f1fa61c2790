import { describe, expect, it } from 'vitest';
import { findDocumentFaults } from '#shared/model/document-faults';
import { inches } from '#shared/model/length';
import { newDocument } from '#shared/model/new-document';
import { DEFAULT_BINDING } from '#shared/model/page-format';
import type { SpreadDocument } from '#shared/model/spread';
import { utf8Length } from '#shared/model/utf8-length';
import { faultSentence } from '#shared/words/en/document';
import { documentSchema } from '#shared/contracts/document';
import { buildMat, buildPanes, buildPrint, buildSpread, formatOf, matIdOf, printContent } from '../../support/builders';

const print = buildPrint();
const A = matIdOf(1);
const B = matIdOf(2);
const codesOf = (doc: SpreadDocument): string[] => findDocumentFaults(doc, { print: (id) => id === print.id }).map(({ code }) => code);

/** Two panes of one print, side by side. */
const twoPanes = () => buildPanes(print, [buildMat({ id: A }), buildMat({ id: B, x: 4 })], { id: matIdOf(50) });

describe('a new spread', () => {
  it.each([
    ['12x12in', 'both', 508],
    ['a4', 'left', 480],
    ['8x8in', 'right', 508],
  ] as const)('of %s with %s pages is sound, with a reveal of %d/160 mm', (formatId, pages, reveal) => {
    const doc = newDocument(formatOf(formatId), DEFAULT_BINDING, pages);
    expect(findDocumentFaults(doc)).toEqual([]);
    expect(documentSchema.parse(doc)).toEqual(doc);
    expect(doc.reveal).toBe(reveal);
    expect([doc.pages.left !== null, doc.pages.right !== null]).toEqual([pages !== 'right', pages !== 'left']);
  });
});

describe('a sound document', () => {
  it.each([
    ['a mat that fills the page', buildSpread({ mats: [buildMat({ w: 22, h: 22 })] })],
    ['mats that touch', buildSpread({ mats: [buildMat(), buildMat({ x: 4 }), buildMat({ y: 4 })] })],
    ['the same cells on both pages', buildSpread({ mats: [buildMat(), buildMat({ page: 'right' })] })],
    ['a title strip laid over a photo', buildSpread({ mats: [buildMat({ content: printContent(print) }), buildMat({ laidOver: true, y: 2 })] })],
    ['a die as large as its place', buildSpread({ mats: [buildMat({ trueSize: { width: inches(2), height: inches(2) } })] })],
    ['two panes', buildSpread({ mats: twoPanes().mats, panes: [twoPanes().group] })],
  ])('may have %s', (_name, doc) => {
    expect(codesOf(doc)).toEqual([]);
  });
});

describe('a faulty document', () => {
  it.each([
    ['a mat left of the page', buildMat({ x: -1 }), 'off-grid'],
    ['a mat over the right rim', buildMat({ x: 19 }), 'off-grid'],
    ['a mat over the lower rim', buildMat({ y: 19 }), 'off-grid'],
    ['half a step', buildMat({ x: 0.5 }), 'off-grid'],
    ['a mat of no width', buildMat({ w: 0 }), 'off-grid'],
    ['a die 1/160 mm too wide', buildMat({ trueSize: { width: inches(2) + 1, height: inches(1) } }), 'true-size-too-large'],
    ['a reveal that leaves no photo', buildMat({ reveal: inches(15 / 16), content: printContent(print) }), 'no-room-for-photo'],
    ['a reveal that leaves no inner mat', buildMat({ reveal: inches(15 / 16), inner: { color: '#ffffff', reveal: 0 } }), 'no-room-for-inner-mat'],
    ['a print that nobody knows', buildMat({ content: printContent(buildPrint()) }), 'unknown-print'],
    ['a pane of no group', buildMat({ content: { kind: 'pane', groupId: matIdOf(9) } }), 'pane-without-group'],
  ])('is one with %s', (_name, mat, code) => {
    const doc = buildSpread({ mats: [mat] });
    expect(findDocumentFaults(doc, { print: (id) => id === print.id })).toMatchObject([{ code, matIds: [mat.id] }]);
  });

  it('leaves a photo of 1/160 mm alone', () => {
    expect(codesOf(buildSpread({ reveal: 3809, mats: [buildMat({ content: printContent(print) })] }))).toEqual([]);
    expect(codesOf(buildSpread({ reveal: 3810, mats: [buildMat({ content: printContent(print) })] }))).toEqual(['no-room-for-photo']);
  });

  it('names both mats of an overlap', () => {
    const doc = buildSpread({ mats: [buildMat({ id: A }), buildMat({ id: B, x: 3, y: 3 })] });
    expect(findDocumentFaults(doc)).toMatchObject([{ code: 'overlap', matIds: [A, B] }]);
  });

  it('has a mat on a page that is not there', () => {
    expect(codesOf(buildSpread({ pages: { left: null, right: { color: '#ffffff' } }, mats: [buildMat()] }))).toEqual(['page-missing']);
  });

  it('has an id twice', () => {
    expect(codesOf(buildSpread({ mats: [buildMat({ id: A }), buildMat({ id: A, page: 'right' })] }))).toContain('duplicate-id');
    expect(codesOf(buildSpread({ table: [print.id, print.id] }))).toEqual(['print-listed-twice']);
  });

  it('has mats out of drawing order', () => {
    const doc = buildSpread({ mats: [buildMat({ z: 0 }), buildMat({ z: 1, x: 8 })] });
    expect(codesOf({ ...doc, mats: [...doc.mats].reverse() })).toEqual(['out-of-order']);
  });

  it('has 161 mats, but not 160', () => {
    const mats = Array.from({ length: 161 }, (_, i) => buildMat({ x: i % 22, y: Math.floor(i / 22), w: 1, h: 1 }));
    expect(codesOf(buildSpread({ mats: mats.slice(1) }))).toEqual([]);
    expect(codesOf(buildSpread({ mats }))).toEqual(['too-many-mats']);
  });

  it('has more than 256 kB', () => {
    const text = '€'.repeat(4000);
    const mats = Array.from({ length: 22 }, (_, i) => buildMat({ x: i, y: 0, w: 1, h: 1, content: { kind: 'journaling', text, color: '#222222', lineHeight: 1000 } }));
    expect(codesOf(buildSpread({ mats: mats.slice(0, 20) }))).toEqual([]);
    expect(codesOf(buildSpread({ mats }))).toEqual(['document-too-large']);
  });

  it('has an unknown print on the table or over panes', () => {
    const stranger = buildPrint();
    expect(codesOf(buildSpread({ table: [print.id, stranger.id] }))).toEqual(['unknown-print']);
    const { mats, group } = buildPanes(stranger, [buildMat(), buildMat({ x: 4 })]);
    expect(codesOf(buildSpread({ mats, panes: [group] }))).toEqual(['unknown-print']);
  });

  it.each([
    ['one pane', (p: ReturnType<typeof twoPanes>) => ({ mats: p.mats.slice(0, 1), panes: [{ ...p.group, matIds: [A] }] }), ['pane-too-few']],
    ['a pane that is gone', (p: ReturnType<typeof twoPanes>) => ({ mats: p.mats.slice(0, 1), panes: [p.group] }), ['pane-member-missing']],
    ['panes on two pages', (p: ReturnType<typeof twoPanes>) => ({ mats: [p.mats[0]!, { ...p.mats[1]!, page: 'right' as const }], panes: [p.group] }), ['pane-two-pages']],
    ['a bare pane', (p: ReturnType<typeof twoPanes>) => ({ mats: [p.mats[0]!, { ...p.mats[1]!, content: { kind: 'bare' as const } }], panes: [p.group] }), ['pane-content-differs']],
    ['a mat in two groups', (p: ReturnType<typeof twoPanes>) => ({ mats: [...p.mats], panes: [p.group, { ...p.group, id: matIdOf(77) }] }), ['pane-in-two-groups', 'pane-in-two-groups']],
  ])('has a group of panes with %s', (_name, spoil, codes) => {
    expect(codesOf(buildSpread(spoil(twoPanes())))).toEqual(codes);
  });

  it('is told in one sentence with what to do', () => {
    const [fault] = findDocumentFaults(buildSpread({ mats: [buildMat({ x: 20 })] }));
    expect(faultSentence(fault!)).toBe("A mat is not on the page's grid of 22 × 22 whole steps: move it onto the page, or make it smaller.");
  });
});

describe('the length of a text in UTF-8', () => {
  it.each(['', 'page', 'Frühling', '€ 5', '𝄞 and 🧵', '\ud83d', '\udd65x'])('is what the encoder makes of %j', (text) => {
    expect(utf8Length(text)).toBe(new TextEncoder().encode(text).length);
  });
});
