import { describe, expect, it } from 'vitest';
import { focalsCompete } from '#shared/checks/focals-compete';
import { runChecks } from '#shared/checks/run-checks';
import { matIdOf } from '../../support/builders';
import { viewFilled } from '../../support/filled-spread';

const focal = { focal: true };

describe('focals-compete', () => {
  it('notes focals of nearly one weight, the heavier first', () => {
    expect(focalsCompete.run(viewFilled([[0, 0, 10, 10, focal]], [[4, 8, 10, 11, focal]]))).toMatchObject([
      { messageId: 'focals-compete', matIds: [matIdOf(2), matIdOf(1)] },
    ]);
  });

  it('is content where one leads clearly, and with a single focal', () => {
    expect(focalsCompete.run(viewFilled([[0, 0, 10, 10, focal]], [[0, 0, 14, 12, focal]]))).toEqual([]);
    expect(focalsCompete.run(viewFilled([[0, 0, 10, 10, focal]], [[0, 0, 10, 10]]))).toEqual([]);
  });

  it('goes by its threshold', () => {
    const view = viewFilled([[0, 0, 10, 10, focal]], [[4, 8, 10, 14, focal]]);
    expect(focalsCompete.run(view)).toEqual([]);
    expect(focalsCompete.run(view, { likeness: 0.6 })).toHaveLength(1);
  });

  it('leaves focals of one size or at one place to the checks that say so', () => {
    const rest = [[0, 12, 22, 10]] as const;
    const ids = runChecks(viewFilled([[0, 0, 12, 12, focal], ...rest], [[10, 0, 12, 12, focal], ...rest])).map((note) => note.checkId);
    expect(ids).toContain('focals-same-size');
    expect(ids).not.toContain('focals-compete');
  });
});
