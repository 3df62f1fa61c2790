import { useMemo } from 'react';
import { colorName } from '#shared/colour/name';
import { schemeOfSheets, snapScheme, type SnappedColor } from '#shared/colour/snap-scheme';
import type { CommandArgs } from '#shared/commands/calls';
import { runCommand } from '#shared/commands/run-command';
import { applyPatch } from '#shared/model/patch';
import type { Scheme, SchemeRole } from '#shared/model/spread';
import { freeSheets } from '#shared/model/stash';
import { sheetCount } from '#shared/words/en/stash';
import { Tag } from '@/components/tag';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import { useStash } from '@/features/composer/hooks/stash-context';
import { newId } from '@/lib/ids';

const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];

interface SchemeStashProps {
  readonly scheme: Scheme;
  /** Where the scheme would go. */
  readonly args: CommandArgs['scheme.apply'];
  /** One tag under each chip, or one for the whole scheme. */
  readonly isWide: boolean;
  readonly isEditable: boolean;
  /** Places a scheme and uses it. */
  readonly onApply: (scheme: Scheme) => void;
}

/** What the stash has of a scheme's colours, what must be bought, and the press that takes the sheets' own colours. */
export function SchemeStash({ scheme, args, isWide, isEditable, onApply }: SchemeStashProps) {
  const stash = useStash();
  const store = useComposerStore();
  const inUse = useComposer((state) => state.doc.scheme);
  const snapped = useMemo(() => {
    if (stash === null || stash.entries.length === 0) return null;
    // The spread that the scheme was placed on, or one edit later: the next placing follows at once.
    const { doc, prints, trim } = store.getState();
    return snapScheme(applyPatch(doc, runCommand(doc, { id: 'scheme.apply', args }, { prints, trim, newId })), scheme, stash);
  }, [stash, store, args, scheme]);
  if (snapped === null) return null;
  const ofSheets = schemeOfSheets(scheme, snapped);
  const isSnapped = inUse !== null && ROLES.every((role) => inUse.colors[role].hex === ofSheets.colors[role].hex);
  const canSnap = isEditable && !isSnapped && snapped.some(({ match }) => match !== null);
  const snap = (): void => onApply(ofSheets);
  const words = snapped.map(wordsOf).join('; ');
  if (!isWide) return <SchemeTag snapped={snapped} words={words} character={scheme.character} isSnapped={isSnapped} onSnap={canSnap ? snap : null} />;
  return (
    <div className="scheme-stash is-wide">
      <ul>
        {snapped.map((color) => (
          <li key={color.role}>
            <StashTag color={color} />
          </li>
        ))}
      </ul>
      {isSnapped && <span className="scheme-sheets">in sheets</span>}
      {canSnap && (
        <button type="button" className="scheme-sheets link-button" onClick={snap} title="Use the colours of the sheets that you have">
          Use sheets<span className="sr-only"> for {scheme.character}</span>
        </button>
      )}
    </div>
  );
}

/** What a colour is called where it has to be bought. */
const nameOf = ({ match, hex }: SnappedColor): string => match?.sheet.name ?? colorName(hex);

/** One colour in full: `Harbour, close: 2 sheets free, 1 needed`. */
function wordsOf(color: SnappedColor): string {
  const { match, needed, buy } = color;
  const last = buy > 0 ? `buy ${sheetCount(buy)}` : 'nothing to buy';
  if (!match) return `nothing near in the stash: ${needed === 0 ? 'none needed' : last}`;
  return `${match.sheet.name}, ${match.word}: ${sheetCount(freeSheets(match.sheet))} free, ${needed} needed by area, ${last}`;
}

function StashTag({ color }: { readonly color: SnappedColor }) {
  const { match, buy } = color;
  const words = wordsOf(color);
  return (
    <Tag tone={buy > 0 || !match ? 'quiet' : 'plain'} title={words}>
      <span className="sr-only">{words}</span>
      <span aria-hidden="true">{buy > 0 ? `buy ${buy}` : match ? sheetCount(freeSheets(match.sheet)) : 'none'}</span>
    </Tag>
  );
}

interface SchemeTagProps {
  readonly snapped: readonly SnappedColor[];
  readonly words: string;
  readonly character: string;
  readonly isSnapped: boolean;
  /** Takes the sheets' own colours; null where there is nothing to take or no right to. */
  readonly onSnap: (() => void) | null;
}

/** A whole scheme in one tag, which is the press as well: everything is there, or what to buy. */
function SchemeTag({ snapped, words, character, isSnapped, onSnap }: SchemeTagProps) {
  const [first, ...others] = snapped.filter(({ buy }) => buy > 0);
  const buying = first && (others.length === 0 ? `buy ${first.buy} ${nameOf(first)}` : `buy ${snapped.reduce((sum, { buy }) => sum + buy, 0)}`);
  const text = buying ?? (isSnapped ? 'in sheets' : 'in stash: all');
  if (!onSnap) {
    return (
      <p className="scheme-stash">
        <Tag tone={first ? 'quiet' : 'plain'} title={words}>
          <span className="sr-only">{words}</span>
          <span aria-hidden="true">{text}</span>
        </Tag>
      </p>
    );
  }
  return (
    <div className="scheme-stash">
      <button type="button" className="tag" data-tone="pencil" onClick={onSnap} aria-label={`Use sheets for ${character}: ${words}`} title={`Use the colours of the sheets that you have. ${words}`}>
        <span>{text}</span>
      </button>
    </div>
  );
}
