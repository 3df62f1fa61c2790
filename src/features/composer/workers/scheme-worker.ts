import { createSchemeAnswers } from './answer-schemes';
import type { SchemeAnswer, SchemeRequest } from './scheme-messages';

/** The part of a worker's global scope that is used here; the pages' types know only a window. */
interface WorkerScope {
  onmessage: ((event: MessageEvent<SchemeRequest>) => void) | null;
  postMessage(answer: SchemeAnswer): void;
}

const scope = globalThis as unknown as WorkerScope;
const answer = createSchemeAnswers();
scope.onmessage = ({ data }) => {
  const given = answer(data);
  if (given) scope.postMessage(given);
};
