import { useMemo } from 'react';
import type { PrintId } from '#shared/model/ids';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import { SceneDrawing } from '@/components/scene/scene-drawing';

interface SpreadPictureProps {
  readonly document: SpreadDocument;
  readonly prints: ReadonlyMap<PrintId, Print>;
}

/** A small spread as a picture. A single page stands on its own side of the gutter. */
export function SpreadPicture({ document, prints }: SpreadPictureProps) {
  const scene = useMemo(() => buildScene(document, prints), [document, prints]);
  const { left, right } = document.pages;
  const isSingle = left === null || right === null;
  const { width, height } = document.format;
  return (
    <div className="spread-picture" aria-hidden="true" style={{ aspectRatio: `${width * 2 + document.binding.gap} / ${height}` }}>
      <div className="h-full" style={isSingle ? { width: '50%', marginLeft: left === null ? '50%' : 0 } : undefined}>
        <SceneDrawing scene={scene} pictureSize="small" isMini />
      </div>
    </div>
  );
}
