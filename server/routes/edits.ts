import { editListSchema, editQuerySchema, postEditsResponseSchema, postEditsSchema } from '../../shared/contracts/edits';
import { MAX_DOCUMENT_BYTES } from '../../shared/model/spread';
import type { AppDeps } from '../app-deps';
import { presentEdit } from '../presenters/present-edit';
import { readLog } from '../services/history';
import { guardedRoute, type Route } from './define-route';
import { spreadParamsSchema } from './spreads';

/** Two edits that each replace a whole document of the largest size, before and after. */
const MAX_EDITS_BYTES = 4 * MAX_DOCUMENT_BYTES;

export const editRoutes = ({ dataSource, services: { spreads, edits } }: AppDeps): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/spreads/:spreadId/edits',
    summary: 'The log of edits after a revision, oldest first',
    params: spreadParamsSchema,
    query: editQuerySchema,
    needs: 'spread:history',
    on: ({ spreadId }) => spreads.locate(spreadId),
    answer: { status: 200, schema: editListSchema },
    handle: async ({ subject, query }) => ({
      edits: (await readLog(dataSource.manager, subject.id, query)).map(presentEdit),
      revision: subject.revision,
    }),
  }),
  guardedRoute({
    method: 'post',
    path: '/spreads/:spreadId/edits',
    summary: 'Save edits: applied in order, one revision each, all or none',
    params: spreadParamsSchema,
    body: postEditsSchema,
    maxBodyBytes: MAX_EDITS_BYTES,
    needs: 'spread:edit',
    on: ({ spreadId }) => spreads.locate(spreadId),
    answer: { status: 200, schema: postEditsResponseSchema },
    errors: ['stale-revision', 'document-refused', 'already-exists', 'too-large'],
    handle: async ({ actor, subject, body }) => {
      const { revision, missed } = await edits.post(subject.id, body, actor);
      return { revision, missed: missed.map(presentEdit) };
    },
  }),
];
