import { useMemo } from 'react';
import { colorName } from '#shared/colour/name';
import type { PrintId } from '#shared/model/ids';
import type { PatchValue } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import type { Mat, Page, SpreadDocument } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { SceneDrawing } from '@/components/scene/scene-drawing';
import { matLabels } from '@/features/composer/canvas/page-scale';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import type { ConflictView, Difference } from '@/features/composer/model/conflict';

/** Shows what differs when the same things were changed elsewhere; nothing is overwritten before the person chooses. */
export function ConflictDialog() {
  const store = useComposerStore();
  const save = useComposer((state) => state.save);
  const prints = useComposer((state) => state.prints);
  const view = useMemo(() => (save.status === 'conflict' ? store.getState().describeConflict() : null), [save, store]);
  if (!view) return null;
  const who = view.names.length > 0 ? view.names.join(' and ') : 'Another tab';
  return (
    <Dialog
      open
      onClose={() => undefined}
      className="is-wide"
      title="This spread was changed elsewhere"
      description={`${who} changed the same things since you opened it. Nothing of yours is lost: choose which of the two stays. Whatever only one of you changed is kept either way.`}
    >
      <div className="conflict-pages">
        <ConflictPicture heading="Yours" doc={view.mine} prints={prints} />
        <ConflictPicture heading="Theirs" doc={view.theirs} prints={prints} />
      </div>
      <DifferenceList view={view} prints={prints} />
      <div className="mt-5 flex gap-3">
        <Button variant="ink" onClick={() => store.getState().resolveConflict('mine')}>
          Keep mine
        </Button>
        <Button onClick={() => store.getState().resolveConflict('theirs')}>Take theirs</Button>
      </div>
    </Dialog>
  );
}

function ConflictPicture({ heading, doc, prints }: { heading: string; doc: SpreadDocument; prints: ReadonlyMap<PrintId, Print> }) {
  const scene = useMemo(() => buildScene(doc, prints), [doc, prints]);
  return (
    <figure>
      <h3>{heading}</h3>
      <div className="conflict-picture" style={{ aspectRatio: `${scene.width} / ${scene.height}` }}>
        <SceneDrawing scene={scene} pictureSize="small" isMini />
      </div>
    </figure>
  );
}

function DifferenceList({ view, prints }: { view: ConflictView; prints: ReadonlyMap<PrintId, Print> }) {
  const labels = useMemo(() => new Map([...matLabels(view.theirs.mats), ...matLabels(view.mine.mats)]), [view]);
  return (
    <ul className="conflict-list" aria-label="What differs">
      <li>
        <span />
        <b>Yours</b>
        <b>Theirs</b>
      </li>
      {view.differences.map((difference) => (
        <li key={difference.key}>
          <b>{nameOf(difference, labels)}</b>
          <span>{valueWords(difference.mine, prints)}</span>
          <span>{valueWords(difference.theirs, prints)}</span>
        </li>
      ))}
    </ul>
  );
}

function nameOf({ kind, matIds, page }: Difference, labels: ReadonlyMap<string, string>): string {
  switch (kind) {
    case 'mat':
      return `Mat ${labels.get(matIds[0] ?? '') ?? ''}`;
    case 'panes':
      return `Panes ${matIds.map((id) => labels.get(id) ?? '').join(', ')}`;
    case 'page':
      return page === 'left' ? 'Left page' : 'Right page';
    case 'reveal':
      return 'Reveal';
    case 'table':
      return 'Prints on the table';
    case 'scheme':
      return 'Scheme';
  }
}

/** A changed value in a few words: enough to choose by, beside the pictures. */
function valueWords(value: PatchValue, prints: ReadonlyMap<PrintId, Print>): string {
  if (value === null) return 'not there';
  if (typeof value === 'number') return String(value);
  if (Array.isArray(value)) return `${value.length} prints`;
  if ('content' in value && 'w' in value) return matWords(value, prints);
  if ('matIds' in value) return value.content ? `${prints.get(value.content.printId)?.title ?? 'a print'}, ${value.content.run === 'apart' ? 'spread apart' : 'runs on behind'}` : 'no picture';
  if ('character' in value) return value.character;
  return colorName((value as Page).color);
}

function matWords(mat: Mat, prints: ReadonlyMap<PrintId, Print>): string {
  const carried = mat.content.kind === 'print' ? (prints.get(mat.content.printId)?.title ?? 'a print') : mat.content.kind;
  return `${mat.w} × ${mat.h} steps at ${mat.x}, ${mat.y}; ${colorName(mat.color)}; ${carried}`;
}
