import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { undeclaredFocal } from '#shared/checks/undeclared-focal';
import { matIdOf } from '../../support/builders';
import { viewFilled } from '../../support/filled-spread';

const focal = { focal: true };

describe('undeclared-focal', () => {
  it('notes the heaviest mat that outweighs the focal of its page', () => {
    expect(undeclaredFocal.run(viewFilled([[0, 0, 8, 8, focal], [8, 0, 10, 10], [0, 10, 12, 12]], []))).toMatchObject([
      { messageId: 'undeclared-focal', matIds: [matIdOf(3), matIdOf(1)] },
    ]);
  });

  it('measures a page without a focal against the spread’s', () => {
    expect(undeclaredFocal.run(viewFilled([[0, 0, 8, 8, focal]], [[0, 0, 14, 14]]))).toHaveLength(1);
    expect(undeclaredFocal.run(viewFilled([[0, 0, 8, 8, focal]], [[0, 0, 8, 8]]))).toEqual([]);
  });

  it('lets a mat weigh up to a quarter more', () => {
    const view = viewFilled([[0, 0, 10, 10, focal], [10, 0, 10, 12]], []);
    expect(undeclaredFocal.run(view)).toEqual([]);
    expect(undeclaredFocal.run(view, { pull: 1.1 })).toHaveLength(1);
  });

  it('is silent without a declared focal, about bare mats and about paper that backs half the page', () => {
    expect(undeclaredFocal.run(viewFilled([[0, 0, 8, 8], [8, 0, 12, 12]], []))).toEqual([]);
    const paper = { content: { kind: 'paper', pattern: 'stripe', color: '#000000', ground: '#ffffff' } } as const;
    expect(undeclaredFocal.run(viewFilled([[0, 0, 8, 8, focal], [0, 8, 22, 14, paper]], []))).toEqual([]);
    expect(undeclaredFocal.run(viewFilled([[0, 0, 8, 8, focal], [0, 8, 22, 14, { content: { kind: 'bare' } }]], []))).toEqual([]);
  });

  it('offers to declare it', () => {
    const view = viewFilled([[0, 0, 12, 12, focal], [0, 12, 12, 10]], [[0, 0, 22, 14]]);
    const note = runChecks(view).find(({ checkId }) => checkId === 'undeclared-focal');
    expect(note).toMatchObject({ matIds: [matIdOf(3), matIdOf(1)], remedy: { messageId: 'make-focal', call: { args: { matId: matIdOf(3) } } } });
  });
});
