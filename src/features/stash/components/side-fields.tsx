import { parseColor } from '#shared/colour/css-color';
import { MAX_PALETTE, SIDE_PATTERNS, type SidePattern, type StashSide } from '#shared/model/stash';
import { useState } from 'react';
import { Field, TextField } from '@/components/field';
import { PATTERN_WORDS } from '../model/sheet-words';
import { ColorField } from './color-field';

interface SideFieldsProps {
  readonly legend: string;
  readonly studioId: string;
  readonly side: StashSide;
  readonly onChange: (side: StashSide) => void;
  readonly onRemove?: () => void;
}

/** One face of a sheet: its colour, and its pattern with the colours in it. */
export function SideFields({ legend, studioId, side, onChange, onRemove }: SideFieldsProps) {
  return (
    <fieldset className="side-fields">
      <legend>
        {legend}
        {onRemove && (
          <button type="button" className="link-button" onClick={onRemove}>
            same as the front
          </button>
        )}
      </legend>
      <ColorField label={side.pattern === 'plain' ? 'Colour' : 'Ground'} studioId={studioId} side={side} onChange={onChange} isVerbose />
      <Field label="Look">
        {(control) => (
          <select
            {...control}
            className="field-input"
            value={side.pattern}
            onChange={(event) => {
              const pattern = event.target.value as SidePattern;
              onChange({ ...side, pattern, palette: pattern === 'plain' ? [] : side.palette });
            }}
          >
            {SIDE_PATTERNS.map((pattern) => (
              <option key={pattern} value={pattern}>
                {PATTERN_WORDS[pattern]}
              </option>
            ))}
          </select>
        )}
      </Field>
      {side.pattern !== 'plain' && <PaletteField palette={side.palette} onChange={(palette) => onChange({ ...side, palette })} />}
    </fieldset>
  );
}

/** The further colours of a pattern, typed with commas or spaces between them. */
function PaletteField({ palette, onChange }: { readonly palette: readonly string[]; readonly onChange: (palette: readonly string[]) => void }) {
  const [typed, setTyped] = useState(palette.join(', '));
  const colors = typed.split(/[,;]\s*|\s+/).filter(Boolean).map(parseColor);
  const isWrong = colors.includes(null) || colors.length > MAX_PALETTE;
  return (
    <TextField
      className="is-wide"
      label="Its other colours"
      value={typed}
      maxLength={160}
      spellCheck={false}
      error={isWrong ? `Write up to ${MAX_PALETTE} colours such as #1d4f5c or teal, with commas between them.` : undefined}
      hint="The most seen first"
      onChange={({ target }) => {
        setTyped(target.value);
        const read = target.value.split(/[,;]\s*|\s+/).filter(Boolean).map(parseColor).filter((hex) => hex !== null);
        onChange(read.slice(0, MAX_PALETTE));
      }}
    />
  );
}
