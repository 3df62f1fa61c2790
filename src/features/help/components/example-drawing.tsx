import { useMemo } from 'react';
import type { DrawnPicture, PictureShape } from '#shared/checks/examples/drawn-picture';
import type { ExampleSpread } from '#shared/checks/examples/parts';
import { matRect } from '#shared/geometry/grid';
import type { MatId } from '#shared/model/ids';
import { buildScene } from '#shared/scene/build-scene';
import { pageRects, toScene } from '#shared/scene/page-rects';
import { photoRect } from '#shared/scene/photo-point';
import type { Scene } from '#shared/scene/scene';
import { PictureSourceContext, type PictureSource } from '@/components/scene/picture-source';
import { SceneDrawing } from '@/components/scene/scene-drawing';

/** An example spread, drawn by the same renderer as every other; its pictures are drawn too, and need no server. */
export function ExampleDrawing({ spread, label, noted = [] }: { readonly spread: ExampleSpread; readonly label: string; /** Mats that a note speaks of. */ readonly noted?: readonly MatId[] }) {
  const scene = useMemo(() => buildScene(spread.doc, new Map(spread.prints.map(({ print }) => [print.id, print]))), [spread]);
  const source = useMemo((): PictureSource => {
    const pictures = new Map(spread.prints.map(({ print, picture }) => [print.id, picture]));
    return ({ printId }) => {
      const picture = pictures.get(printId);
      return picture ? <Picture picture={picture} /> : null;
    };
  }, [spread]);
  return (
    <div className="help-drawing" role="img" aria-label={label} style={{ aspectRatio: `${scene.width} / ${scene.height}` }}>
      <PictureSourceContext value={source}>
        <SceneDrawing scene={scene} pictureSize="small" />
      </PictureSourceContext>
      <Marks spread={spread} scene={scene} noted={noted} />
    </div>
  );
}

/** In blue pencil: keep zones dashed, the mats that the note speaks of outlined, declared focals named. */
function Marks({ spread, scene, noted }: { readonly spread: ExampleSpread; readonly scene: Scene; readonly noted: readonly MatId[] }) {
  const keepZones = scene.items.flatMap((item) => {
    const zone = item.kind === 'photo' ? spread.prints.find(({ print }) => print.id === item.printId)?.print.keepZone : null;
    return zone && item.kind === 'photo' ? [photoRect(item, zone)] : [];
  });
  const pages = pageRects(spread.doc);
  const placed = spread.doc.mats.flatMap((mat) => {
    const rect = toScene(pages, mat.page, matRect(spread.doc.format, mat));
    return rect ? [{ mat, rect }] : [];
  });
  const letter = scene.height / LETTERS_HIGH;
  return (
    <svg viewBox={`0 0 ${scene.width} ${scene.height}`} aria-hidden="true">
      {keepZones.map((rect, i) => (
        <g key={i}>
          <rect {...rect} className="help-keep-halo" />
          <rect {...rect} className="help-keep" />
        </g>
      ))}
      {placed.map(({ mat, rect }) => noted.includes(mat.id) && <rect key={mat.id} {...rect} className="help-noted" />)}
      {placed.map(
        ({ mat, rect }) =>
          mat.focal && (
            <g key={mat.id} transform={`translate(${rect.x} ${rect.y})`} className="help-focal">
              <rect width={4 * letter} height={1.7 * letter} />
              <text x={0.5 * letter} y={1.2 * letter} fontSize={letter}>
                Focal
              </text>
            </g>
          ),
      )}
    </svg>
  );
}

/** So many lines of letters make the drawing's height. */
const LETTERS_HIGH = 22;

function Picture({ picture }: { readonly picture: DrawnPicture }) {
  return picture.shapes.map((shape, i) => <Shape key={i} shape={shape} />);
}

function Shape({ shape }: { readonly shape: PictureShape }) {
  switch (shape.kind) {
    case 'rect':
      return <rect x={shape.x} y={shape.y} width={shape.width} height={shape.height} fill={shape.fill} />;
    case 'ellipse':
      return <ellipse cx={shape.cx} cy={shape.cy} rx={shape.rx} ry={shape.ry} fill={shape.fill} />;
    case 'polygon':
      return <polygon points={shape.points.map((point) => point.join(',')).join(' ')} fill={shape.fill} />;
  }
}
