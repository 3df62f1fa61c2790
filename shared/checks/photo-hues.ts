import type { Print } from '../model/print';
import type { SpreadView } from './check';
import { NEUTRAL_CHROMA } from './color-memo';
import { piecesOf } from './pieces';

/** A colour of which less is seen is a stray. */
const LEAST_SHARE = 0.01;

const ofPrint = new WeakMap<Print, readonly number[]>();
const ofView = new WeakMap<SpreadView, readonly number[]>();

/** OKLCH hues, in degrees, of all that is coloured in the placed photos' palettes; empty where all are black and white. */
export function photoHues(view: SpreadView): readonly number[] {
  let hues = ofView.get(view);
  if (!hues) ofView.set(view, (hues = [...new Set(piecesOf(view).flatMap(({ print }) => huesOf(print)))]));
  return hues;
}

function huesOf(print: Print): readonly number[] {
  let hues = ofPrint.get(print);
  if (!hues) {
    hues = print.palette.flatMap(({ oklch: [, chroma, hue], share }) => (chroma >= NEUTRAL_CHROMA && share >= LEAST_SHARE ? [hue] : []));
    ofPrint.set(print, hues);
  }
  return hues;
}
