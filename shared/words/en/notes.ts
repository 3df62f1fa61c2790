import type { Note, NoteData, Remedy, Severity } from '../../checks/check';
import type { Edge, MotifKind, NoteMessageId, NoteMessages, RemedyMessageId, RemedyMessages } from '../../checks/messages';
import { colorName } from '../../colour/name';
import { formatLength, type Unit } from '../measure';

export const SEVERITY_WORDS: Readonly<Record<Severity, string>> = { stop: 'Stop', fix: 'Fix', consider: 'Consider' };

const EDGES: Readonly<Record<Edge, string>> = { left: 'left', right: 'right', top: 'top', bottom: 'foot' };
const MOTIFS: Readonly<Record<MotifKind, string>> = { 'split-print': 'split print', strip: 'strip', pinwheel: 'pinwheel', arrangement: 'arrangement of mats' };

/** A length with its unit, and a least length in words, since 0 would be no reason for a note. */
function measure(length: number, unit: Unit): string {
  const text = formatLength(length, unit);
  return text === '0' && length !== 0 ? 'a hair' : `${text} ${unit}`;
}

/** Titles that are long would drown the sentence. */
const TITLE_LETTERS = 32;
function named(title: string): string {
  const letters = [...title];
  return `“${letters.length > TITLE_LETTERS ? `${letters.slice(0, TITLE_LETTERS - 1).join('').trimEnd()}…` : title}”`;
}

function shareOfRim(percent: number): string {
  if (percent >= 95) return 'all its rim';
  if (percent >= 60) return 'most of its rim';
  if (percent >= 45) return 'half its rim';
  return percent >= 30 ? 'a third of its rim' : 'some of its rim';
}

const SENTENCES: { readonly [Id in NoteMessageId]: (data: NoteMessages[Id], unit: Unit) => string } = {
  'pane-off-paper': ({ title, missing }, unit) =>
    `${named(title)} does not reach over all its panes: ${measure(missing, unit)} of paper is missing.`,
  'bleed-off-paper': ({ title, missing }, unit) =>
    `${named(title)} does not reach the page’s edge: ${measure(missing, unit)} of paper is missing.`,
  'instant-film-cut': ({ title }) => `${named(title)} is instant film. Never cut it: its paste is caustic and the print falls apart.`,
  'one-of-a-kind-cut': ({ title }) => `${named(title)} is one of a kind, and this would cut it. Copy it first.`,
  'borrowed-cut': ({ title, until }) => `${named(title)} goes back by ${until}, and this would cut it. Copy it first.`,
  'keep-zone-larger': ({ title, zone, window, axis }, unit) =>
    `This cut takes part of ${named(title)}. The keep zone is ${formatLength(zone, unit)} ${axis}, the window ${formatLength(window, unit)}.`,
  'keep-zone-missed': ({ title, lost, edge }, unit) =>
    `This cut takes ${measure(lost, unit)} off the keep zone of ${named(title)} at the ${EDGES[edge]}.`,
  'keep-zone-tight': ({ title, spare, tolerance, edge }, unit) =>
    spare === 0
      ? `This cut runs along the keep zone of ${named(title)} at the ${EDGES[edge]}. ${measure(tolerance, unit)} to spare is wanted.`
      : `This cut leaves ${measure(spare, unit)} to spare by the keep zone of ${named(title)} at the ${EDGES[edge]}. ${measure(tolerance, unit)} is wanted.`,
  'seam-behind': ({ title }) => `A gap between the panes swallows part of the keep zone of ${named(title)}.`,
  'seam-apart': ({ title }) => `A cut between the panes goes through the keep zone of ${named(title)}.`,
  'panes-inseparable': ({ title }) => `The panes of ${named(title)} lock into each other: no cuts from edge to edge part them.`,
  'more-placements': ({ title, needed, copies, elsewhere }) =>
    `${named(title)} is needed ${needed} times${elsewhere > 0 ? `, ${elsewhere} of them on other spreads` : ''}, and there ${copies === 1 ? 'is one copy' : `are ${copies} copies`}.`,
  'print-smaller': ({ title, print, photo, axis }, unit) =>
    print < photo
      ? `${named(title)} is ${formatLength(print, unit)} ${axis}, its place ${formatLength(photo, unit)}. Paper ends before the photo does.`
      : `The window of ${named(title)} has slid off its paper.`,
  'whole-overhangs': ({ title, over }, unit) => `${named(title)} is larger than its card by ${measure(over, unit)}, and lies on what is beside it.`,
  'photo-sinks': ({ title, share, matColor }) => `${named(title)} sinks into its mat: ${shareOfRim(share)} is too close to ${colorName(matColor)}.`,
  'bare-mat': ({ fitting }) =>
    fitting === 0 ? 'Bare mat. No print on the table fits it.' : `Bare mat. ${fitting === 1 ? 'One print on the table fits' : `${fitting} prints on the table fit`} it.`,
  'pages-unequal': ({ left, right, heavy }) => `The ${heavy} page weighs more: ${left} left against ${right} right.`,
  'centre-off': ({ edge, off }, unit) => `The spread’s weight gathers towards the ${EDGES[edge]}, ${measure(off, unit)} off its middle.`,
  'no-focal': () => 'No picture leads. The eye wants one place to land on first.',
  'focals-same-place': () => 'Both focals stand at the same place of their pages, so neither leads. Move one.',
  'focals-same-size': ({ width, height }, unit) =>
    `Both focals are ${formatLength(width, unit)} × ${formatLength(height, unit)} ${unit}, so neither leads. Make one larger or turn it.`,
  'focal-not-dominant': () => 'The focal is smaller than another picture of its page.',
  'nothing-shared': () => 'The two pages have nothing in common: no motif, colour, paper or size of mat.',
  'motif-copied': ({ motif }) => `The same ${MOTIFS[motif]} stands at the same place of both pages. Move one, turn it, or change its size.`,
  'whole-lopsided': ({ title, beside, above }, unit) =>
    `${named(title)} shows ${formatLength(beside, unit)} of card beside it and ${formatLength(above, unit)} above.`,
  'shaving': ({ title, width, edge }, unit) =>
    `This cuts a shaving of ${measure(width, unit)} off ${named(title)} at the ${EDGES[edge]}. Slide the window there and it stays on.`,
  'mat-like-page': ({ color }) => `Card in the page’s own ${colorName(color)} does not show. Write or mount straight on the page.`,
  'under-binding': ({ hidden }, unit) => `The binding hides ${measure(hidden, unit)} of this mat.`,
  'low-resolution': ({ title, ppi }) =>
    `${named(title)} has ${ppi} pixels to the inch at this size. ${ppi < 200 ? 'Under 200 it cannot be printed.' : '300 print sharp.'}`,
  'no-title': () => 'The spread has no title.',
  'no-journaling': () => 'Nothing says who, when and where.',
  'face-too-large': ({ title, face, photo, axis }, unit) =>
    `This photo is too small for the face in ${named(title)}: the face is ${formatLength(face, unit)} ${axis}, the photo ${formatLength(photo, unit)}.`,
  'keep-zone-covered': ({ title, others }) =>
    `What is laid over here hides part of the keep zone of ${named(title)}${others > 0 ? ` and of ${others} more` : ''}.`,
  'title-overflows': ({ needs, has, axis }, unit) =>
    `The title takes ${formatLength(needs, unit)} ${unit} ${axis === 'wide' ? 'across' : 'in height'}, and its mat holds ${measure(has, unit)}.`,
  'journaling-overflows': ({ words, capacity }) =>
    `${words === 1 ? 'One word is' : `${words} words are`} written, and the lines hold ${capacity === 0 ? 'none' : `about ${capacity}`} in this hand.`,
  'focals-compete': () => 'Both focals weigh about the same, so they compete. Let one lead: larger, bolder or in stronger card.',
  'undeclared-focal': () => 'This draws the eye more than the focal does. Calm it, or let it lead.',
  'against-print': ({ title, isUpright }) => `${named(title)} ${isUpright ? 'stands upright, and its mat lies flat' : 'lies flat, and its mat stands upright'}.`,
  'orientations-alike': ({ areUpright, others }) =>
    `Every photo ${areUpright ? 'stands upright' : 'lies flat'}, though ${others === 1 ? 'one print does' : `${others} prints do`} not. A change of direction wakes a page up.`,
  'looks-off-page': ({ title }) => `In ${named(title)} somebody looks off the page, and the reader’s eye goes along. Never mirror the picture: give it another place.`,
  'horizons-apart': ({ title, other, apart }, unit) => `The horizons of ${named(title)} and ${named(other)} miss each other by ${measure(apart, unit)}.`,
  'color-in-no-photo': ({ color }) => `Card in ${colorName(color)} has its colour from no photo here.`,
  'too-many-colors': ({ count, most, color }) => `${count} colours of card are more than the ${most} that hold together. Of ${colorName(color)} there is least.`,
  'accent-few': ({ color, places }) =>
    `The accent in ${colorName(color)} stands ${places === 1 ? 'alone' : `in ${places} places`}. Three places, on both pages, lead the eye round.`,
  'accent-one-page': ({ color }) => `The accent in ${colorName(color)} stays on one page. Repeated on the other it ties the two together.`,
  'all-neutrals': () => 'All card is neutral, though the photos have colour to lend it.',
};

