import { serveTasks } from '#server/images/serve-tasks';
import { Refusal } from '#server/images/worker-messages';

/** What the trial worker can be told to do. */
export type Trial =
  | { readonly kind: 'answer'; readonly value: number }
  | { readonly kind: 'refuse' }
  | { readonly kind: 'fail' }
  | { readonly kind: 'hang' }
  | { readonly kind: 'grow'; readonly mebibytes: number }
  | { readonly kind: 'pid'; readonly delayMs: number };

const kept: Buffer[] = [];
const wait = (ms: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, ms));

async function attempt(trial: Trial): Promise<number> {
  switch (trial.kind) {
    case 'answer':
      return trial.value;
    case 'refuse':
      throw new Refusal('gif', { kind: 'GIF' });
    case 'fail':
      throw new Error('a bug');
    case 'hang':
      await wait(60_000);
      return 0;
    case 'grow':
      for (let i = 0; i < trial.mebibytes; i += 16) {
        kept.push(Buffer.alloc(16 * 1024 * 1024, 1));
        await wait(5);
      }
      return kept.length;
    case 'pid':
      await wait(trial.delayMs);
      return process.pid;
  }
}

serveTasks(attempt);
