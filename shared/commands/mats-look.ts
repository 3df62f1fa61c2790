import { contentRect, innerMatRect } from '../geometry/grid';
import type { Mat, SpreadDocument } from '../model/spread';
import { refuse, type CommandRun, type Outcome } from './command';
import { changeMats, groupOf, matOf, matsOf, newZ, withMats } from './edit-mats';
import { storedContent } from './stored-content';

function changeNamed(doc: SpreadDocument, matIds: readonly string[], change: (mat: Mat) => Mat): Outcome {
  return matsOf(doc, matIds) ? changeMats(doc, matIds, change) : refuse('no-such-mat');
}

export const setMatColor: CommandRun<'mats.setColor'> = (doc, { matIds, color }) => changeNamed(doc, matIds, (mat) => ({ ...mat, color }));

export const setReveal: CommandRun<'mats.setReveal'> = (doc, { matIds, reveal }) =>
  changeNamed(doc, matIds, (mat) => ({ ...mat, reveal: reveal === null ? null : wholeLength(reveal) }));

export const setInner: CommandRun<'mats.setInner'> = (doc, { matIds, inner }) =>
  changeNamed(doc, matIds, (mat) => ({ ...mat, inner: inner && { color: inner.color, reveal: wholeLength(inner.reveal) } }));

export const setTrueSize: CommandRun<'mats.setTrueSize'> = (doc, { matId, trueSize }) =>
  changeNamed(doc, [matId], (mat) => ({
    ...mat,
    trueSize: trueSize && { width: Math.max(1, Math.round(trueSize.width)), height: Math.max(1, Math.round(trueSize.height)) },
  }));

export const setSpreadReveal: CommandRun<'spread.setReveal'> = (doc, { reveal }) => ({ ...doc, reveal: wholeLength(reveal) });

const wholeLength = (length: number): number => Math.max(0, Math.round(length));

export const setFocal: CommandRun<'mats.setFocal'> = (doc, { matId, focal }) => {
  const named = matOf(doc, matId);
  if (!named) return refuse('no-such-mat');
  return {
    ...doc,
    mats: doc.mats.map((mat) => {
      const isFocal = mat.id === matId ? focal : mat.focal && !(focal && mat.page === named.page);
      return mat.focal === isFocal ? mat : { ...mat, focal: isFocal };
    }),
  };
};

export const setLaidOver: CommandRun<'mats.setLaidOver'> = (doc, { matIds, laidOver }) => {
  const mats = matsOf(doc, matIds);
  if (!mats) return refuse('no-such-mat');
  return mats.reduce((next, { id }) => {
    const mat = matOf(next, id)!;
    if (mat.laidOver === laidOver) return next;
    const others = { ...next, mats: next.mats.filter((other) => other.id !== id) };
    return withMats(next, [...others.mats, { ...mat, laidOver, z: newZ(others, laidOver) }]);
  }, doc);
};

/** What the mat carried goes back to the table; a pane leaves its group. */
export const setContent: CommandRun<'mats.setContent'> = (doc, { matId, content }) => {
  if (content.kind === 'print' || content.kind === 'pane') return refuse('not-for-prints');
  const stored = storedContent(content);
  return stored ? changeNamed(doc, [matId], (mat) => ({ ...mat, content: stored })) : refuse('content-does-not-fit');
};

/** One press colours the whole spread. An inner mat that a mat has no room for is left out. */
export const applyScheme: CommandRun<'scheme.apply'> = (doc, { scheme, pageColor, matColors, inners = {} }) => {
  const colored = (side: 'left' | 'right') => doc.pages[side] && { ...doc.pages[side], color: pageColor };
  return {
    ...doc,
    scheme,
    pages: { left: colored('left'), right: colored('right') },
    mats: doc.mats.map((mat) => {
      const inner = inners[mat.id];
      const withColor = { ...mat, color: matColors[mat.id] ?? mat.color };
      const withInner = inner === undefined ? withColor : { ...withColor, inner };
      return hasRoom(doc, withInner) ? withInner : withColor;
    }),
  };
};

function hasRoom(doc: SpreadDocument, mat: Mat): boolean {
  const card = innerMatRect(doc.format, doc.reveal, mat);
  const photo = contentRect(doc.format, doc.reveal, mat);
  const isCarrying = mat.content.kind === 'print' || groupOf(doc, mat) !== undefined;
  return (!card || (card.width > 0 && card.height > 0)) && (!isCarrying || (photo.width > 0 && photo.height > 0));
}
