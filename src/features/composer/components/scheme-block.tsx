import { useState } from 'react';
import { colorName } from '#shared/colour/name';
import type { PlacedScheme } from '#shared/colour/suggest-placed';
import type { Scheme, SchemeRole } from '#shared/model/spread';
import { useAnnounce } from '@/components/live-region';
import { useComposer } from '@/features/composer/hooks/composer-context';
import { holdHandlers } from '@/features/composer/hooks/hold-handlers';
import { SchemeStash } from './scheme-stash';

const CHARACTER_WORDS = { echo: 'what is in the photos', quiet: 'photos lead', lift: 'one across the wheel' } as const;
export const SCHEME_NAMES = { echo: 'Echo', quiet: 'Quiet', lift: 'Lift' } as const;
const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];
const ROLE_WORDS = { base: 'page', main: 'main mat', second: 'second mat', accent: 'accent' } as const;

/** A colour that hardly shows still has a chip that can be pointed at. */
const chipWidth = (share: number): number => Math.max(share, 0.08);
const percent = (share: number): number => Math.round(share * 100);

interface SchemeBlockProps {
  readonly suggestion: PlacedScheme;
  readonly isInUse: boolean;
  readonly isEditable: boolean;
  /** What it looked like before this scheme was used is still known. */
  readonly hasBefore: boolean;
  readonly onApply: (scheme: Scheme) => void;
  /** Shows the spread in this scheme, or before it where it is in use; false shows it as it is again. */
  readonly onCompare: (suggestion: PlacedScheme, isShown: boolean) => void;
  readonly onSources: (printIds: readonly string[] | null) => void;
}

/** One scheme: chips as wide as their shares, each with its name; one press uses it, holding compares. */
export function SchemeBlock({ suggestion, isInUse, isEditable, hasBefore, onApply, onCompare, onSources }: SchemeBlockProps) {
  const { scheme, shares } = suggestion;
  const { character } = scheme;
  const prints = useComposer((state) => state.prints);
  const sourceTitles = (ids: readonly string[]): string =>
    ids.length === 0 ? 'in none of the photos' : `from ${ids.slice(0, 3).map((id) => prints.get(id)?.title ?? 'a print').join(', ')}`;
  return (
    <div className={`scheme is-${character} ${isInUse ? 'is-in-use' : ''}`}>
      <h2 title={CHARACTER_WORDS[character]}>
        {SCHEME_NAMES[character]} <span>{character === 'echo' && CHARACTER_WORDS[character]}</span>
        {isInUse && <em>in use</em>}
        {isEditable && (!isInUse || hasBefore) && <CompareButton suggestion={suggestion} isInUse={isInUse} onCompare={onCompare} />}
        {isEditable && !isInUse && (
          <button type="button" className="scheme-use" onClick={() => onApply(scheme)}>
            Use<span className="sr-only"> {SCHEME_NAMES[character]}</span>
          </button>
        )}
      </h2>
      <ul className="scheme-chips">
        {ROLES.map((role, i) => {
          const color = scheme.colors[role];
          const label = `${colorName(color.hex)}, ${ROLE_WORDS[role]}, ${percent(shares[role])}% of the card, ${sourceTitles(color.printIds)}`;
          return (
            <li key={role} style={{ flexGrow: chipWidth(shares[role]) }}>
              <button
                type="button"
                className="chip"
                aria-label={label}
                title={label}
                style={{ background: color.hex, height: (character === 'echo' ? 28 : 20) - i * 3 }}
                onPointerEnter={() => onSources(color.printIds)}
                onPointerLeave={() => onSources(null)}
                onFocus={() => onSources(color.printIds)}
                onBlur={() => onSources(null)}
              />
            </li>
          );
        })}
      </ul>
      {/* The chips' labels say the same. */}
      <ul className="chip-words" aria-hidden="true">
        {ROLES.map((role) => (
          <li key={role}>
            <b>{colorName(scheme.colors[role].hex)}</b> <span className="num">{percent(shares[role])}%</span>
          </li>
        ))}
      </ul>
      <SchemeStash scheme={scheme} args={suggestion.args} isWide={character === 'echo'} isEditable={isEditable} onApply={onApply} />
    </div>
  );
}

function CompareButton({ suggestion, isInUse, onCompare }: Pick<SchemeBlockProps, 'suggestion' | 'isInUse' | 'onCompare'>) {
  const announce = useAnnounce();
  const [isShown, setShown] = useState(false);
  const name = SCHEME_NAMES[suggestion.scheme.character];
  const show = (next: boolean): void => {
    if (next === isShown) return;
    setShown(next);
    onCompare(suggestion, next);
    announce(next ? (isInUse ? `Shown as it was before ${name}` : `Shown in ${name}, which is not in use`) : 'Shown as it is');
  };
  return (
    <button
      type="button"
      className="scheme-use"
      aria-pressed={isShown}
      title={isInUse ? `Hold to see the spread as it was before ${name}` : `Hold to see the spread in ${name}; let go, and it is as before`}
      {...holdHandlers(isShown, show)}
    >
      {isInUse ? 'Before' : 'Look'}
      <span className="sr-only"> {isInUse ? name : `at ${name}`}</span>
    </button>
  );
}
