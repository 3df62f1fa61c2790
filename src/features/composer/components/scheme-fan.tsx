import { useState } from 'react';
import type { PlacedScheme } from '#shared/colour/suggest-placed';
import { runCommand } from '#shared/commands/run-command';
import { applyPatch } from '#shared/model/patch';
import type { Scheme, SchemeRole, SpreadDocument } from '#shared/model/spread';
import { newId } from '@/lib/ids';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import { useSchemes } from '@/features/composer/hooks/use-schemes';
import { withColorsOf } from '@/features/composer/model/with-colors-of';
import { SCHEME_NAMES, SchemeBlock } from './scheme-block';

/** Another look of the spread, shown while it is compared. */
export interface Comparison {
  readonly doc: SpreadDocument;
  readonly words: string;
}

interface SchemeFanProps {
  readonly isEditable: boolean;
  /** Something is in the hand: what lies under it is only a preview, and no scheme is made from it. */
  readonly isHeld: boolean;
  readonly onSources: (printIds: readonly string[] | null) => void;
  readonly onCompare: (comparison: Comparison | null) => void;
}

/** The three schemes for the prints on this spread, each applied at one press. */
export function SchemeFan({ isEditable, isHeld, onSources, onCompare }: SchemeFanProps) {
  const store = useComposerStore();
  const [withSkin, setWithSkin] = useState(false);
  const { suggestions, place } = useSchemes(withSkin, isHeld);
  const inUse = useComposer((state) => state.doc.scheme);
  /** The last scheme used here, and the spread before it. */
  const [before, setBefore] = useState<{ readonly scheme: Scheme; readonly doc: SpreadDocument } | null>(null);
  const apply = async (scheme: Scheme): Promise<void> => {
    const args = await place(scheme);
    const { doc, run } = store.getState();
    if (run({ id: 'scheme.apply', args })) setBefore({ scheme, doc });
  };
  const compare = ({ scheme, args }: PlacedScheme, isShown: boolean): void => {
    const { doc, prints, trim } = store.getState();
    const name = SCHEME_NAMES[scheme.character];
    if (!isShown) onCompare(null);
    else if (doc.scheme && sameColors(doc.scheme, scheme) && before) onCompare({ doc: withColorsOf(doc, before.doc), words: `Before ${name}` });
    else onCompare({ doc: applyPatch(doc, runCommand(doc, { id: 'scheme.apply', args }, { prints, trim, newId })), words: `${name}, not in use` });
  };
  return (
    <section className="scheme-fan" aria-label="Colour schemes" aria-busy={suggestions === null}>
      {suggestions?.length === 0 && <p className="scheme-none">Put prints on this spread, and three schemes of card colours come from them.</p>}
      {suggestions?.map((suggestion) => (
        <SchemeBlock
          key={suggestion.scheme.character}
          suggestion={suggestion}
          isInUse={inUse !== null && sameColors(inUse, suggestion.scheme)}
          hasBefore={before !== null && sameColors(before.scheme, suggestion.scheme)}
          isEditable={isEditable}
          onApply={(scheme) => void apply(scheme)}
          onCompare={compare}
          onSources={onSources}
        />
      ))}
      <div className="scheme-foot">
        <label title="Skin makes pale or flushed card, so its colours are left out unless you ask">
          <input type="checkbox" checked={withSkin} onChange={(event) => setWithSkin(event.target.checked)} /> Skin tones too
        </label>
        <p className="scheme-last-word">Hold the sheet to the print by a window.</p>
      </div>
    </section>
  );
}

const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];
const sameColors = (a: Scheme, b: Scheme): boolean => ROLES.every((role) => a.colors[role].hex === b.colors[role].hex);
