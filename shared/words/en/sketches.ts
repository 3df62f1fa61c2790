import type { NineThird, SketchFeatures } from '../../sketches/features';

/** Where the biggest mat lies, as it follows "big one". */
const PLACE_WORDS: Readonly<Record<NineThird, string>> = {
  'top-left': 'top left',
  'top-centre': 'at the top',
  'top-right': 'top right',
  'middle-left': 'left',
  'middle-centre': 'in the middle',
  'middle-right': 'right',
  'bottom-left': 'bottom left',
  'bottom-centre': 'at the bottom',
  'bottom-right': 'bottom right',
};

/** What a sketch is at a glance: `8 mats, big one left, one split in 6`. */
export function sketchWords({ matCount, paneCount, biggestPlace }: Pick<SketchFeatures, 'matCount' | 'paneCount' | 'biggestPlace'>): string {
  const parts = [matCount === 1 ? '1 mat' : `${matCount} mats`, `big one ${PLACE_WORDS[biggestPlace]}`];
  if (paneCount > 0) parts.push(`one split in ${paneCount}`);
  return parts.join(', ');
}
