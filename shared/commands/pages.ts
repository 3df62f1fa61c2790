import { mirrored } from '../geometry/cells';
import { gridOf } from '../geometry/grid';
import type { Side } from '../model/ids';
import { inIdOrder } from '../model/patch';
import type { Mat, PaneGroup } from '../model/spread';
import { refuse, type CommandRun } from './command';
import { withMats } from './edit-mats';

/** The places are mirrored about the page's middle, never the pictures. */
export const mirrorPage: CommandRun<'pages.mirror'> = (doc, { page, axis }) => {
  if (!doc.pages[page]) return refuse('no-such-page');
  const { columns, rows } = gridOf(doc.format);
  const box = { x: 0, y: 0, w: columns, h: rows };
  return { ...doc, mats: doc.mats.map((mat) => (mat.page === page ? mirrored(mat, box, axis) : mat)) };
};

const across = (side: Side): Side => (side === 'left' ? 'right' : 'left');

export const swapPages: CommandRun<'pages.swap'> = (doc) => {
  const { left, right } = doc.pages;
  if (!left || !right) return refuse('single-page');
  return { ...doc, pages: { left: right, right: left }, mats: doc.mats.map((mat) => ({ ...mat, page: across(mat.page) })) };
};

export const setPageColor: CommandRun<'pages.setColor'> = (doc, { pages, color }) => {
  const next = { ...doc.pages };
  for (const side of pages) {
    const page = next[side];
    if (!page) return refuse('no-such-page');
    next[side] = { ...page, color };
  }
  return { ...doc, pages: next };
};

/** A sketch has one focal; of several, the first counts. A lone mat cannot be a pane. */
export const useSketch: CommandRun<'pages.useSketch'> = (doc, { page, mats, color }, context) => {
  if (!doc.pages[page]) return refuse('no-such-page');
  const groupIds = new Map<number, string>();
  for (const { paneGroup } of mats) {
    const isPair = paneGroup !== undefined && mats.filter((other) => other.paneGroup === paneGroup).length > 1;
    if (isPair && !groupIds.has(paneGroup)) groupIds.set(paneGroup, context.newId());
  }
  const focal = mats.findIndex((mat) => mat.focal);
  const groupIdOf = (paneGroup: number | undefined): string | undefined => (paneGroup === undefined ? undefined : groupIds.get(paneGroup));
  const laid = mats.map(({ x, y, w, h, paneGroup }, i): Mat => {
    const groupId = groupIdOf(paneGroup);
    return {
      id: context.newId(),
      page,
      x,
      y,
      w,
      h,
      z: 0,
      color,
      reveal: null,
      inner: null,
      trueSize: null,
      laidOver: false,
      focal: i === focal,
      content: groupId ? { kind: 'pane', groupId } : { kind: 'bare' },
    };
  });
  const groups = [...groupIds.values()].map((id): PaneGroup => ({
    id,
    matIds: laid.flatMap((mat) => (mat.content.kind === 'pane' && mat.content.groupId === id ? [mat.id] : [])),
    content: null,
  }));
  const kept = doc.mats.filter((mat) => mat.page !== page);
  return withMats({ ...doc, panes: [...doc.panes, ...groups].sort(inIdOrder) }, [...kept, ...laid]);
};
