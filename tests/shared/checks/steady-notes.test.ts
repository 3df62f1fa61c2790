import { describe, expect, it } from 'vitest';
import type { Note, Severity } from '#shared/checks/check';
import { APPEARS_AFTER_MS, LEAVES_AFTER_MS, NOTHING_SHOWN, steadyNotes, type SteadyNotes } from '#shared/checks/steady-notes';

const note = (key: string, severity: Severity = 'fix'): Note => ({
  key,
  checkId: 'no-title',
  messageId: 'no-title',
  severity,
  matIds: [],
  page: 'left',
  data: {},
  remedy: { messageId: 'mount-whole', data: {}, call: { id: 'placement.setWhole', args: { matId: 'a', whole: true } } },
});
const shown = ({ shown: notes }: SteadyNotes): string[] => notes.map(({ key }) => key);
const held = (last: SteadyNotes, found: readonly Note[], atMs: number) => steadyNotes(last, found, { isHeld: true, atMs });
const A = note('a');
const B = note('b');

describe('steady notes', () => {
  const still = steadyNotes(NOTHING_SHOWN, [A], { isHeld: false, atMs: 0 });

  it('are what was found while nothing is held', () => {
    expect(shown(still)).toEqual(['a']);
    expect(shown(steadyNotes(still, [B], { isHeld: false, atMs: 1 }))).toEqual(['b']);
  });

  it('let a note come only after it was found for a while', () => {
    const first = held(still, [A, B], 1000);
    expect(shown(first)).toEqual(['a']);
    expect(first.nextAt).toBe(1000 + APPEARS_AFTER_MS);
    expect(shown(held(first, [A, B], 999 + APPEARS_AFTER_MS))).toEqual(['a']);
    expect(shown(held(first, [A, B], 1000 + APPEARS_AFTER_MS))).toEqual(['a', 'b']);
  });

  it('begin anew after a break', () => {
    const broken = held(held(held(still, [A, B], 0), [A], 200), [A, B], 240);
    expect(shown(held(broken, [A, B], 300))).toEqual(['a']);
  });

  it('keep a note that is gone for a while, without its remedy', () => {
    const gone = held(still, [], 1000);
    expect(shown(gone)).toEqual(['a']);
    expect(gone.shown[0]?.remedy).toBeNull();
    expect(shown(held(gone, [], 999 + LEAVES_AFTER_MS))).toEqual(['a']);
    expect(shown(held(gone, [], 1000 + LEAVES_AFTER_MS))).toEqual([]);
    const back = held(gone, [A], 1200);
    expect(back.shown[0]?.remedy).not.toBeNull();
    expect(back.nextAt).toBeNull();
  });

  it('let stops come and go at once, before all others', () => {
    const stop = note('s', 'stop');
    const with_ = held(still, [stop, A], 10);
    expect(shown(with_)).toEqual(['s', 'a']);
    expect(shown(held(with_, [A], 11))).toEqual(['a']);
  });

  it('never flicker under a note that comes and goes with every move', () => {
    let last = still;
    const seen = new Set<string>();
    for (let t = 0; t < 3000; t += 16) {
      last = held(last, (t / 16) % 2 === 0 ? [A] : [B], t);
      seen.add(shown(last).join());
    }
    expect([...seen]).toEqual(['a']);
  });

  it('are what was found as soon as the hand lets go', () => {
    expect(shown(steadyNotes(held(still, [B], 0), [B], { isHeld: false, atMs: 1 }))).toEqual(['b']);
  });
});
