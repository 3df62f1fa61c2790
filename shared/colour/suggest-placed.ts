import type { CommandArgs } from '../commands/calls';
import { runCommand } from '../commands/run-command';
import { applyPatch } from '../model/patch';
import type { Scheme, SchemeRole } from '../model/spread';
import { placeScheme, suggestSchemes, type PlaceInput, type SchemeWishes } from './schemes';
import { visibleShares } from './shares';

/** A scheme with where it would go and how much of the visible card each colour would be. */
export interface PlacedScheme {
  readonly scheme: Scheme;
  readonly args: CommandArgs['scheme.apply'];
  /** Shares of visible card, pages included, with the scheme applied: 0–1. */
  readonly shares: Readonly<Record<SchemeRole, number>>;
}

/** The schemes of `suggestSchemes`, each placed on this spread: all that Compose shows of them, in one pure call. */
export function suggestPlaced({ doc, prints, trim }: PlaceInput, wishes: SchemeWishes = {}): PlacedScheme[] {
  // Applying a scheme makes nothing that would need an id.
  const context = { prints, trim, newId: () => '' };
  return suggestSchemes({ doc, prints }, wishes).map((scheme) => {
    const args = placeScheme({ doc, prints, trim }, scheme);
    const applied = applyPatch(doc, runCommand(doc, { id: 'scheme.apply', args }, context));
    return { scheme, args, shares: visibleShares(applied, scheme, prints) };
  });
}
