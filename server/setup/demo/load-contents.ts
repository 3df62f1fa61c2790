import { createHash, randomUUID } from 'node:crypto';
import { copyFile, readFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { CUT_SIZE_STOCKS } from '../../../shared/model/cut-size';
import type { StudioId, UserId } from '../../../shared/model/ids';
import { inches } from '../../../shared/model/length';
import { PAGE_FORMATS } from '../../../shared/model/page-format';
import { diffDocuments } from '../../../shared/model/patch';
import type { Print } from '../../../shared/model/print';
import type { Actor } from '../../../shared/model/people';
import type { AppDeps } from '../../app-deps';
import { presentPrint } from '../../presenters/present-print';
import { readDocument } from '../../services/spread-service';
import { DEMO_PILES, DEMO_PRINTS, SHARED_PILE, type DemoPrint } from './prints';
import { buildDemoSpreads } from './spreads';
import { DEMO_STASH } from './stash';

const PHOTOS = new URL('./photos/', import.meta.url);
const ALBUM_TITLE = 'Long weekends';

/** Squares and rectangles that hand trimmers and common dies make, in inches: common practice. */
const CUT_SIZES = [
  [1.5, 1.5],
  [2, 2],
  [2, 3],
  [2.5, 2.5],
  [2.5, 3.5],
  [3, 3],
  [3, 4],
  [3.5, 5],
  [4, 4],
  [4, 6],
] as const;

interface Owner {
  readonly studioId: StudioId;
  readonly userId: UserId;
}

/** Fills the demo studio as a person would: prints through intake, piles, an album, three spreads. */
export async function loadContents(deps: AppDeps, owner: Owner): Promise<void> {
  const pileIds = await makePiles(deps, owner.studioId);
  // In order, so that the prints lie in their piles as they are listed.
  const printByFile = new Map<string, Print>();
  for (const print of DEMO_PRINTS) printByFile.set(print.file, await takeIn(deps, owner, print, pileIds.get(print.pile)!));
  for (const [width, height] of CUT_SIZES) {
    const size = { id: randomUUID(), name: `${width} × ${height} in`, width: inches(width), height: inches(height) };
    await deps.services.cutSizes.create(owner.studioId, { ...size, stock: CUT_SIZE_STOCKS[2], kind: 'hand', sets: [] });
  }
  for (const facts of DEMO_STASH) await deps.services.stash.create(owner.studioId, { id: randomUUID(), ...facts });
  await makeSpreads(deps, owner, printByFile);
}

async function makePiles({ services: { piles } }: AppDeps, studioId: StudioId): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const name of DEMO_PILES) {
    const pile = await piles.create(studioId, { id: randomUUID(), name });
    if (name === SHARED_PILE) await piles.update(pile, { sharedWithContributors: true });
    ids.set(name, pile.id);
  }
  return ids;
}

async function takeIn({ services, incoming }: AppDeps, { studioId, userId }: Owner, demo: DemoPrint, pileId: string): Promise<Print> {
  const source = fileURLToPath(new URL(demo.file, PHOTOS));
  const path = incoming.path('.jpg');
  await copyFile(source, path);
  const bytes = await readFile(path);
  const upload = { path, fileName: demo.file, bytes: bytes.length, sha256: createHash('sha256').update(bytes).digest('hex'), id: randomUUID(), pileId };
  const { print } = await services.uploads.take(upload, { studioId, userId, mayAdd: () => Promise.resolve(), maySee: () => true });
  const { title, keepZone, faces, horizon, marks, copies, paperRect } = demo;
  const updated = await services.prints.update(print, {
    baseRevision: print.revision,
    title,
    paperWidth: inches(demo.widthIn),
    paperHeight: inches(demo.heightIn),
    keepZone,
    marks: { instantFilm: false, ...marks },
    copies: copies ?? 1,
    ...(faces && { faces: [...faces] }),
    ...(horizon && { horizon }),
    ...(paperRect && { paperRect }),
  });
  return presentPrint(updated);
}

async function makeSpreads({ services: { albums, spreads, edits } }: AppDeps, { studioId, userId }: Owner, printByFile: ReadonlyMap<string, Print>): Promise<void> {
  const { album } = await albums.create(studioId, { id: randomUUID(), title: ALBUM_TITLE, formatId: PAGE_FORMATS[0]!.id });
  const actor: Actor = { userId, memberships: [{ studioId, role: 'owner' }], grants: [] };
  for (const { title, document } of buildDemoSpreads(printByFile, randomUUID)) {
    const spread = await spreads.create(album, { id: randomUUID(), title, pages: 'both' });
    const patch = diffDocuments(readDocument(spread), document);
    if (Object.keys(patch).length === 0) continue;
    await edits.post(spread.id, { baseRevision: 0, edits: [{ id: randomUUID(), command: 'demo', patch }] }, actor);
  }
}
