import { memo } from 'react';
import type { PictureSize } from '#shared/contracts/prints';
import { drawAlike } from '#shared/scene/mat-groups';
import { baselineOnPixels } from '#shared/scene/pixels';
import type { FontId, SceneItem, TextItem } from '#shared/scene/scene';
import { framePath, lineOnPixels, onPixels } from './on-pixels';
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
      return <rect {...(item.isLine ? lineOnPixels : onPixels)(item.rect, scale)} fill={item.fill} opacity={item.opacity} shapeRendering="crispEdges" />;
    case 'frame':
      return isMini ? null : (
        <path d={framePath(item.rect, item.thickness, scale)} fill={item.fill} opacity={item.opacity} shapeRendering="crispEdges" />
      );
    case 'circle':
      return <circle cx={item.cx} cy={item.cy} r={item.r} fill={item.fill} />;
    case 'photo':
      return <PhotoDrawing photo={item} scale={scale} pictureSize={pictureSize} />;
    case 'text':
      return <TextDrawing item={item} scale={scale} />;
  }
}

const FONTS: Readonly<Record<FontId, { readonly fontFamily: string; readonly fontStyle?: 'italic' }>> = {
  'young-serif': { fontFamily: '"Young Serif", serif' },
  atkinson: { fontFamily: '"Atkinson Next", sans-serif' },
  'atkinson-italic': { fontFamily: '"Atkinson Next", sans-serif', fontStyle: 'italic' },
};

/** Every glyph stands where the scene says; the browser neither kerns nor joins letters by itself. */
const PLAIN_GLYPHS = { fontKerning: 'none', fontVariantLigatures: 'none', fontWeight: 400, letterSpacing: 'normal', wordSpacing: 'normal' } as const;

/** Browsers clamp font sizes (Chromium to 10000 px, from memory), which 2 in letters in 1/160 mm would pass. */
const TEXT_UNIT = 20;

function TextDrawing({ item, scale }: { readonly item: TextItem; readonly scale: number | null }) {
  const baseline = scale === null ? item.baseline : baselineOnPixels(item.baseline, scale);
  return (
    <text
      transform={`scale(${TEXT_UNIT})`}
      x={item.xs.map((x) => x / TEXT_UNIT).join(' ')}
      y={baseline / TEXT_UNIT}
      fontSize={item.size / TEXT_UNIT}
      fill={item.fill}
      textRendering="geometricPrecision"
      style={{ ...PLAIN_GLYPHS, ...FONTS[item.font] }}
    >
      {item.text}
    </text>
  );
}
