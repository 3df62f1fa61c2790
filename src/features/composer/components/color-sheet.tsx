import { useState } from 'react';
import { parseColor } from '#shared/colour/css-color';
import { colorName } from '#shared/colour/name';
import type { Hex } from '#shared/model/ids';
import { NamedSwatch } from './named-swatch';

export interface ColorSheetProps {
  readonly heading: string;
  readonly value: Hex | null;
  readonly groups: readonly { readonly name: string; readonly colors: readonly Hex[] }[];
  readonly onChoose: (color: Hex) => void;
}

const HOW_TO_TYPE = 'Type a CSS colour, such as #1d4f5c or teal.';

/** Any colour for a mat or a page: those at hand first, then a typed one or the system's picker. */
export function ColorSheet({ heading, value, groups, onChoose }: ColorSheetProps) {
  const [typed, setTyped] = useState(value ?? '');
  const parsed = parseColor(typed);
  return (
    <div className="color-sheet">
      <h2>{heading}</h2>
      {groups
        .filter((group) => group.colors.length > 0)
        .map((group) => (
          <section key={group.name} aria-label={group.name}>
            <h3>{group.name}</h3>
            <ul>
              {group.colors.map((color) => (
                <li key={color}>
                  <button type="button" className="swatch" aria-pressed={color === value} onClick={() => onChoose(color)}>
                    <NamedSwatch color={color} />
                  </button>
                </li>
              ))}
            </ul>
          </section>
        ))}
      <form
        className="color-typed"
        onSubmit={(event) => {
          event.preventDefault();
          if (parsed) onChoose(parsed);
        }}
      >
        <input type="color" aria-label="Pick any colour" value={parsed ?? '#888888'} onChange={(event) => setTyped(event.target.value)} />
        <input
          type="text"
          className="field-input num"
          aria-label="Colour code"
          aria-invalid={typed !== '' && !parsed}
          value={typed}
          maxLength={40}
          spellCheck={false}
          onChange={(event) => setTyped(event.target.value)}
        />
        <button type="submit" className="btn" disabled={!parsed} title={parsed ? undefined : HOW_TO_TYPE}>
          Use
        </button>
      </form>
      <p className="color-words">{parsed ? colorName(parsed) : HOW_TO_TYPE}</p>
    </div>
  );
}
