import type { NgoMeasure } from '../../checks/balance/ngo-measures';
import type { RuleReading } from '../../checks/rule-reading';

export type RuleMeasure = 'deviation' | NgoMeasure;

export interface MeasureHelp {
  readonly name: string;
  readonly formula: string;
  /** What it looks at, and which variant is taken where the paper leaves one open. */
  readonly meaning: string;
}

/** Formulas in plain text: w width, h height, a area of an object; frame B × H; n objects; L layout, the box round all objects. */
export const MEASURE_HELP: Readonly<Record<RuleMeasure, MeasureHelp>> = {
  deviation: {
    name: 'Deviation of the centre',
    formula: '100 × √((x/B − ½)² + (y/H − ½)²) / ½',
    meaning: 'How far the centre of visual mass lies from the middle: 0 in the middle, 100 at the middle of an edge. The only one here that weighs colour, pictures and faces, and the only one where less is better. Hübner and Fillinger (2016), in its continuous form.',
  },
  balance: {
    name: 'Balance',
    formula: '1 − (|left − right| / larger + |top − foot| / larger) / 2, each side Σ a × distance from the axis',
    meaning: 'Whether areas and their distances from the middle lines are alike on both sides. Mats across a line are split there.',
  },
  equilibrium: {
    name: 'Equilibrium',
    formula: '1 − (|2 Σ a (x − B/2)| / (n B Σ a) + |2 Σ a (y − H/2)| / (n H Σ a)) / 2',
    meaning: 'How near the middle of all areas lies to the frame’s. The paper divides by the number of objects, so that many mats always come near 1.',
  },
  symmetry: {
    name: 'Symmetry',
    formula: '1 − (Sv + Sh + Sr) / 3, each Σ |difference of two quarters| / 12 over x, y, w, h, slope and reach',
    meaning: 'Whether the four quarters mirror each other left to right, top to bottom and across the middle. Each sum is taken over the largest of the four.',
  },
  sequence: {
    name: 'Sequence',
    formula: '1 − Σ |reading rank − rank by weight| / 8, weight = area × (4, 3, 2, 1)',
    meaning: 'Whether area falls off in the order in which people read. Equal quarters are ranked in reading order.',
  },
  cohesion: {
    name: 'Cohesion',
    formula: '(like(hL/wL, H/B) + Σ like(h/w, hL/wL) / n) / 2, like = smaller over larger',
    meaning: 'Whether mats, their whole and the frame have like proportions. Two terms, without mats against the frame.',
  },
  unity: {
    name: 'Unity',
    formula: '(1 − (sizes − 1)/n + 1 − (aL − Σa) / (BH − Σa)) / 2',
    meaning: 'Few different sizes, set close together.',
  },
  proportion: {
    name: 'Proportion',
    formula: '(Σ (1 − nearest / ½) / n + the same of L) / 2, to 1, 1/1.414, 1/1.618, 1/1.732, 1/2',
    meaning: 'How near the shapes of the mats and of their whole come to those that the paper takes for pleasing.',
  },
  simplicity: {
    name: 'Simplicity',
    formula: '3 / (left edges + top edges + n)',
    meaning: 'Few mats, starting on few lines. Different left edges and different top edges are counted, so that one mat gives 1.',
  },
  density: {
    name: 'Density',
    formula: '1 − 2 × |½ − Σa / BH|',
    meaning: 'Best where half of the frame is covered: the form of 2003, from memory. (The form of 2000, one less the share covered, is another measure.)',
  },
  regularity: {
    name: 'Regularity',
    formula: '(1 − (left edges + top edges) / 2n + 1 − (spacings − 1) / 2(n − 1)) / 2',
    meaning: 'Mats start on common lines, at few different distances.',
  },
  economy: {
    name: 'Economy',
    formula: '1 / sizes',
    meaning: 'One over the number of different sizes of mat.',
  },
  homogeneity: {
    name: 'Homogeneity',
    formula: 'W / Wmax, W = n! / Π (mats in each quarter)!',
    meaning: 'How evenly the mats are dealt to the four quarters, by their middles. The most even deal in whole mats is the largest.',
  },
  rhythm: {
    name: 'Rhythm',
    formula: '1 − (Rx + Ry + Ra) / 3, each Σ |difference| over the six pairs of quarters / 6',
    meaning: 'Whether the quarters are alike in place and in area.',
  },
  order: {
    name: 'Order',
    formula: 'mean of the thirteen others',
    meaning: 'All of Ngo, Teo and Byrne’s measures together. The paper lets each have a weight of its own; here all have the same.',
  },
};

