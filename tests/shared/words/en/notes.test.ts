import { describe, expect, it } from 'vitest';
import { inches, millimetres } from '#shared/model/length';
import { noteSentence, remedyLabel, SEVERITY_WORDS } from '#shared/words/en/notes';

describe('sentences of notes', () => {
  it('say which lengths do not fit, in the reader’s unit', () => {
    const note = { messageId: 'keep-zone-larger', data: { title: 'All of us', zone: inches(3, 11 / 16), window: inches(3, 5 / 8), axis: 'wide' } } as const;
    expect(noteSentence(note, 'in')).toBe('This cut takes part of “All of us”. The keep zone is 3 11/16 wide, the window 3 5/8.');
    expect(noteSentence(note, 'mm')).toContain('93.7 wide');
  });

  it('never name a length of nothing', () => {
    const tight = (spare: number) => noteSentence({ messageId: 'keep-zone-tight', data: { title: 'Pim', spare, tolerance: 254, edge: 'bottom' } }, 'in');
    expect(tight(0)).toBe('This cut runs along the keep zone of “Pim” at the foot. 1/16 in to spare is wanted.');
    expect(tight(3)).toContain('leaves a hair to spare');
    expect(tight(127)).toContain('leaves 1/32 in to spare');
  });

  it('count one and many', () => {
    const bare = (fitting: number) => noteSentence({ messageId: 'bare-mat', data: { fitting } }, 'in');
    expect([0, 1, 3].map(bare)).toEqual([
      'Bare mat. No print on the table fits it.',
      'Bare mat. One print on the table fits it.',
      'Bare mat. 3 prints on the table fit it.',
    ]);
    const copies = (n: number, elsewhere: number) => noteSentence({ messageId: 'more-placements', data: { title: 'Pim', needed: 3, copies: n, elsewhere } }, 'in');
    expect(copies(1, 0)).toBe('“Pim” is needed 3 times, and there is one copy.');
    expect(copies(2, 1)).toBe('“Pim” is needed 3 times, 1 of them on other spreads, and there are 2 copies.');
  });

  it('cut a title that would drown the sentence, by letters and not by code units', () => {
    const sentence = noteSentence({ messageId: 'one-of-a-kind-cut', data: { title: '🌊'.repeat(60) } }, 'in');
    expect(sentence).toContain(`“${'🌊'.repeat(31)}…”`);
  });

  it('speak of colours in words', () => {
    expect(noteSentence({ messageId: 'photo-sinks', data: { title: 'Dusk', share: 50, matColor: '#1f4e5f' } }, 'in')).toMatch(/half its rim is too close to [a-z ]*teal|petrol/);
  });
});

describe('labels of remedies', () => {
  it('give the new value', () => {
    const thinner = (reveal: number) => ({ messageId: 'thinner-reveal', data: { reveal }, call: { id: 'mats.setReveal', args: { matIds: [], reveal } } }) as const;
    expect(remedyLabel(thinner(inches(1 / 16)), 'in')).toBe('Use a 1/16 in reveal');
    expect(remedyLabel(thinner(millimetres(2)), 'mm')).toBe('Use a 2 mm reveal');
  });

  it('tell the three severities apart in words', () => {
    expect(SEVERITY_WORDS).toEqual({ stop: 'Stop', fix: 'Fix', consider: 'Consider' });
  });
});
