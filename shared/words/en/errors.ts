import type { ErrorCode, ErrorData } from '../../errors';
import type { DocumentFault } from '../../model/document-faults';
import { faultSentence } from './document';
import { EXPORT_TOO_HEAVY } from './exports';
import { fileTooLargeSentence, pictureRefusalSentence } from './pictures';
import { readingRefusalSentence, stashShortSentence } from './stash';

interface Words {
  /** A few words, the same for every occurrence of the code. */
  readonly title: string;
  /** One sentence: what was wrong and what to do. */
  readonly sentence: (data: ErrorData) => string;
}

const text = (value: unknown, otherwise: string): string => (typeof value === 'string' && value !== '' ? value : otherwise);
const list = (value: unknown): readonly unknown[] => (Array.isArray(value) ? value : []);

const WORDS: Record<ErrorCode, Words> = {
  'invalid-input': { title: 'Something does not fit', sentence: invalidInput },
  unauthenticated: {
    title: 'Not signed in',
    sentence: () => 'You are not signed in, or not any more: sign in and try again.',
  },
  'sign-in-failed': {
    title: 'Sign-in failed',
    sentence: () => 'The e-mail address and the password do not belong together: check both and try again.',
  },
  forbidden: {
    title: 'Not allowed',
    sentence: () => 'Your role in this studio does not let you do this: ask an owner of the studio.',
  },
  'not-found': {
    title: 'Not found',
    sentence: () => 'There is nothing here, or nothing that you can see: check the address, or go back to your albums.',
  },
  'already-exists': {
    title: 'Already there',
    sentence: ({ what }) =>
      what === 'account'
        ? 'There is an account with this e-mail address already: sign in, or use another address.'
        : `There is a ${text(what, 'thing')} with this id already: reload and try again.`,
  },
  'in-use': { title: 'In use', sentence: inUse },
  'stash-short': { title: 'Not enough sheets', sentence: stashShortSentence },
  'stale-revision': {
    title: 'Changed meanwhile',
    sentence: ({ print, sheet }) =>
      sheet !== undefined
        ? 'Somebody changed these sheets meanwhile: look at how they stand now and make your change again.'
        : print === undefined
        ? 'Somebody changed the same part of this spread meanwhile: look at what differs before you save yours.'
        : 'Somebody changed this print meanwhile: look at how it stands now and make your change again.',
  },
  'document-refused': { title: 'The spread does not fit together', sentence: documentRefused },
  'picture-refused': { title: 'Not a picture that can be used', sentence: pictureRefusalSentence },
  'reading-refused': { title: 'The colour cannot be read', sentence: readingRefusalSentence },
  'too-large': {
    title: 'Too large',
    sentence: ({ maxBytes }) =>
      typeof maxBytes === 'number' && maxBytes >= 1024 * 1024
        ? fileTooLargeSentence(maxBytes)
        : 'This is more than can be taken at once: send less in one go.',
  },
  'too-many-requests': {
    title: 'Too many attempts',
    sentence: () => 'There were too many attempts in a short time: wait a few minutes and try again.',
  },
  'quota-exceeded': {
    title: 'No room left',
    sentence: ({ whose }) =>
      whose === 'account'
        ? 'Your account has no room left for this: delete prints that you added and no longer need, or ask for more room.'
        : 'The studio has no room left for this: delete prints that you no longer need, or ask for more room.',
  },
  'disk-full': {
    title: 'The server is full',
    sentence: () => 'The server has no room left, so nothing was stored: tell whoever runs it, and try again later.',
  },
  'cross-site': {
    title: 'Sent from another site',
    sentence: () => 'This request came from another site, so it was refused: use Pairleaf in its own tab.',
  },
  unavailable: {
    title: 'Not available now',
    sentence: ({ reason }) =>
      reason === 'export-too-heavy' ? EXPORT_TOO_HEAVY : 'This cannot be done at the moment, and nothing was changed: try again in a minute.',
  },
  bug: {
    title: 'Our mistake',
    sentence: () => 'Something went wrong on our side and was noted: try again, and reload if it happens again.',
  },
};

export const errorTitle = (code: ErrorCode): string => WORDS[code].title;

/** One sentence for people: what was wrong and what to do. */
export const errorSentence = (code: ErrorCode, data: ErrorData = {}): string => WORDS[code].sentence(data);

function invalidInput({ fields }: ErrorData): string {
  const names = list(fields).flatMap((field) => {
    const { path, message } = field as { readonly path?: unknown; readonly message?: unknown };
    return typeof path === 'string' && path !== '' ? [`${path} (${text(message, 'does not fit')})`] : [];
  });
  if (names.length === 0) return 'What was sent cannot be read: check it and send it again.';
  const shown = names.slice(0, 5).join(', ');
  const more = names.length > 5 ? ` and ${names.length - 5} more` : '';
  return `These fields do not fit: ${shown}${more}. Correct them and send them again.`;
}

function inUse({ spreads }: ErrorData): string {
  const titles = list(spreads).flatMap((spread) => {
    const { title } = spread as { readonly title?: unknown };
    return typeof title === 'string' ? [`“${title}”`] : [];
  });
  return titles.length === 0
    ? 'This is in use, so it was kept: take it off what uses it first.'
    : `This print is on ${titles.slice(0, 3).join(', ')}${titles.length > 3 ? ` and ${titles.length - 3} more` : ''}: take it off there first.`;
}

/** The first fault in full; the rest are counted, and all of them are in the data. */
function documentRefused({ faults }: ErrorData): string {
  const all = list(faults) as readonly DocumentFault[];
  const [first] = all;
  if (!first) return 'The spread does not fit together: undo the last step and try again.';
  const more = all.length - 1;
  if (more === 0) return faultSentence(first);
  return `${faultSentence(first)} There ${more === 1 ? 'is one more fault' : `are ${more} more faults`}.`;
}
