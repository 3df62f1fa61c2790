import { memo } from 'react';
import type { PictureSize } from '#shared/contracts/prints';
import { drawAlike } from '#shared/scene/mat-groups';
import type { FontId, SceneItem, TextItem } from '#shared/scene/scene';
import { framePath, onPixels } from './on-pixels';
import { PhotoDrawing } from './photo-drawing';

interface MatDrawingProps {
  readonly matId: string;
  readonly items: readonly SceneItem[];
  /** Device pixels per unit, where known. */
  readonly scale: number | null;
  readonly pictureSize: PictureSize;
  /** Small drawings leave out the thin lines along cards' edges. */
  readonly isMini: boolean;
}

/** One mat and all it carries. Drawn again only when something of it has changed. */
export const MatDrawing = memo(
  function MatDrawing({ matId, items, scale, pictureSize, isMini }: MatDrawingProps) {
    return (
      <g data-mat={matId}>
        {items.map((item) => (
          <ItemDrawing key={item.key} item={item} scale={scale} pictureSize={pictureSize} isMini={isMini} />
        ))}
      </g>
    );
  },
  (before, after) =>
    before.matId === after.matId &&
    before.scale === after.scale &&
    before.pictureSize === after.pictureSize &&
    before.isMini === after.isMini &&
    drawAlike(before.items, after.items),
);

type ItemDrawingProps = Omit<MatDrawingProps, 'matId' | 'items'> & { readonly item: SceneItem };

function ItemDrawing({ item, scale, pictureSize, isMini }: ItemDrawingProps) {
  switch (item.kind) {
    case 'rect':
      return <rect {...onPixels(item.rect, scale)} fill={item.fill} opacity={item.opacity} shapeRendering="crispEdges" />;
    case 'frame':
      return isMini ? null : (
        <path d={framePath(item.rect, item.thickness, scale)} fill={item.fill} opacity={item.opacity} shapeRendering="crispEdges" />
      );
    case 'circle':
      return <circle cx={item.cx} cy={item.cy} r={item.r} fill={item.fill} />;
    case 'photo':
      return <PhotoDrawing photo={item} scale={scale} pictureSize={pictureSize} />;
    case 'text':
      return <TextDrawing item={item} />;
  }
}

const FONTS: Readonly<Record<FontId, { readonly fontFamily: string; readonly fontStyle?: 'italic' }>> = {
  'young-serif': { fontFamily: '"Young Serif", serif' },
  atkinson: { fontFamily: '"Atkinson Next", sans-serif' },
  'atkinson-italic': { fontFamily: '"Atkinson Next", sans-serif', fontStyle: 'italic' },
};

/** Every glyph stands where the scene says; the browser neither kerns nor joins letters by itself. */
const PLAIN_GLYPHS = { fontKerning: 'none', fontVariantLigatures: 'none', fontWeight: 400, letterSpacing: 'normal', wordSpacing: 'normal' } as const;

function TextDrawing({ item }: { readonly item: TextItem }) {
  return (
    <text x={item.xs.join(' ')} y={item.baseline} fill={item.fill} fontSize={item.size} textRendering="geometricPrecision" style={{ ...PLAIN_GLYPHS, ...FONTS[item.font] }}>
      {item.text}
    </text>
  );
}
