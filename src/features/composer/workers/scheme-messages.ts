import type { CommandArgs } from '#shared/commands/calls';
import type { PlacedScheme } from '#shared/colour/suggest-placed';
import type { SchemeWishes } from '#shared/colour/schemes';
import type { Print } from '#shared/model/print';
import type { Scheme, SpreadDocument, TrimSettings } from '#shared/model/spread';

/** Prints are sent only when they change: their pictures' colours are read once and then remembered. */
export type SchemeRequest =
  | { readonly kind: 'prints'; readonly prints: ReadonlyMap<string, Print> }
  | { readonly kind: 'suggest'; readonly id: number; readonly doc: SpreadDocument; readonly trim: TrimSettings; readonly wishes: SchemeWishes }
  | { readonly kind: 'place'; readonly id: number; readonly doc: SpreadDocument; readonly trim: TrimSettings; readonly scheme: Scheme };

export type SchemeAnswer =
  | { readonly kind: 'suggested'; readonly id: number; readonly schemes: PlacedScheme[] }
  | { readonly kind: 'placed'; readonly id: number; readonly args: CommandArgs['scheme.apply'] };
