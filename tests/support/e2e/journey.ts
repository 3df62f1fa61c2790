import { afterEach, beforeEach } from 'vitest';

/**
 * For a journey whose tests are its steps, each going on where the one before it ended: after a step
 * that failed, the later ones fail at once instead of waiting for what cannot come.
 */
export function asJourney(): void {
  let failedStep: string | null = null;
  beforeEach(() => {
    if (failedStep !== null) throw new Error(`An earlier step of the journey failed: ${failedStep}`);
  });
  afterEach(({ task }) => {
    if (task.result?.state === 'fail') failedStep ??= task.name;
  });
}
