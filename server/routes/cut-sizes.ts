import { z } from 'zod';
import { formatListSchema } from '../../shared/contracts/albums';
import { idSchema } from '../../shared/contracts/common';
import { cutSizeListSchema, cutSizeSchema, updateCutSizeSchema } from '../../shared/contracts/cut-sizes';
import { pageFormatSchema } from '../../shared/contracts/document';
import { presentCutSize } from '../presenters/present-album';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

const cutSizeParamsSchema = z.strictObject({ cutSizeId: idSchema });

export const cutSizeRoutes = ({ cutSizes, studios }: Services): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/studios/:studioId/cut-sizes',
    summary: 'The pieces that a studio can cut',
    params: studioParamsSchema,
    needs: 'cut-size:see',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 200, schema: cutSizeListSchema },
    handle: async ({ subject }) => ({ cutSizes: (await cutSizes.list(subject.id)).map(presentCutSize) }),
  }),
  guardedRoute({
    method: 'post',
    path: '/studios/:studioId/cut-sizes',
    summary: 'Add a cut size',
    params: studioParamsSchema,
    body: cutSizeSchema,
    needs: 'cut-size:edit',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 201, schema: cutSizeSchema },
    errors: ['already-exists'],
    handle: async ({ subject, body }) => presentCutSize(await cutSizes.create(subject.id, body)),
  }),
  guardedRoute({
    method: 'patch',
    path: '/cut-sizes/:cutSizeId',
    summary: 'Change a cut size',
    params: cutSizeParamsSchema,
    body: updateCutSizeSchema,
    needs: 'cut-size:edit',
    on: ({ cutSizeId }) => cutSizes.locate(cutSizeId),
    answer: { status: 200, schema: cutSizeSchema },
    handle: async ({ subject, body }) => presentCutSize(await cutSizes.update(subject, body)),
  }),
  guardedRoute({
    method: 'delete',
    path: '/cut-sizes/:cutSizeId',
    summary: 'Delete a cut size',
    params: cutSizeParamsSchema,
    needs: 'cut-size:edit',
    on: ({ cutSizeId }) => cutSizes.locate(cutSizeId),
    answer: { status: 204 },
    handle: async ({ subject }) => cutSizes.remove(subject),
  }),
];

export const formatRoutes = ({ formats, studios }: Services): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/studios/:studioId/formats',
    summary: 'The page formats that a studio can use',
    params: studioParamsSchema,
    needs: 'cut-size:see',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 200, schema: formatListSchema },
    handle: async ({ subject }) => ({ formats: await formats.list(subject.id) }),
  }),
  guardedRoute({
    method: 'post',
    path: '/studios/:studioId/formats',
    summary: 'Add a page format of the studio’s own',
    params: studioParamsSchema,
    body: pageFormatSchema,
    needs: 'format:edit',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 201, schema: pageFormatSchema },
    errors: ['already-exists'],
    handle: async ({ subject, body }) => formats.create(subject.id, body),
  }),
];
