import { memo, useMemo, useRef, type ReactNode } from 'react';
import type { PictureSize } from '#shared/contracts/prints';
import { itemsByMat } from '#shared/scene/mat-groups';
import type { Scene } from '#shared/scene/scene';
import { MatDrawing } from './mat-drawing';
import { lineOnPixels, onPixels } from './on-pixels';
import { useDrawnScale } from './use-drawn-scale';

interface SceneDrawingProps {
  readonly scene: Scene;
  readonly pictureSize: PictureSize;
  readonly hiddenMatIds?: ReadonlySet<string>;
  /** Drawn over the pages and under the mats, in the scene's units. */
  readonly underlay?: ReactNode;
  /** For drawings so small that thin lines would crowd them. */
  readonly isMini?: boolean;
}

const NONE_HIDDEN: ReadonlySet<string> = new Set();

/**
 * A drawn spread that fills its parent. It says nothing to assistive technology: what stands on the
 * spread is told by the controls that lie over it, or by the label of whatever holds it.
 */
export const SceneDrawing = memo(function SceneDrawing({
  scene,
  pictureSize,
  hiddenMatIds = NONE_HIDDEN,
  underlay,
  isMini = false,
}: SceneDrawingProps) {
  const svg = useRef<SVGSVGElement>(null);
  const scale = useDrawnScale(svg, scene);
  const groups = useMemo(() => itemsByMat(scene.items), [scene.items]);
  return (
    <svg
      ref={svg}
      viewBox={`0 0 ${scene.width} ${scene.height}`}
      preserveAspectRatio="xMinYMin meet"
      width="100%"
      height="100%"
      style={{ display: 'block', overflow: 'hidden' }}
      aria-hidden="true"
      focusable="false"
    >
      {scene.pages.map((page) => (
        <rect key={page.side} data-page={page.side} {...onPixels(page.rect, scale)} fill={page.color} shapeRendering="crispEdges" />
      ))}
      {scene.fold && (
        <rect {...lineOnPixels(scene.fold.rect, scale)} fill={scene.fold.fill} opacity={scene.fold.opacity} shapeRendering="crispEdges" />
      )}
      {underlay}
      {groups.map(({ matId, items }) =>
        hiddenMatIds.has(matId) ? null : (
          <MatDrawing key={matId} matId={matId} items={items} scale={scale} pictureSize={pictureSize} isMini={isMini} />
        ),
      )}
    </svg>
  );
});
