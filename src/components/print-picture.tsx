import { memo, useState, type CSSProperties } from 'react';
import { pictureUrl, type PictureSize } from '#shared/contracts/prints';
import { turnedSize } from '#shared/geometry/paper';
import { toInches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import { printAngle } from '@/lib/print-angle';

export type PicturedPrint = Pick<
  Print,
  'id' | 'title' | 'paperWidth' | 'paperHeight' | 'paperRect' | 'imageWidth' | 'imageHeight' | 'turns' | 'marks'
>;

interface PrintPictureProps {
  readonly print: PicturedPrint;
  readonly pictureSize?: PictureSize;
  /** Pixels per inch; left out, the table's `--u` counts. */
  readonly pxPerInch?: number;
  /** `gone`: only its dashed place on the table. `hand`: lifted. */
  readonly state?: 'rest' | 'gone' | 'hand';
  /** Lie a little askew, as prints on a table do; always by the same angle. */
  readonly isTilted?: boolean;
  /** Leave the name out where it stands beside the picture. */
  readonly decorative?: boolean;
  readonly className?: string;
}

/**
 * One print as a piece of paper at physical scale, upright. The picture lies on it as the paper rectangle
 * says, so that a white border or an instant film's frame shows as bare paper.
 */
export const PrintPicture = memo(function PrintPicture({
  print,
  pictureSize = 'small',
  pxPerInch,
  state = 'rest',
  isTilted = false,
  decorative = false,
  className = '',
}: PrintPictureProps) {
  const [loading, setLoading] = useState<'loading' | 'shown' | 'missing'>('loading');
  const { paperRect, imageWidth, imageHeight, turns } = print;
  const paper = { width: toInches(print.paperWidth), height: toInches(print.paperHeight) };
  const frame = turnedSize(paper, turns);
  const style = {
    '--pw': paper.width,
    '--ph': paper.height,
    ...(pxPerInch !== undefined && { '--u': `${pxPerInch}px` }),
    ...(isTilted && { rotate: `${printAngle(print.id)}deg` }),
  } as CSSProperties;
  return (
    <div
      className={`print ${state === 'hand' ? 'print-in-hand' : ''} ${className}`}
      style={style}
      data-state={state === 'gone' ? 'gone' : loading}
      data-digital={print.marks.digital}
    >
      {state !== 'gone' && (
        <div
          className="absolute top-1/2 left-1/2 overflow-hidden"
          style={{
            width: `${(frame.width / paper.width) * 100}%`,
            height: `${(frame.height / paper.height) * 100}%`,
            transform: `translate(-50%, -50%) rotate(${turns * 90}deg)`,
          }}
        >
          <img
            src={pictureUrl(print.id, pictureSize)}
            alt={decorative ? '' : print.title}
            draggable={false}
            decoding="async"
            onLoad={() => setLoading('shown')}
            onError={() => setLoading('missing')}
            className={`absolute max-w-none ${loading === 'missing' ? 'invisible' : ''}`}
            style={{
              left: `${(-paperRect.x / paperRect.width) * 100}%`,
              top: `${(-paperRect.y / paperRect.height) * 100}%`,
              width: `${(imageWidth / paperRect.width) * 100}%`,
              height: `${(imageHeight / paperRect.height) * 100}%`,
            }}
          />
        </div>
      )}
    </div>
  );
});