/**
 * One plain sentence or two for a note, at most.
 *
 * @param unit - the unit in which this person reads lengths.
 */
export function noteSentence(note: Pick<Note, 'messageId' | 'data'>, unit: Unit): string {
  const say = SENTENCES[note.messageId] as (data: NoteData, unit: Unit) => string;
  return say(note.data, unit);
}

const LABELS: { readonly [Id in RemedyMessageId]: (data: RemedyMessages[Id], unit: Unit) => string } = {
  'slide-window': () => 'Slide the window',
  'mount-whole': () => 'Mount it whole',
  'larger-mat': () => 'Make the mat larger',
  'smaller-mat': () => 'Make mat smaller',
  'no-reveal': () => 'Use no reveal',
  'thinner-reveal': ({ reveal }, unit) => `Use a ${formatLength(reveal, unit)} ${unit} reveal`,
  'back-to-table': () => 'Put it on the table',
  'spread-apart': () => 'Spread the panes',
  'run-behind': () => 'Run on behind gaps',
  'trim-to-mat': () => 'Trim it to the mat',
  'light-inner-mat': () => 'Add thin inner mat',
  'other-color': () => 'Change the card',
  'place-best-fit': ({ count }) => (count === 1 ? 'Place it' : 'Place the best fit'),
  'make-focal': () => 'Make this the focal',
  'move-off': () => 'Move it off',
  'smaller-letters': ({ height }, unit) => `Use ${formatLength(height, unit)} ${unit} caps`,
  'smaller-hand': ({ line }, unit) => `Rule ${formatLength(line, unit)} ${unit} lines`,
  'turn-mat': () => 'Turn the mat',
  'turn-picture': () => 'Turn the picture',
  'swap-places': () => 'Swap the two',
  'line-up': () => 'Line them up',
  'repeat-accent': () => 'Repeat it there',
};

/** What stands on a remedy's button: a verb or the new value, at most 20 letters. */
export function remedyLabel(remedy: Remedy, unit: Unit): string {
  const label = LABELS[remedy.messageId] as (data: NoteData, unit: Unit) => string;
  return label(remedy.data, unit);
}
