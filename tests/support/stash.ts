import { inches } from '#shared/model/length';
import type { StashSheet, StashSide } from '#shared/model/stash';
import { idOf } from './builders';

export const buildSide = (parts: Partial<StashSide> = {}): StashSide => ({
  hex: '#1d4f5c',
  source: 'typed',
  uncertainty: 2,
  pattern: 'plain',
  palette: [],
  ...parts,
});

let serial = 0;

/** Four free 12 × 12 in sheets of a deep teal. */
export function buildSheet({ hex, ...parts }: Partial<StashSheet> & { readonly hex?: string } = {}): StashSheet {
  serial += 1;
  return {
    id: idOf(serial, 21),
    studioId: idOf(1, 9),
    name: 'Harbour',
    maker: '',
    texture: '',
    place: '',
    width: inches(12),
    height: inches(12),
    quantity: 4,
    lowAt: null,
    price: null,
    reserved: 0,
    revision: 0,
    sides: [buildSide(hex === undefined ? {} : { hex })],
    ...parts,
  };
}
