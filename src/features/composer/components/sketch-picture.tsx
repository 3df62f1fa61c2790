import { memo } from 'react';
import { sketchWords } from '#shared/words/en/sketches';
import type { SketchMat } from '#shared/commands/calls';
import { sketchFeatures } from '#shared/sketches/features';
import type { Sketch } from '#shared/sketches/sketch';
import { cellRect, gridOf, matRect } from '#shared/geometry/grid';
import type { PageFormat } from '#shared/model/page-format';

interface SketchPictureProps {
  readonly format: PageFormat;
  readonly mats: readonly SketchMat[];
}

/** A sketch as a small diagram: mats dark, the biggest darkest, panes lighter, on a bare page. */
export const SketchPicture = memo(function SketchPicture({ format, mats }: SketchPictureProps) {
  const grid = gridOf(format);
  const whole = cellRect(format, { x: 0, y: 0, w: grid.columns, h: grid.rows });
  return (
    <svg viewBox={`0 0 ${format.width} ${format.height}`} aria-hidden="true">
      {mats.length === 0 && <rect {...whole} fill="none" className="stroke-nonphoto" strokeWidth={format.gap} />}
      {mats.map((mat, i) => {
        const rect = matRect(format, { ...mat, trueSize: null });
        const kind = mat.paneGroup !== undefined ? 'is-pane' : mat.focal ? 'is-focal' : '';
        return <rect key={i} {...rect} className={`sketch-mat ${kind}`} />;
      })}
    </svg>
  );
});

interface SketchCardProps {
  readonly sketch: Sketch;
  readonly format: PageFormat;
  readonly isChosen: boolean;
  readonly onChoose: () => void;
}

/** A sketch to press: its diagram, its plain description, its name. */
export const SketchCard = memo(function SketchCard({ sketch, format, isChosen, onChoose }: SketchCardProps) {
  return (
    <button type="button" className="sketch" aria-pressed={isChosen} onClick={onChoose}>
      <SketchPicture format={format} mats={sketch.mats} />
      <b>{sketch.name}</b>
      <span>{sketchWords(sketchFeatures(sketch, format))}</span>
    </button>
  );
});
