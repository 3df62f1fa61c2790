import { useDeferredValue, useEffect, useMemo, useState } from 'react';
import { colorName } from '#shared/colour/name';
import { placeScheme, suggestSchemes } from '#shared/colour/schemes';
import { visibleShares } from '#shared/colour/shares';
import { applyPatch } from '#shared/model/patch';
import type { Scheme, SchemeRole, SpreadDocument } from '#shared/model/spread';
import { runCommand } from '#shared/commands/run-command';
import { newId } from '@/lib/ids';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';

const CHARACTER_WORDS = { echo: 'what is in the photos', quiet: 'photos lead', lift: 'one across the wheel' } as const;
const NAMES = { echo: 'Echo', quiet: 'Quiet', lift: 'Lift' } as const;
const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];
const ROLE_WORDS = { base: 'page', main: 'main mat', second: 'second mat', accent: 'accent' } as const;

/** A colour that hardly shows still has a chip that can be pointed at. */
const chipWidth = (share: number): number => Math.max(share, 0.08);

interface Suggestion {
  readonly scheme: Scheme;
  readonly shares: Readonly<Record<SchemeRole, number>>;
}

interface SchemeFanProps {
  readonly isEditable: boolean;
  /** Something is in the hand: what lies under it is only a preview, and no scheme is made from it. */
  readonly isHeld: boolean;
  readonly onSources: (printIds: readonly string[] | null) => void;
}

/** The three schemes for the prints on this spread, each applied at one press. */
export function SchemeFan({ isEditable, isHeld, onSources }: SchemeFanProps) {
  const store = useComposerStore();
  const settled = useSettledDocument(isHeld);
  const prints = useComposer((state) => state.prints);
  const inUse = useComposer((state) => state.doc.scheme);
  const suggestions = useMemo(
    () => suggestSchemes({ doc: settled, prints }).map((scheme): Suggestion => ({ scheme, shares: sharesOf(settled, scheme, store) })),
    [settled, prints, store],
  );
  const apply = (scheme: Scheme): void => {
    const { run, ...state } = store.getState();
    run({ id: 'scheme.apply', args: placeScheme(state, scheme) });
  };
  return (
    <section className="scheme-fan" aria-label="Colour schemes">
      {suggestions.length === 0 && <p className="scheme-none">Put prints on this spread, and three schemes of card colours come from them.</p>}
      {suggestions.map((suggestion) => (
        <SchemeBlock
          key={suggestion.scheme.character}
          suggestion={suggestion}
          isInUse={inUse !== null && sameColors(inUse, suggestion.scheme)}
          isEditable={isEditable}
          onApply={apply}
          onSources={onSources}
        />
      ))}
      {suggestions.length > 0 && <p className="scheme-last-word">Hold the sheet to the print by a window before you cut.</p>}
    </section>
  );
}

interface SchemeBlockProps {
  suggestion: Suggestion;
  isInUse: boolean;
  isEditable: boolean;
  onApply: (scheme: Scheme) => void;
  onSources: (printIds: readonly string[] | null) => void;
}

function SchemeBlock({ suggestion: { scheme, shares }, isInUse, isEditable, onApply, onSources }: SchemeBlockProps) {
  const { character } = scheme;
  const titles = useComposer((state) => state.prints);
  const sourceTitles = (ids: readonly string[]): string =>
    ids.length === 0 ? 'in none of the photos' : `from ${ids.slice(0, 3).map((id) => titles.get(id)?.title ?? 'a print').join(', ')}`;
  return (
    <div className={`scheme is-${character} ${isInUse ? 'is-in-use' : ''}`}>
      <h2>
        {NAMES[character]} <span>{CHARACTER_WORDS[character]}</span>
        {isInUse ? (
          <em>in use</em>
        ) : (
          isEditable && (
            <button type="button" className="scheme-use" onClick={() => onApply(scheme)}>
              Use<span className="sr-only"> {NAMES[character]}</span>
            </button>
          )
        )}
      </h2>
      <ul className="scheme-chips">
        {ROLES.map((role, i) => {
          const color = scheme.colors[role];
          const label = `${colorName(color.hex)}, ${ROLE_WORDS[role]}, ${Math.round(shares[role] * 100)}% of the card, ${sourceTitles(color.printIds)}`;
          return (
            <li key={role} style={{ flexGrow: chipWidth(shares[role]) }}>
              <button
                type="button"
                className="chip"
                aria-label={label}
                title={label}
                style={{ background: color.hex, height: (character === 'echo' ? 34 : 22) - i * 3 }}
                onPointerEnter={() => onSources(color.printIds)}
                onPointerLeave={() => onSources(null)}
                onFocus={() => onSources(color.printIds)}
                onBlur={() => onSources(null)}
              />
            </li>
          );
        })}
      </ul>
      {character === 'echo' && (
        <ul className="chip-words" aria-hidden="true">
          {ROLES.map((role) => (
            <li key={role}>
              <b>{colorName(scheme.colors[role].hex)}</b>
              <span className="num">{Math.round(shares[role] * 100)}%</span>
            </li>
          ))}
        </ul>
      )}
      {character !== 'echo' && (
        <p className="num scheme-shares" aria-hidden="true">
          {ROLES.map((role) => Math.round(shares[role] * 100)).join(', ')}%
        </p>
      )}
    </div>
  );
}

/** Shares of visible card as they would be with the scheme applied. */
function sharesOf(doc: SpreadDocument, scheme: Scheme, store: ReturnType<typeof useComposerStore>): Readonly<Record<SchemeRole, number>> {
  const { prints, trim } = store.getState();
  const context = { prints, trim, newId };
  const applied = applyPatch(doc, runCommand(doc, { id: 'scheme.apply', args: placeScheme({ doc, prints, trim }, scheme) }, context));
  return visibleShares(applied, scheme);
}

const sameColors = (a: Scheme, b: Scheme): boolean => ROLES.every((role) => a.colors[role].hex === b.colors[role].hex);

/** The document as it stood when the hand last rested: schemes are not worth a dropped frame. */
function useSettledDocument(isHeld: boolean): SpreadDocument {
  const doc = useComposer((state) => state.doc);
  const [settled, setSettled] = useState(doc);
  useEffect(() => {
    if (isHeld) return undefined;
    const timer = setTimeout(() => setSettled(doc), 250);
    return () => clearTimeout(timer);
  }, [doc, isHeld]);
  return useDeferredValue(settled);
}
