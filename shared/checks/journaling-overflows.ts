import { contentRect } from '../geometry/grid';
import { journalingRoom, type JournalingRoom } from '../lettering/journaling-room';
import { layoutJournaling } from '../scene/journaling';
import { inches } from '../model/length';
import type { Rect, Size } from '../model/rect';
import type { Content, Mat } from '../model/spread';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { growMat } from './resize-mat';

type Journaling = Extract<Content, { kind: 'journaling' }>;

/** Hands do not write smaller than this from line to line. Common practice: narrow-ruled paper has 1/4 in. */
const LEAST_LINE = inches(1 / 4);
const LINE_STEP = inches(1 / 32);
const MOST_ROWS = 12;

/** More words than the mat has ruled lines for, in a hand of the size that was chosen. */
export const journalingOverflows = defineCheck({
  id: 'journaling-overflows',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: { words: { default: 0, min: 0, max: 200, unit: 'count' } },
  find: (view, { words: spare }) =>
    view.doc.mats.flatMap((mat): Finding[] => {
      if (mat.content.kind !== 'journaling' || mat.content.text === '') return [];
      const { content } = mat;
      const { place, room } = roomOf(view, mat, content);
      if (!room || room.words - room.capacity <= spare) return [];
      return [
        {
          messageId: 'journaling-overflows',
          data: { words: room.words, capacity: room.capacity },
          matIds: [mat.id],
          remedies: () => [...smallerHand(mat, content, place), ...moreLines(view, mat, content, place)],
        },
      ];
    }),
});

interface KnownRoom {
  readonly place: Rect;
  /** Null where all is written. */
  readonly room: JournalingRoom | null;
}
// A mat's object stays the same from edit to edit unless the mat itself changed.
const known = new WeakMap<Mat, KnownRoom>();

function roomOf({ doc }: SpreadView, mat: Mat, content: Journaling): KnownRoom {
  const place = contentRect(doc.format, doc.reveal, mat);
  const last = known.get(mat);
  if (last && last.place.width === place.width && last.place.height === place.height) return last;
  const made = { place, room: holds(content, place) ? null : journalingRoom(content, place) };
  known.set(mat, made);
  return made;
}

const holds = (content: Journaling, place: Size): boolean => layoutJournaling(content, { x: 0, y: 0, ...place }).overflow.length === 0;

function smallerHand(mat: Mat, content: Journaling, place: Rect): Remedy[] {
  for (let lineHeight = Math.floor((content.lineHeight - 1) / LINE_STEP) * LINE_STEP; lineHeight >= LEAST_LINE; lineHeight -= LINE_STEP) {
    const smaller = { ...content, lineHeight };
    if (holds(smaller, place)) return [{ messageId: 'smaller-hand', data: { line: lineHeight }, call: { id: 'mats.setContent', args: { matId: mat.id, content: smaller } } }];
  }
  return [];
}

/** The mat grown downward, or upward, by as few steps as hold all words. */
function moreLines(view: SpreadView, mat: Mat, content: Journaling, place: Rect): Remedy[] {
  const { step } = view.doc.format;
  for (let rows = 1; rows <= MOST_ROWS; rows += 1) {
    if (holds(content, { width: place.width, height: place.height + rows * step })) return growMat(view, mat, { width: 0, height: rows * step });
  }
  return [];
}
