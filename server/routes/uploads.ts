import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { uploadedPrintSchema } from '../../shared/contracts/prints';
import { AppError } from '../../shared/errors';
import type { Actor } from '../../shared/model/people';
import { can } from '../../shared/permissions';
import { presentPrint } from '../presenters/present-print';
import { invalidField } from '../services/invalid-field';
import type { PileService } from '../services/pile-service';
import { targetOfPrint } from '../services/print-service';
import { uploadFieldsSchema, type ReceivedUpload, type ReceiveUpload } from '../services/receive-upload';
import type { StudioService } from '../services/studio-service';
import type { UploadService } from '../services/upload-service';
import { authorise } from './authorise';
import { guardedRoute } from './define-route';

interface Deps {
  readonly studios: StudioService;
  readonly piles: PileService;
  readonly uploads: UploadService;
  readonly receive: ReceiveUpload;
}

export const uploadRoutes = ({ studios, piles, uploads, receive }: Deps) => [
  guardedRoute({
    method: 'post',
    path: '/studios/:studioId/prints',
    summary: 'Adds one picture file as a print; the same file again is answered with the print that is there.',
    params: z.strictObject({ studioId: idSchema }),
    body: { multipart: uploadFieldsSchema, files: ['file'] },
    answer: { status: 201, schema: uploadedPrintSchema },
    errors: ['picture-refused', 'too-large', 'quota-exceeded', 'disk-full', 'already-exists', 'unavailable'],
    needs: 'print:add',
    // Which pile is known only once the body is read: whoever may add to some pile may send, and is asked again then.
    on: async ({ studioId }) => {
      const { target, subject } = await studios.locate(studioId);
      return { target: { ...target, sharedWithContributors: true }, subject };
    },
    handle: async ({ actor, subject, req, res }) => {
      const upload = await receive(req, res);
      const { print, known } = await uploads.take(upload, {
        studioId: subject.id,
        userId: actor.userId,
        mayAdd: () => requirePile(piles, actor, subject.id, upload),
        maySee: (found) => can(actor, 'picture:see', targetOfPrint(found)) === 'allow',
      });
      return { print: presentPrint(print), known };
    },
  }),
];

/** @throws AppError `invalid-input` for a pile of no or another studio, `forbidden` or `not-found` for one that is not theirs to add to. */
async function requirePile(piles: PileService, actor: Actor, studioId: string, { pileId }: ReceivedUpload): Promise<void> {
  if (pileId === null) {
    // Somebody who may add to shared piles only has to name one.
    if (can(actor, 'print:add', { studioId }) !== 'allow') throw new AppError('forbidden');
    return;
  }
  const pile = (await piles.list(studioId)).find(({ id }) => id === pileId);
  if (!pile) throw invalidField('pileId', 'there is no such pile in this studio');
  authorise(actor, 'print:add', { studioId, pileId, sharedWithContributors: pile.sharedWithContributors });
}
