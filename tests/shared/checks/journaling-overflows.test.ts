import { describe, expect, it } from 'vitest';
import { journalingOverflows } from '#shared/checks/journaling-overflows';
import { runChecks } from '#shared/checks/run-checks';
import { journalingRoom } from '#shared/lettering/journaling-room';
import { inches } from '#shared/model/length';
import { buildMat, buildSpread, buildView, matIdOf } from '../../support/builders';

const words = (count: number): string => Array.from({ length: count }, (_, i) => (i % 2 ? 'light' : 'tide')).join(' ');
const PLACE = { x: 0, y: 0, width: inches(3, 5 / 8), height: inches(1, 5 / 8) };
const LINE = inches(3 / 8);
const viewOf = (text: string, lineHeight = LINE, more: ReturnType<typeof buildMat>[] = []) =>
  buildView({ doc: buildSpread({ mats: [buildMat({ id: matIdOf(1), w: 8, h: 4, content: { kind: 'journaling', text, color: '#333333', lineHeight } }), ...more] }) });

describe('journaling-overflows', () => {
  const most = journalingRoom({ text: words(200), lineHeight: LINE }, PLACE).capacity;

  it('notes more words than the ruled lines hold, and says how many they hold', () => {
    expect(journalingOverflows.run(viewOf(words(most + 20)))).toMatchObject([{ data: { words: most + 20, capacity: most }, matIds: [matIdOf(1)] }]);
  });

  it('turns over with the very word that has no room', () => {
    expect(journalingOverflows.run(viewOf(words(most)))).toEqual([]);
    expect(journalingOverflows.run(viewOf(words(most + 1)))).toHaveLength(1);
    expect(journalingOverflows.run(viewOf(words(most + 1)), { words: 1 })).toEqual([]);
    expect(journalingOverflows.run(viewOf(''))).toEqual([]);
  });

  it('offers a smaller hand, and where that would be too small a larger mat', () => {
    expect(runChecks(viewOf(words(most + 3)))[0]?.remedy).toMatchObject({ messageId: 'smaller-hand' });
    expect(runChecks(viewOf(words(150), inches(1 / 4)))[0]?.remedy).toMatchObject({ messageId: 'larger-mat' });
  });
});

describe('the room for journaling', () => {
  it('is told in words before a word is written, and grows with the place', () => {
    const room = journalingRoom({ text: '', lineHeight: LINE }, PLACE);
    expect(room).toMatchObject({ words: 0, fits: true });
    expect(room.capacity).toBeGreaterThan(15);
    expect(room.capacity).toBeLessThan(60);
    const double = journalingRoom({ text: '', lineHeight: LINE }, { ...PLACE, height: 2 * PLACE.height });
    expect(double.capacity).toBeGreaterThanOrEqual(2 * room.capacity - 4);
  });

  it('is none where no rule fits', () => {
    expect(journalingRoom({ text: 'one two', lineHeight: LINE }, { ...PLACE, height: 100 })).toEqual({ words: 2, capacity: 0, fits: false });
    expect(journalingRoom({ text: '', lineHeight: LINE }, { ...PLACE, width: 0, height: 0 })).toEqual({ words: 0, capacity: 0, fits: true });
  });
});
