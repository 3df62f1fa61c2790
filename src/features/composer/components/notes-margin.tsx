import { useLayoutEffect, useRef, useState } from 'react';
import { Link } from 'react-router-dom';
import type { Note } from '#shared/checks/check';
import type { CheckId } from '#shared/checks/check-ids';
import { SEVERITY_WORDS, noteSentence, remedyLabel } from '#shared/words/en/notes';
import type { Unit } from '#shared/words/measure';
import { SeverityMark } from '@/components/severity-mark';
import { NoteMenu } from './note-menu';
import { layOutNotes, leaderPath, type Anchor, type NotePlace } from '@/features/composer/canvas/note-layout';

interface NotesMarginProps {
  side: 'left' | 'right';
  notes: readonly Note[];
  unit: Unit;
  width: number;
  /** Left edge of the margin in px, from the same origin as the anchors. */
  x: number;
  bounds: { top: number; bottom: number };
  anchor: (matId: string) => Anchor | undefined;
  isEditable: boolean;
  onRemedy: (note: Note) => void;
  onLimit: (checkId: CheckId) => void;
  onMark: (matIds: readonly string[] | null) => void;
}

const ESTIMATED_HEIGHT = 96;

/** One margin's notes in blue pencil, each beside its mat with a thin leader. */
export function NotesMargin({ side, notes, unit, width, x, bounds, anchor, isEditable, onRemedy, onLimit, onMark }: NotesMarginProps) {
  const [heights, setHeights] = useState<Readonly<Record<string, number>>>({});
  const [hovered, setHovered] = useState<string | null>(null);
  const [isUnfolded, setIsUnfolded] = useState(false);
  const list = useRef<HTMLOListElement>(null);
  useLayoutEffect(() => {
    const measured: Record<string, number> = {};
    for (const node of list.current?.children ?? []) measured[(node as HTMLElement).dataset.key ?? ''] = (node as HTMLElement).offsetHeight;
    if (Object.entries(measured).some(([key, height]) => heights[key] !== height)) setHeights((old) => ({ ...old, ...measured }));
  }, [notes, width, heights]);

  const { placed, folded } = layOutNotes(notes, anchor, (note) => heights[note.key] ?? ESTIMATED_HEIGHT, bounds);
  const mark = (note: Note | null): void => {
    setHovered(note?.key ?? null);
    onMark(note?.matIds ?? null);
  };
  const lineStart = side === 'left' ? x + width : x - 4;
  return (
    <>
      <svg className="leaders" aria-hidden="true">
        {placed.map(({ note, ring, top }) => ring && <Leader key={note.key} note={note} ring={ring} from={{ x: lineStart, y: top + 9 }} isThick={hovered === note.key} />)}
      </svg>
      <ol ref={list} className="notes" aria-label={`Notes on the ${side} page`}>
        {placed.map((place) => (
          <NoteItem key={place.note.key} place={place} x={x} width={width} unit={unit} isEditable={isEditable} onRemedy={onRemedy} onLimit={onLimit} onHover={mark} />
        ))}
      </ol>
      {folded.length > 0 && (
        <div className={`folded-notes is-${side}`} style={{ left: x, top: bounds.bottom + 4, width }}>
          <button type="button" className="link-button" aria-expanded={isUnfolded} onClick={() => setIsUnfolded(!isUnfolded)}>
            {folded.length} more
          </button>
          {isUnfolded && (
            <ul className="folded-list">
              {folded.map((note) => (
                <li key={note.key}>
                  <b>{SEVERITY_WORDS[note.severity]}.</b> {noteSentence(note, unit)}
                </li>
              ))}
            </ul>
          )}
        </div>
      )}
    </>
  );
}

function Leader({ note, ring, from, isThick }: { note: Note; ring: { x: number; y: number }; from: { x: number; y: number }; isThick: boolean }) {
  const kind = note.severity === 'stop' ? 'is-stop' : '';
  return (
    <g className={`${kind} ${isThick ? 'is-thick' : ''}`}>
      <path d={leaderPath(from, ring)} />
      <circle cx={ring.x} cy={ring.y} r="3" />
    </g>
  );
}

interface NoteItemProps {
  place: NotePlace;
  x: number;
  width: number;
  unit: Unit;
  isEditable: boolean;
  onRemedy: (note: Note) => void;
  onLimit: (checkId: CheckId) => void;
  onHover: (note: Note | null) => void;
}

function NoteItem({ place: { note, top }, x, width, unit, isEditable, onRemedy, onLimit, onHover }: NoteItemProps) {
  return (
    <li
      data-key={note.key}
      className={`note is-${note.severity}`}
      style={{ left: x, top, width }}
      onPointerEnter={() => onHover(note)}
      onPointerLeave={() => onHover(null)}
      onFocus={() => onHover(note)}
      onBlur={() => onHover(null)}
    >
      {isEditable && <NoteMenu checkId={note.checkId} onLimit={onLimit} />}
      <NoteText note={note} unit={unit} />
      {note.remedy && isEditable && (
        <button type="button" className="remedy" onClick={() => onRemedy(note)}>
          {remedyLabel(note.remedy, unit)}
        </button>
      )}
    </li>
  );
}

/** Mark, severity and sentence of one note. */
export function NoteText({ note, unit }: { note: Note; unit: Unit }) {
  return (
    <>
      <h2 className="note-severity">
        <SeverityMark severity={note.severity} />
        {SEVERITY_WORDS[note.severity]}
      </h2>
      <p>
        {noteSentence(note, unit)}{' '}
        <Link className="note-why" to={`/help/checks/${note.checkId}`} target="_blank" aria-label={`Why? ${noteSentence(note, unit)} Opens in a new tab.`}>
          Why
        </Link>
      </p>
    </>
  );
}
