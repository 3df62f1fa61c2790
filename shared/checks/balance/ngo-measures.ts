import type { Rect, Size } from '../../model/rect';
import { ngoRegularity, ngoSimplicity } from './ngo-alignment';
import { ngoBalance } from './ngo-balance';
import { ngoEquilibrium } from './ngo-equilibrium';
import { ngoHomogeneity, ngoRhythm, ngoSequence, ngoSymmetry } from './ngo-quadrants';
import { ngoCohesion, ngoDensity, ngoEconomy, ngoProportion, ngoUnity } from './ngo-sizes';

/** The measures in the paper's order; `order` is the last. */
export const NGO_MEASURES = [
  'balance',
  'equilibrium',
  'symmetry',
  'sequence',
  'cohesion',
  'unity',
  'proportion',
  'simplicity',
  'density',
  'regularity',
  'economy',
  'homogeneity',
  'rhythm',
  'order',
] as const;
export type NgoMeasure = (typeof NGO_MEASURES)[number];

/** Each 0 … 1, 1 best by the paper. */
export type NgoMeasures = Readonly<Record<NgoMeasure, number>>;

/**
 * All measures of D. C. L. Ngo, L. S. Teo, J. G. Byrne (2003), "Modelling interface aesthetics", Information Sciences
 * 152:25–46, of objects in a frame. Each function names the variant that it takes where the paper leaves one open.
 * Order (OM) is the mean of the thirteen others: the paper lets each have a weight of its own, we give all the same.
 *
 * @param rects - objects within the frame, from its top-left corner; taken not to overlap.
 */
export function ngoMeasures(frame: Size, rects: readonly Rect[]): NgoMeasures {
  const parts = {
    balance: ngoBalance(frame, rects).balance,
    equilibrium: ngoEquilibrium(frame, rects).equilibrium,
    symmetry: ngoSymmetry(frame, rects),
    sequence: ngoSequence(frame, rects),
    cohesion: ngoCohesion(frame, rects),
    unity: ngoUnity(frame, rects),
    proportion: ngoProportion(rects),
    simplicity: ngoSimplicity(rects),
    density: ngoDensity(frame, rects).density,
    regularity: ngoRegularity(rects),
    economy: ngoEconomy(rects),
    homogeneity: ngoHomogeneity(frame, rects),
    rhythm: ngoRhythm(frame, rects),
  };
  const values = Object.values(parts);
  return { ...parts, order: values.reduce((sum, value) => sum + value, 0) / values.length };
}
