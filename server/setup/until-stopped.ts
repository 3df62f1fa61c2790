import { setTimeout as sleep } from 'node:timers/promises';
import { describeFailure } from './setup-failure';

/** An app that cannot finish its work in this time is left; the database recovers by itself. */
const CLOSE_WAIT_MS = 20_000;

/**
 * Runs `start` and keeps what it opens until the process is told to stop (Ctrl-C, SIGTERM, a closed terminal); then
 * closes it, last opened first, and exits with 0. A start that fails closes what it had opened and exits with 1.
 */
export function runUntilStopped(
  start: (hooks: { onOpened: (close: () => Promise<void>) => void; fail: (message: string) => void }) => Promise<void>,
): void {
  const closers: (() => Promise<void>)[] = [];
  let isStopping = false;

  const closeAll = async (): Promise<void> => {
    for (const close of closers.splice(0).reverse()) {
      try {
        await close();
      } catch (error) {
        process.stderr.write(`${describeFailure(error)}\n`);
      }
    }
  };
  const stop = (exitCode: number, message = ''): void => {
    // npm passes a signal on that the terminal has sent already: the second one changes nothing.
    if (isStopping) return;
    isStopping = true;
    if (message) process.stderr.write(`\n${message}\n`);
    void Promise.race([closeAll(), sleep(CLOSE_WAIT_MS)]).then(() => process.exit(exitCode));
  };

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => stop(0));
  start({
    onOpened: (close) => {
      closers.push(close);
    },
    fail: (message) => stop(1, message),
  }).catch((error: unknown) => stop(1, describeFailure(error)));
}
