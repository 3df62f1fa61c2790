import { describe, expect, it } from 'vitest';
import { differenceWord } from '#shared/colour/difference-words';

describe('words for a colour difference', () => {
  it.each([
    [0, 'indistinguishable'],
    [0.99, 'indistinguishable'],
    [1, 'close'],
    [2.99, 'close'],
    [3, 'near'],
    [5.99, 'near'],
    [6, 'different'],
  ])('a difference of %d is %s', (deltaE, word) => {
    expect(differenceWord(deltaE)).toBe(word);
  });

  it('are no finer than what is known of the colours', () => {
    expect(differenceWord(0.2, 2)).toBe('close');
    expect(differenceWord(0.2, 5)).toBe('near');
    expect(differenceWord(4, 2)).toBe('near');
  });
});
