import { useState } from 'react';
import { JOURNALING_MAX, LETTERING_MAX } from '#shared/contracts/document';
import type { Hex } from '#shared/model/ids';
import { inches, millimetres } from '#shared/model/length';
import type { Content, ContentKind, Mat, Pattern } from '#shared/model/spread';
import { formatLength, parseLength, type Unit } from '#shared/words/measure';
import { JournalingRoom, TitleRoom } from './text-room';

type Choice = Exclude<ContentKind, 'print' | 'pane'>;

const CHOICES: readonly { kind: Choice; label: string }[] = [
  { kind: 'bare', label: 'Nothing' },
  { kind: 'lettering', label: 'Title' },
  { kind: 'journaling', label: 'Journaling' },
  { kind: 'paper', label: 'Patterned paper' },
  { kind: 'embellishment', label: 'Embellishment' },
  { kind: 'keepsake', label: 'Keepsake' },
];
const PATTERNS: readonly Pattern[] = ['stripe', 'dot', 'check', 'plain'];

interface ContentSheetProps {
  readonly mat: Mat;
  readonly unit: Unit;
  /** A colour that reads on the mat, for new lettering and patterns. */
  readonly ink: Hex;
  readonly onChange: (content: Content) => void;
}

/** What a mat carries instead of a print. */
export function ContentSheet({ mat, unit, ink, onChange }: ContentSheetProps) {
  const { content } = mat;
  return (
    <div className="content-sheet">
      <h2>This mat carries</h2>
      <div className="content-choices" role="group" aria-label="What the mat carries">
        {CHOICES.map(({ kind, label }) => (
          <button key={kind} type="button" className="opt" aria-pressed={content.kind === kind} onClick={() => onChange(startOf(kind, ink, mat.color))}>
            {label}
          </button>
        ))}
      </div>
      {content.kind === 'lettering' && (
        <>
          <TextLines label="Words of the title" value={content.text} rows={2} max={LETTERING_MAX} onCommit={(text) => onChange({ ...content, text })} />
          <LengthField label="Letter height" value={content.letterHeight} unit={unit} onCommit={(letterHeight) => onChange({ ...content, letterHeight })} />
          <TitleRoom mat={mat} content={content} unit={unit} />
        </>
      )}
      {content.kind === 'journaling' && (
        <>
          <TextLines label="Who, when, where" value={content.text} rows={5} max={JOURNALING_MAX} onCommit={(text) => onChange({ ...content, text })} />
          <LengthField label="From line to line" value={content.lineHeight} unit={unit} onCommit={(lineHeight) => onChange({ ...content, lineHeight })} />
          <JournalingRoom mat={mat} content={content} />
        </>
      )}
      {content.kind === 'paper' && (
        <div className="content-choices" role="group" aria-label="Pattern">
          {PATTERNS.map((pattern) => (
            <button key={pattern} type="button" className="opt" aria-pressed={content.pattern === pattern} onClick={() => onChange({ ...content, pattern })}>
              {pattern}
            </button>
          ))}
        </div>
      )}
      {(content.kind === 'embellishment' || content.kind === 'keepsake') && (
        <TextLines label="What it is" value={content.name} rows={1} max={120} onCommit={(name) => name.trim() && onChange({ ...content, name: name.trim() })} />
      )}
      {content.kind === 'keepsake' && (
        <>
          <LengthField label="Width" value={content.width} unit={unit} onCommit={(width) => onChange({ ...content, width })} />
          <LengthField label="Height" value={content.height} unit={unit} onCommit={(height) => onChange({ ...content, height })} />
          <div className="content-choices">
            <button type="button" className="opt" aria-pressed={content.fragile} onClick={() => onChange({ ...content, fragile: !content.fragile })}>
              Fragile
            </button>
            <button type="button" className="opt" aria-pressed={content.acidic} onClick={() => onChange({ ...content, acidic: !content.acidic })}>
              Acidic
            </button>
          </div>
          {content.acidic && <p className="content-hint">Acidic paper yellows photos beside it: put it in a photo-safe sleeve.</p>}
        </>
      )}
    </div>
  );
}

function startOf(kind: Choice, ink: Hex, ground: Hex): Content {
  switch (kind) {
    case 'bare':
      return { kind };
    case 'lettering':
      return { kind, text: 'Title', color: ink, letterHeight: inches(5 / 8) };
    case 'journaling':
      return { kind, text: '', color: ink, lineHeight: inches(3 / 8) };
    case 'paper':
      return { kind, pattern: 'stripe', color: ink, ground };
    case 'embellishment':
      return { kind, name: 'Embellishment', color: ink };
    case 'keepsake':
      return { kind, name: 'Keepsake', width: inches(2), height: inches(1), thickness: millimetres(0.5), fragile: false, acidic: false };
  }
}

interface TextLinesProps {
  readonly label: string;
  readonly value: string;
  readonly rows: number;
  readonly max: number;
  readonly onCommit: (text: string) => void;
}

/** Text that becomes one edit when the field is left, not one per letter. */
function TextLines({ label, value, rows, max, onCommit }: TextLinesProps) {
  const [text, setText] = useState(value);
  return (
    <label className="content-field">
      {label}
      <textarea
        className="field-input content-text"
        rows={rows}
        maxLength={max}
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={() => text !== value && onCommit(text)}
      />
    </label>
  );
}

interface LengthFieldProps {
  readonly label: string;
  readonly value: number;
  readonly unit: Unit;
  readonly onCommit: (length: number) => void;
}

const LONGEST = inches(24);

/** A length in inches (with fractions, as on a ruler) or millimetres, taken over when the field is left. */
function LengthField({ label, value, unit, onCommit }: LengthFieldProps) {
  const [text, setText] = useState(formatLength(value, unit));
  const length = parseLength(text, unit);
  const isGood = length !== null && length > 0 && length <= LONGEST;
  const commit = (): void => {
    // What is shown may be rounded: only a changed text is a changed length.
    if (isGood && text !== formatLength(value, unit)) onCommit(length);
  };
  return (
    <label className="content-field is-row">
      {label}
      <input
        className="field-input num"
        aria-invalid={!isGood}
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => event.key === 'Enter' && commit()}
      />
      <span className="num">{unit}</span>
    </label>
  );
}
