import { use, useState, type ReactNode } from 'react';
import type { PictureSize } from '#shared/contracts/prints';
import { pictureUrl } from '#shared/contracts/prints';
import { inverseTurn, turnedSize } from '#shared/geometry/paper';
import type { Turns } from '#shared/model/ids';
import type { Rect } from '#shared/model/rect';
import { PHOTO_PAPER, pictureCover, type PictureCover } from '#shared/scene/picture-cover';
import type { PhotoItem } from '#shared/scene/scene';
import { onPixels } from './on-pixels';
import { PictureSourceContext } from './picture-source';

/** Blank paper, off white. */
const BLANK = 'var(--color-paper-2, #f4f2ea)';

interface PhotoDrawingProps {
  readonly photo: PhotoItem;
  readonly scale: number | null;
  readonly pictureSize: PictureSize;
}

/** A piece of a print: white paper where the picture does not reach, the picture, or a struck-out paper where it cannot be had. */
export function PhotoDrawing({ photo, scale, pictureSize }: PhotoDrawingProps) {
  const href = pictureUrl(photo.printId, pictureSize);
  const [missing, setMissing] = useState<string | null>(null);
  const [loaded, setLoaded] = useState<string | null>(null);
  const drawn = use(PictureSourceContext)?.(photo) ?? null;
  const paper = onPixels(photo.rect, scale);
  if (missing === href) return <MissingPhoto rect={paper} />;
  const cover = pictureCover(photo);
  // Until its picture is there, a photo is blank paper: a mat that carries one never looks bare.
  const isBlank = cover !== null && drawn === null && loaded !== href;
  return (
    <>
      {!cover?.isWhole && <rect {...paper} fill={PHOTO_PAPER} shapeRendering="crispEdges" />}
      {isBlank && <rect {...onPixels(cover.rect, scale)} fill={BLANK} data-state="photo-loading" shapeRendering="crispEdges" />}
      {cover && (
        <Picture photo={photo} cover={cover} scale={scale}>
          {drawn ?? (
            <image
              href={href}
              width={photo.imageWidth}
              height={photo.imageHeight}
              preserveAspectRatio="none"
              onLoad={() => setLoaded(href)}
              onError={() => setMissing(href)}
            />
          )}
        </Picture>
      )}
    </>
  );
}

interface PictureProps {
  readonly photo: PhotoItem;
  readonly cover: PictureCover;
  readonly scale: number | null;
  /** In pixels of the oriented original. */
  readonly children: ReactNode;
}

function Picture({ photo, cover, scale, children }: PictureProps) {
  const rect = onPixels(cover.rect, scale);
  const box = turnedSize(rect, inverseTurn(photo.turns));
  const { x, y, width, height } = cover.source;
  if (rect.width <= 0 || rect.height <= 0) return null;
  return (
    <g transform={turnInto(rect, photo.turns)}>
      <svg width={box.width} height={box.height} viewBox={`${x} ${y} ${width} ${height}`} preserveAspectRatio="none">
        {children}
      </svg>
    </g>
  );
}

/** Maps an upright box at the origin onto `rect`, turned clockwise by quarter-turns. */
function turnInto({ x, y, width, height }: Rect, turns: Turns): string {
  switch (turns) {
    case 0:
      return `translate(${x} ${y})`;
    case 1:
      return `matrix(0 1 -1 0 ${x + width} ${y})`;
    case 2:
      return `matrix(-1 0 0 -1 ${x + width} ${y + height})`;
    case 3:
      return `matrix(0 -1 1 0 ${x} ${y + height})`;
  }
}

/** Paper with one diagonal. */
function MissingPhoto({ rect }: { readonly rect: Rect }) {
  const { x, y, width, height } = rect;
  return (
    <g data-state="photo-missing">
      <rect {...rect} fill={BLANK} />
      <path d={`M${x} ${y + height}l${width} ${-height}`} stroke="var(--color-ink-3, #565b66)" strokeWidth={1} vectorEffect="non-scaling-stroke" />
    </g>
  );
}
