import { contentRect } from '../geometry/grid';
import { fitTitle, type TitleFit } from '../lettering/title-letters';
import { inches } from '../model/length';
import type { Rect } from '../model/rect';
import type { Content, Mat } from '../model/spread';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { growMat } from './resize-mat';

type Lettering = Extract<Content, { kind: 'lettering' }>;

/** Letters come in heights of these steps. Common practice of die sets. */
const HEIGHT_STEP = inches(1 / 8);

/** A title whose letters, at their true widths and height, are more than its mat holds. */
export const titleOverflows = defineCheck({
  id: 'title-overflows',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: { over: { default: 0, min: 0, max: inches(1), unit: 'length' } },
  find: (view, { over }) =>
    view.doc.mats.flatMap((mat): Finding[] => {
      if (mat.content.kind !== 'lettering') return [];
      const { content } = mat;
      const { place, fit } = fitOf(view, mat, content);
      if (fit.fits) return [];
      const wider = fit.width - place.width;
      const higher = fit.height - place.height;
      if (Math.max(wider, higher) <= over) return [];
      const isWide = wider >= higher;
      return [
        {
          messageId: 'title-overflows',
          data: { needs: isWide ? fit.width : fit.height, has: isWide ? place.width : place.height, axis: isWide ? 'wide' : 'high' },
          matIds: [mat.id],
          remedies: () => [...smallerLetters(mat, content, place), ...growMat(view, mat, { width: Math.max(0, wider), height: Math.max(0, higher) })],
        },
      ];
    }),
});

interface KnownFit {
  readonly place: Rect;
  readonly fit: TitleFit;
}
// A mat's object stays the same from edit to edit unless the mat itself changed.
const known = new WeakMap<Mat, KnownFit>();

function fitOf({ doc }: SpreadView, mat: Mat, content: Lettering): KnownFit {
  const place = contentRect(doc.format, doc.reveal, mat);
  const last = known.get(mat);
  if (last && last.place.width === place.width && last.place.height === place.height) return last;
  const made = { place, fit: fitTitle(content, place) };
  known.set(mat, made);
  return made;
}

/** The largest letters of the usual heights that fit, none under half of what was wanted. */
function smallerLetters(mat: Mat, content: Lettering, place: Rect): Remedy[] {
  const first = Math.ceil(content.letterHeight / HEIGHT_STEP) - 1;
  for (let steps = first; steps * HEIGHT_STEP * 2 >= content.letterHeight && steps > 0; steps -= 1) {
    const smaller = { ...content, letterHeight: steps * HEIGHT_STEP };
    if (!fitTitle(smaller, place).fits) continue;
    return [{ messageId: 'smaller-letters', data: { height: smaller.letterHeight }, call: { id: 'mats.setContent', args: { matId: mat.id, content: smaller } } }];
  }
  return [];
}
