import { Refusal, type AnswerMessage, type TaskMessage } from './worker-messages';

/** The worker's side: answers every task that the parent sends, one at a time, and ends when the parent is gone. */
export function serveTasks<Task, Result>(
  handle: (task: Task, onProgress: (progress: number) => void) => Promise<Result>,
): void {
  const send = (answer: AnswerMessage): void => void process.send?.(answer);

  process.on('message', ({ id, task }: TaskMessage) => {
    handle(task as Task, (progress) => send({ id, kind: 'progress', progress })).then(
      (result) => send({ id, kind: 'done', result }),
      (error: unknown) =>
        send(
          error instanceof Refusal
            ? { id, kind: 'refused', reason: error.reason, data: error.data }
            : { id, kind: 'failed', message: error instanceof Error ? (error.stack ?? error.message) : String(error) },
        ),
    );
  });
  process.on('disconnect', () => process.exit(0));
  // Ctrl-C reaches the whole process group; the parent decides when its workers end.
  process.on('SIGINT', () => undefined);
}
