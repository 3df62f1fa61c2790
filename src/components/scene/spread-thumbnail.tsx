import { useMemo } from 'react';
import type { PrintId } from '#shared/model/ids';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import { SceneDrawing } from './scene-drawing';

interface SpreadThumbnailProps {
  readonly doc: SpreadDocument;
  readonly prints: ReadonlyMap<PrintId, Print>;
  /** What the picture shows, in words. */
  readonly label: string;
}

/** A small picture of a whole spread, as wide as its parent. */
export function SpreadThumbnail({ doc, prints, label }: SpreadThumbnailProps) {
  const scene = useMemo(() => buildScene(doc, prints), [doc, prints]);
  return (
    <div role="img" aria-label={label} style={{ aspectRatio: `${scene.width} / ${scene.height}` }}>
      <SceneDrawing scene={scene} pictureSize="small" isMini />
    </div>
  );
}
