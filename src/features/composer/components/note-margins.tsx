import { lazy, Suspense, useState } from 'react';
import type { Note } from '#shared/checks/check';
import type { CheckId } from '#shared/checks/check-ids';
import { SIDES } from '#shared/model/ids';
import type { Unit } from '#shared/words/measure';
import type { Anchor } from '@/features/composer/canvas/note-layout';
import { useFoldedNotes } from '@/features/composer/hooks/use-folded-notes';
import { useSteadyNotes } from '@/features/composer/hooks/use-steady-notes';
import { NotesMargin } from './notes-margin';
import { NotesTally } from './notes-tally';

interface NoteMarginsProps {
  readonly found: readonly Note[];
  /** Something is in the hand, so that notes must not flicker. */
  readonly isHeld: boolean;
  readonly unit: Unit;
  /** Width of a margin, and of the spread between them, in px. */
  readonly margin: number;
  readonly size: { readonly width: number; readonly height: number };
  readonly anchor: (matId: string) => Anchor | undefined;
  readonly isEditable: boolean;
  readonly onRemedy: (note: Note) => void;
  readonly onMark: (matIds: readonly string[] | null) => void;
}

// Asked for now and then: fetched when it is.
const CheckLimitDialog = lazy(async () => ({ default: (await import('./check-limit-dialog')).CheckLimitDialog }));

const NOTE_GUTTER = 20;
const SCREEN_EDGE = 16;
/** What stands under the notes, in px: the line for folded ones, and on the left the tally that reaches up to the page. */
const FOLDED_HEIGHT = 18;
const TALLY_HEIGHT = 36;

/** What the checks say, in both margins, and their tally under the left one. */
export function NoteMargins({ found, isHeld, unit, margin, size, anchor, isEditable, onRemedy, onMark }: NoteMarginsProps) {
  const notes = useSteadyNotes(found, isHeld);
  const [isFolded, setIsFolded] = useFoldedNotes();
  const [limitOf, setLimitOf] = useState<CheckId | null>(null);
  const shown = isFolded ? notes.filter(({ severity }) => severity !== 'consider') : notes;
  const width = margin - 36;
  return (
    <>
      {SIDES.map((side) => (
        <NotesMargin
          key={side}
          side={side}
          notes={shown.filter((note) => note.page === side)}
          unit={unit}
          width={width}
          x={side === 'left' ? SCREEN_EDGE - margin : size.width + NOTE_GUTTER}
          bounds={{ top: 0, bottom: size.height - (side === 'left' ? TALLY_HEIGHT : FOLDED_HEIGHT) }}
          anchor={anchor}
          isEditable={isEditable}
          onRemedy={onRemedy}
          onLimit={setLimitOf}
          onMark={onMark}
        />
      ))}
      <NotesTally
        x={SCREEN_EDGE - margin}
        width={width}
        noteCount={notes.length}
        considerCount={notes.filter(({ severity }) => severity === 'consider').length}
        isFolded={isFolded}
        isEditable={isEditable}
        onFold={setIsFolded}
      />
      <Suspense fallback={null}>{limitOf && <CheckLimitDialog checkId={limitOf} onClose={() => setLimitOf(null)} />}</Suspense>
    </>
  );
}
