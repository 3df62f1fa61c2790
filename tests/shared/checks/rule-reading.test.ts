import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { NGO_MEASURES } from '#shared/checks/balance/ngo-measures';
import { readRule, type RuleFrame } from '#shared/checks/rule-reading';
import { MEASURE_HELP, measureSentence, type RuleMeasure } from '#shared/words/en/measures';
import { buildMat, buildSpread, buildView, matIdOf } from '../../support/builders';
import { viewFilled } from '../../support/filled-spread';
import { randomOf, randomSpread } from '../../support/random-spread';

const BARE = { content: { kind: 'bare' } } as const;
const ALL: readonly RuleMeasure[] = ['deviation', ...NGO_MEASURES];

describe('what stands on the rule', () => {
  it('reads a spread and its pages each in their own frame', () => {
    const view = viewFilled([[0, 0, 11, 11, BARE]], [[11, 11, 11, 11, BARE]]);
    expect(readRule(view, 'spread')!.offset).toEqual({ x: expect.closeTo(0, 6), y: expect.closeTo(0, 6) });
    expect(readRule(view, 'left')!.offset!.x).toBeLessThan(-0.2);
    expect(readRule(view, 'right')!.offset!.x).toBeGreaterThan(0.2);
    expect(readRule(view, 'left')!.facts).toMatchObject({ mats: 1, heaviestQuarter: 0, inQuarters: [1, 0, 0, 0] });
  });

  it('leaves mats laid over others out of the boxes', () => {
    const mats = [buildMat({ id: matIdOf(1), w: 8, h: 8 }), buildMat({ id: matIdOf(2), w: 2, h: 2, z: 1, laidOver: true })];
    expect(readRule(buildView({ doc: buildSpread({ mats }) }), 'left')!.facts.mats).toBe(1);
  });

  it('has nothing to say of a page without mats, or of one that is not there', () => {
    expect(readRule(viewFilled([[0, 0, 4, 4]], []), 'right')).toBeNull();
    const single = viewFilled([[0, 0, 4, 4]], [], { pages: { left: { color: '#ffffff' }, right: null } });
    expect(readRule(single, 'right')).toBeNull();
    expect(readRule(single, 'spread')!.measures).toEqual(readRule(single, 'left')!.measures);
  });

  it('says which side pulls less, and by how much of the other', () => {
    const reading = readRule(viewFilled([[0, 0, 10, 10, BARE]], [[12, 0, 10, 10, BARE], [12, 12, 10, 10, BARE]]), 'spread')!;
    // The same on the left once as on the right twice.
    expect(measureSentence('balance', reading)).toContain('The left pulls 50 % less than the right.');
    expect(measureSentence('economy', reading)).toBe('1 size for 3 mats.');
  });

  it('gives numbers between 0 and 1 and whole sentences for random spreads', () => {
    fc.assert(
      fc.property(fc.integer(), fc.integer({ min: 1, max: 24 }), fc.constantFrom<RuleFrame>('spread', 'left', 'right'), (seed, mats, frame) => {
        const reading = readRule(buildView(randomSpread(randomOf(seed), { mats, prints: 4, withPanes: true, rasterSize: 8 })), frame);
        if (!reading) return;
        for (const name of NGO_MEASURES) expect([name, reading.measures[name] >= -1e-12 && reading.measures[name] <= 1 + 1e-12]).toEqual([name, true]);
        expect(Number.isFinite(reading.deviation ?? 0)).toBe(true);
        for (const measure of ALL) expect(measureSentence(measure, reading)).toMatch(/^[A-Z0-9].*\.$/);
      }),
      { numRuns: 60 },
    );
  });

  it.each(ALL)('%s has a name, a formula and a meaning', (measure) => {
    const { name, formula, meaning } = MEASURE_HELP[measure];
    expect(name).toMatch(/^[A-Z]/);
    expect(formula.length).toBeGreaterThan(5);
    expect(meaning).toMatch(/[.)]$/);
  });
});
