import { describe, expect, it } from 'vitest';
import { arrangeSheets, readArrangement, writeArrangement } from '@/features/stash/model/arrange-sheets';
import { buildSheet, buildSide } from '../../support/stash';

const sheets = [
  buildSheet({ name: 'Oat', hex: '#efe6d2', quantity: 4, lowAt: 1, place: 'Drawer 1', price: 95 }),
  buildSheet({ name: 'Slate', hex: '#515a62', quantity: 2, reserved: 1, lowAt: 1, place: 'Drawer 2' }),
  buildSheet({ name: 'Harbour', hex: '#1d4f5c', quantity: 2, place: 'Drawer 1', price: 80 }),
  buildSheet({ name: 'Deck chair', sides: [buildSide({ pattern: 'stripe', palette: ['#1d4f5c'], hex: '#dc9f33' })], quantity: 0, place: 'Rack' }),
];
const namesFor = (query: string) => arrangeSheets(sheets, readArrangement(new URLSearchParams(query))).map(({ name }) => name);

describe('the stash as it is shown', () => {
  it.each([
    ['', ['Deck chair', 'Harbour', 'Oat', 'Slate']],
    ['sort=-name', ['Slate', 'Oat', 'Harbour', 'Deck chair']],
    // What is reserved is not free.
    ['sort=free', ['Deck chair', 'Slate', 'Harbour', 'Oat']],
    // Neutrals first, dark to light, then round the wheel.
    ['sort=colour', ['Slate', 'Oat', 'Deck chair', 'Harbour']],
    ['sort=price', ['Harbour', 'Oat', 'Slate', 'Deck chair']],
    ['show=patterned', ['Deck chair']],
    ['show=low', ['Slate']],
    ['q=drawer 1', ['Harbour', 'Oat']],
    ['q=TEAL', ['Harbour']],
    ['show=nonsense&sort=nonsense', ['Deck chair', 'Harbour', 'Oat', 'Slate']],
  ])('for the address %j', (query, names) => {
    expect(namesFor(query)).toEqual(names);
  });

  it('has an address that says the same again', () => {
    const query = 'q=teal+drawer&show=low&sort=-free';
    expect(writeArrangement(readArrangement(new URLSearchParams(query))).toString()).toBe(query);
    expect(writeArrangement(readArrangement(new URLSearchParams())).toString()).toBe('');
  });
});
