import { describe, expect, it } from 'vitest';
import { allNeutrals } from '#shared/checks/all-neutrals';
import { oklchToHex } from '#shared/colour/css-color';
import { runChecks } from '#shared/checks/run-checks';
import { schemeOf, viewColored } from '../../support/colored-spread';

const GREYS = ['#222222', '#555555', '#999999', '#cccccc', '#222222', '#555555', '#999999', '#cccccc'];
const SEA = '#1f4e5f';

describe('all-neutrals', () => {
  it('notes nothing but neutrals under photos that have colour', () => {
    expect(allNeutrals.run(viewColored(GREYS, [SEA]))).toMatchObject([{ messageId: 'all-neutrals', matIds: [] }]);
  });

  it('is content with one coloured card, a coloured page, or black and white photos', () => {
    expect(allNeutrals.run(viewColored([...GREYS.slice(1), SEA], [SEA]))).toEqual([]);
    expect(allNeutrals.run(viewColored(GREYS, [SEA], { pages: { left: { color: SEA }, right: { color: '#ffffff' } } }))).toEqual([]);
    expect(allNeutrals.run(viewColored(GREYS, ['#444444']))).toEqual([]);
  });

  it('calls card neutral under a chroma of 0.03', () => {
    const tinted = (chroma: number) => viewColored([oklchToHex([0.6, chroma, 240])], [SEA]);
    expect(allNeutrals.run(tinted(0.02))).toHaveLength(1);
    expect(allNeutrals.run(tinted(0.04))).toEqual([]);
    expect(allNeutrals.run(tinted(0.04), { chroma: 0.06 })).toHaveLength(1);
  });

  it('is off under quiet, which wants neutrals', () => {
    const ids = (character: 'quiet' | 'echo') =>
      runChecks(viewColored(GREYS, [SEA], { scheme: schemeOf(character, ['#ffffff', '#222222', '#999999', '#555555']) })).map(({ checkId }) => checkId);
    expect(ids('quiet')).not.toContain('all-neutrals');
    expect(ids('echo')).toContain('all-neutrals');
  });
});
