/** What the API process and a worker process say to each other. */
export interface TaskMessage {
  readonly id: number;
  readonly task: unknown;
}

export type AnswerMessage =
  | { readonly id: number; readonly kind: 'progress'; readonly progress: number }
  | { readonly id: number; readonly kind: 'done'; readonly result: unknown }
  /** The task itself is to blame, for a reason that people can act on. */
  | { readonly id: number; readonly kind: 'refused'; readonly reason: string; readonly data: Readonly<Record<string, unknown>> }
  /** A bug, or the machine's fault. */
  | { readonly id: number; readonly kind: 'failed'; readonly message: string };

/** Thrown inside a worker for what a person can act on; `reason` is a code. */
export class Refusal extends Error {
  constructor(
    readonly reason: string,
    readonly data: Readonly<Record<string, unknown>> = {},
  ) {
    super(reason);
    this.name = 'Refusal';
  }
}