const ORDINAL = ['upper left', 'upper right', 'lower left', 'lower right'] as const;
const percent = (value: number): string => `${Math.round(value * 100)} %`;

/** One plain sentence on what a measure says about this spread. */
export function measureSentence(measure: RuleMeasure, reading: RuleReading): string {
  const { measures, facts } = reading;
  const value = measure === 'deviation' ? 0 : measures[measure];
  const level = value >= 0.8 ? 'high' : value >= 0.5 ? 'middling' : 'low';
  const say = (high: string, middling: string, low: string): string => ({ high, middling, low })[level];
  switch (measure) {
    case 'deviation':
      return deviationSentence(reading);
    case 'balance':
      return `${side('left', 'right', facts.leftOverRight)} ${side('top', 'foot', facts.topOverFoot)}`;
    case 'equilibrium':
      return say('The middle of all areas is at the middle of the frame, or close to it.', 'The areas lean to one side.', 'The areas lie far to one side.');
    case 'symmetry':
      return say('The quarters nearly mirror each other.', 'The quarters mirror each other in part.', 'The quarters are quite different, as on most lively pages.');
    case 'sequence':
      if (level === 'high') return 'Counted as people read, the weight of the quarters falls off.';
      return `The ${ORDINAL[facts.heaviestQuarter]} quarter is the fullest. ${say('', 'The order differs from reading in part.', 'The eye is asked to start elsewhere than where people read from.')}`;
    case 'cohesion':
      return say('Mats and pages have like shapes.', 'Some mats have the pages’ shape, others do not.', 'Most mats are of quite another shape than the whole.');
    case 'unity':
    case 'economy':
      return `${count(facts.sizes, 'size')} for ${count(facts.mats, 'mat')}.${measure === 'unity' ? ` ${say('They stand close.', 'Some space between them is left over.', 'They are many, or far apart.')}` : ''}`;
    case 'proportion':
      return say('Most mats are near a square, a root-two, a golden or a double-square shape.', 'Some mats are near those shapes.', 'Most mats are longer than a double square.');
    case 'simplicity':
      return `${count(facts.mats, 'mat')} on ${count(facts.columns, 'left edge')} and ${count(facts.rows, 'top edge')}.`;
    case 'density':
      return `Mats cover ${percent(facts.covered)} of the frame.${facts.covered > 0.75 ? ' Filled pages always read low here.' : ''}`;
    case 'regularity':
      return say('Mats share their lines.', 'Mats share some of their lines.', 'Nearly every mat starts on a line of its own.');
    case 'homogeneity':
      return `Mats in the quarters: ${facts.inQuarters.join(', ')}.`;
    case 'rhythm':
      return say('The quarters are alike in place and area.', 'The quarters vary in place and area.', 'The quarters have little in common.');
    case 'order':
      return say('Very orderly.', 'Orderly in part: most spreads that are liked lie here.', 'Little order by these measures.');
  }
}

const count = (n: number, noun: string): string => `${n} ${n === 1 ? noun : `${noun}s`}`;

/** How one side pulls against the other: 0 alike, ±1 all on one. */
function side(first: string, second: string, difference: number): string {
  const share = Math.round(Math.abs(difference) * 100);
  if (share === 0) return `${capital(first)} and ${second} pull alike.`;
  const [more, less] = difference > 0 ? [first, second] : [second, first];
  return `The ${less} pulls ${share} % less than the ${more}.`;
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

function deviationSentence({ deviation, offset }: RuleReading): string {
  if (deviation === null || !offset) return 'Nothing here has weight yet.';
  if (deviation < 2) return 'The weight balances on the middle.';
  const words = [
    Math.abs(offset.x) >= 0.005 ? `${percent(Math.abs(offset.x))} of the width to the ${offset.x < 0 ? 'left' : 'right'}` : '',
    Math.abs(offset.y) >= 0.005 ? `${percent(Math.abs(offset.y))} of the height ${offset.y < 0 ? 'above' : 'below'}` : '',
  ].filter(Boolean);
  return words.length === 0 ? 'The weight balances near the middle.' : `The weight balances ${words.join(' and ')} of the middle.`.replace(/(above|below) of the middle/, '$1 the middle');
}
