import type { CommandId } from '../../commands/calls';
import type { Reason } from '../../commands/command';

/** What a step is called: on a button, and after "Undo" and "Redo". */
export const COMMAND_LABELS: Readonly<Record<CommandId, string>> = {
  'prints.place': 'Place print',
  'prints.move': 'Move print',
  'prints.lift': 'Back to the table',
  'window.slide': 'Slide window',
  'placement.setWhole': 'Whole or trimmed',
  'placement.turn': 'Turn print',
  'placement.scale': 'Scale digital photo',
  'mats.add': 'Add mat',
  'mats.delete': 'Delete mat',
  'mats.duplicate': 'Duplicate mat',
  'mats.move': 'Move mat',
  'mats.resize': 'Resize mat',
  'mats.split': 'Split mat',
  'mats.merge': 'Merge mats',
  'mats.mirror': 'Mirror mats',
  'mats.turn': 'Turn mat',
  'mats.setColor': 'Colour mat',
  'mats.setReveal': 'Reveal',
  'mats.setInner': 'Inner mat',
  'mats.setTrueSize': 'True size',
  'mats.setFocal': 'Focal',
  'mats.setLaidOver': 'Laid over',
  'mats.setContent': 'What the mat carries',
  'panes.group': 'Make panes',
  'panes.ungroup': 'Ungroup panes',
  'panes.setRun': 'How the panes run',
  'pages.mirror': 'Mirror page',
  'pages.swap': 'Swap pages',
  'pages.setColor': 'Colour page',
  'pages.useSketch': 'Use sketch',
  'spread.setReveal': "Spread's reveal",
  'scheme.apply': 'Apply scheme',
  'table.add': 'Choose prints',
  'table.remove': 'Put prints away',
};

/** Steps that are no command of their own. */
const OTHER_LABELS: Readonly<Record<string, string>> = { undo: 'Undo', redo: 'Redo', 'conflict.mine': 'Keep mine', 'conflict.theirs': 'Take theirs' };

/** The label of a logged step; one that this version does not know (an older or newer client's) is plainly an edit. */
export const commandLabel = (id: string): string => (id in COMMAND_LABELS ? COMMAND_LABELS[id as CommandId] : (OTHER_LABELS[id] ?? 'Edit'));

const SENTENCES: Readonly<Record<Reason, string>> = {
  'nothing-to-do': 'Nothing would change.',
  'no-such-mat': 'That mat is no longer on the spread.',
  'no-such-page': 'This spread has no page on that side.',
  'no-such-print': 'That print is no longer in the studio: choose another.',
  'no-such-detail': 'That print has no such detail any more: place the print itself, or mark the detail again.',
  'no-such-group': 'Those panes are no longer a group.',
  'off-page': 'That would leave the page: use a smaller mat, or another place.',
  'onto-another-mat': 'Another mat lies there: move it first, or mark this one as laid over.',
  'no-free-place': 'No page has room for another mat of this size: make room, or use a smaller one.',
  'no-print-there': 'No print lies on that mat: place one first.',
  'not-for-prints': 'That works for mats with a print or none: place prints and make panes with their own actions.',
  'content-does-not-fit': 'That is empty or too long for one mat: write something shorter, or use two mats.',
  'has-an-up': 'This print has an up, so it stays upright: mark it "no up" if it may be turned.',
  'not-digital': 'A printed photo keeps its size: only a digital photo can be scaled.',
  'is-whole': 'This print is mounted whole: choose "trimmed" first.',
  'does-not-fit-whole': 'The whole print is larger than its mat: use a larger mat.',
  'whole-panes': 'A split print is always cut: ungroup the panes to mount it whole.',
  'no-room-for-photo': 'No photo would be left inside the reveal: use a larger mat or a thinner reveal.',
  'no-room-for-inner-mat': 'No inner mat would be left inside the reveal: use a larger mat or a thinner reveal.',
  'true-size-too-large': "That size is larger than the mat's place on the grid: give the mat more steps first.",
  'too-few-mats': 'Choose two mats or more.',
  'on-two-pages': 'Choose mats of one page.',
  'not-a-rectangle': 'Those mats do not fill a rectangle together: choose neighbours that do.',
  'too-small-to-split': 'The mat has too few steps for so many pieces: use fewer pieces, or a larger mat.',
  'single-page': 'This spread has only one page, so there is none to swap with.',
  'still-placed': 'That print is on a mat: put it back to the table first.',
  'spread-full': 'The spread is full: delete mats or shorten its journaling first.',
};

/** One sentence: why a command did nothing, and what to do. */
export const reasonSentence = (reason: Reason): string => SENTENCES[reason];
