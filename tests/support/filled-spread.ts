import type { Side } from '#shared/model/ids';
import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { Content, Mat, PaneGroup, SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent, printIdOf } from './builders';

/** `[x, y, w, h]` in steps, then what differs from a mat with a picture. */
export type MatSketch = readonly [x: number, y: number, w: number, h: number, parts?: Partial<Mat>];

/** A sheet so large that no mat of a 12 × 12 in page asks too much of it. */
const BIG_SHEET = { paperWidth: inches(12), paperHeight: inches(12), imageWidth: 120, imageHeight: 120 } as const;

interface Filled {
  readonly doc: SpreadDocument;
  readonly prints: readonly Print[];
}

/**
 * A spread whose mats each carry a picture of their own (no keep zone, nothing to note), unless a sketch says
 * otherwise. Mats are numbered from 1 on, left page first: `matIdOf(1)`, …
 */
export function buildFilled(left: readonly MatSketch[], right: readonly MatSketch[], parts: Partial<SpreadDocument> = {}): Filled {
  const prints: Print[] = [];
  const place = (side: Side, start: number) => ([x, y, w, h, mat]: MatSketch, i: number): Mat => {
    const n = start + i;
    const print = buildPrint({ id: printIdOf(n), title: `Print ${n}`, ...BIG_SHEET });
    prints.push(print);
    return buildMat({ id: matIdOf(n), page: side, x, y, w, h, content: printContent(print), ...mat });
  };
  const mats = [...left.map(place('left', 1)), ...right.map(place('right', left.length + 1))];
  return { doc: buildSpread({ mats, ...parts }), prints };
}

export const viewFilled = (left: readonly MatSketch[], right: readonly MatSketch[], parts: Partial<SpreadDocument> = {}) =>
  buildView(buildFilled(left, right, parts));

/** What mats carry where a test needs words or a group. */
export const TITLE: Content = { kind: 'lettering', text: 'Out to the light', color: '#1f4e5f', letterHeight: inches(1) };
export const WORDS: Content = { kind: 'journaling', text: 'Nora counted every step.', color: '#333333', lineHeight: inches(3 / 8) };

/** The mats of a filled spread made panes of one print; their group is returned beside them. */
export function splitOver(filled: Filled, matNumbers: readonly number[], printNumber: number, groupId: string): Filled {
  const ids = matNumbers.map(matIdOf);
  const group: PaneGroup = {
    id: groupId,
    matIds: ids,
    content: { printId: printIdOf(printNumber), mode: 'window', x: 0, y: 0, turn: 0, scaledWidth: null, detailId: null, run: 'behind' },
  };
  const mats = filled.doc.mats.map((mat): Mat => (ids.includes(mat.id) ? { ...mat, content: { kind: 'pane', groupId } } : mat));
  return { ...filled, doc: buildSpread({ ...filled.doc, mats, panes: [...filled.doc.panes, group] }) };
}
