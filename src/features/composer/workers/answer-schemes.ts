import { placeScheme } from '#shared/colour/schemes';
import { suggestPlaced } from '#shared/colour/suggest-placed';
import type { Print } from '#shared/model/print';
import type { SchemeAnswer, SchemeRequest } from './scheme-messages';

/** The worker without the worker: remembers the prints and answers what is asked. Null where nothing is asked. */
export function createSchemeAnswers(): (request: SchemeRequest) => SchemeAnswer | null {
  let prints: ReadonlyMap<string, Print> = new Map<string, Print>();
  return (request) => {
    switch (request.kind) {
      case 'prints':
        prints = request.prints;
        return null;
      case 'suggest':
        return { kind: 'suggested', id: request.id, schemes: suggestPlaced({ doc: request.doc, prints, trim: request.trim }, request.wishes) };
      case 'place':
        return { kind: 'placed', id: request.id, args: placeScheme({ doc: request.doc, prints, trim: request.trim }, request.scheme) };
    }
  };
}
