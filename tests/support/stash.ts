import { inches } from '#shared/model/length';
import type { StashFacts, StashSheet, StashSide } from '#shared/model/stash';
import { idOf } from './builders';

export const buildSide = (parts: Partial<StashSide> = {}): StashSide => ({
  hex: '#1d4f5c',
  source: 'typed',
  uncertainty: 2,
  pattern: 'plain',
  palette: [],
  ...parts,
});

/** What a person enters of four sheets of a deep teal. */
export const buildFacts = (parts: Partial<StashFacts> = {}): StashFacts => ({
  name: 'Harbour',
  maker: '',
  texture: '',
  place: '',
  width: inches(12),
  height: inches(12),
  quantity: 4,
  lowAt: null,
  price: null,
  sides: [buildSide()],
  ...parts,
});

let serial = 0;

/** Four free 12 × 12 in sheets of a deep teal. */
export function buildSheet({ hex, ...parts }: Partial<StashSheet> & { readonly hex?: string } = {}): StashSheet {
  serial += 1;
  return {
    id: idOf(serial, 21),
    studioId: idOf(1, 9),
    ...buildFacts({ sides: [buildSide(hex === undefined ? {} : { hex })] }),
    reserved: 0,
    revision: 0,
    ...parts,
  };
}
