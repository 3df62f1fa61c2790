import { lazy, Suspense, useState } from 'react';
import { parseColor } from '#shared/colour/css-color';
import { colorName } from '#shared/colour/name';
import type { StashSide } from '#shared/model/stash';
import { Button } from '@/components/button';
import { Field } from '@/components/field';
import { sureness, withColor } from '../model/sheet-words';

// The photo's marks and their keys are worth fetching only for those who read a colour.
const ColorReadingDialog = lazy(async () => ({ default: (await import('./color-reading-dialog')).ColorReadingDialog }));

interface ColorFieldProps {
  readonly label: string;
  readonly studioId: string;
  readonly side: StashSide;
  readonly onChange: (side: StashSide) => void;
  /** Say under the field how the colour is known. */
  readonly isVerbose?: boolean;
}

/** A sheet's colour: picked by eye, typed as any CSS colour, or read from a photo. */
export function ColorField({ label, studioId, side, onChange, isVerbose = false }: ColorFieldProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const [isReading, setIsReading] = useState(false);
  const isWrong = typed !== null && parseColor(typed) === null;
  const type = (text: string): void => {
    setTyped(text);
    const hex = parseColor(text);
    if (hex !== null) onChange(withColor(side, hex, 'typed'));
  };
  const set = (next: StashSide): void => {
    setTyped(null);
    onChange(next);
  };
  return (
    <>
      <Field
        label={label}
        error={isWrong && typed !== '' ? 'This is no colour yet: write #1d4f5c, teal, or rgb(29 79 92).' : undefined}
        hint={isVerbose ? `${colorName(side.hex)}: ${sureness(side)}` : undefined}
      >
        {(control) => (
          <span className="color-field">
            <input
              type="color"
              aria-label={`${label}: pick by eye`}
              title="Pick by eye"
              value={side.hex}
              onChange={(event) => set(withColor(side, event.target.value, 'picked'))}
            />
            <input type="text" {...control} className="field-input" value={typed ?? side.hex} spellCheck={false} autoComplete="off" maxLength={60} onChange={(event) => type(event.target.value)} onBlur={() => !isWrong && setTyped(null)} />
            <Button onClick={() => setIsReading(true)}>From a photo</Button>
          </span>
        )}
      </Field>
      {isReading && (
        <Suspense fallback={null}>
          <ColorReadingDialog
            studioId={studioId}
            onClose={() => setIsReading(false)}
            onRead={({ hex, uncertainty }) => {
              set({ ...side, hex, uncertainty, source: 'photographed' });
              setIsReading(false);
            }}
          />
        </Suspense>
      )}
    </>
  );
}
