import type { Hex } from '../../model/ids';
import type { Content, Mat } from '../../model/spread';
import { CARD, type CheckExample, type ExampleSpread } from './parts';
import { finished } from './whole-spread';

/** The neutral that takes the place of each colour. */
const NEUTRALS: Readonly<Record<Hex, Hex>> = { [CARD.page]: '#eeece8', [CARD.main]: '#474645', [CARD.second]: '#cbc9c5', [CARD.accent]: '#9b9995' };

const neutral = (hex: Hex): Hex => NEUTRALS[hex] ?? hex;
const inNeutrals = (content: Content): Content =>
  content.kind === 'paper' ? { ...content, color: neutral(content.color), ground: neutral(content.ground) } : content;

function withoutColor({ doc, prints }: ExampleSpread): ExampleSpread {
  const page = { color: neutral(CARD.page) };
  const mats = doc.mats.map((mat): Mat => ({ ...mat, color: neutral(mat.color), content: inNeutrals(mat.content) }));
  return { prints, doc: { ...doc, pages: { left: page, right: page }, mats } };
}

export const allNeutrals: CheckExample = { wrong: withoutColor(finished()), right: finished() };
