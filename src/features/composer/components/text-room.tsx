import { fitTitle, letterCounts } from '#shared/lettering/title-letters';
import { journalingRoom } from '#shared/lettering/journaling-room';
import { contentRect } from '#shared/geometry/grid';
import type { Content, Mat } from '#shared/model/spread';
import { formatLength, type Unit } from '#shared/words/measure';
import { useComposer } from '@/features/composer/hooks/composer-context';

interface TextRoomProps {
  readonly mat: Mat;
  readonly unit: Unit;
}

/** How wide the title is in letters of this height, whether its mat holds it, and how many of each letter to cut. */
export function TitleRoom({ mat, content, unit }: TextRoomProps & { readonly content: Extract<Content, { kind: 'lettering' }> }) {
  const place = usePlace(mat);
  const { width, height, fits } = fitTitle(content, place);
  const letters = letterCounts(content.text);
  if (letters.length === 0) return null;
  return (
    <div className="text-room">
      <p>
        {fits ? 'Takes' : 'Too large: takes'}{' '}
        <span className="num">
          {formatLength(width, unit)} × {formatLength(height, unit)}
        </span>{' '}
        of{' '}
        <span className="num">
          {formatLength(place.width, unit)} × {formatLength(place.height, unit)} {unit}
        </span>
        .
      </p>
      <p>Letters to cut: {letters.reduce((sum, { count }) => sum + count, 0)}</p>
      <ul className="letter-counts">
        {letters.map(({ letter, count }) => (
          <li key={letter}>
            <span>{letter}</span> <b className="num">{count}</b>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** How many words the mat's lines hold in this hand, and how many are written. */
export function JournalingRoom({ mat, content }: Pick<TextRoomProps, 'mat'> & { readonly content: Extract<Content, { kind: 'journaling' }> }) {
  const { words, capacity, fits } = journalingRoom(content, usePlace(mat));
  return (
    <p className="text-room">
      {fits ? `Holds about ${capacity} ${capacity === 1 ? 'word' : 'words'} in this hand; ${words} written.` : `Too long: ${words} words are written, and the lines hold about ${capacity}.`}
    </p>
  );
}

function usePlace(mat: Mat) {
  const format = useComposer((state) => state.doc.format);
  const reveal = useComposer((state) => state.doc.reveal);
  return contentRect(format, reveal, mat);
}
