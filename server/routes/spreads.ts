import { z } from 'zod';
import {
  binQuerySchema,
  createSpreadSchema,
  spreadDetailSchema,
  spreadListSchema,
  spreadSummarySchema,
  updateSpreadSchema,
} from '../../shared/contracts/albums';
import { idSchema } from '../../shared/contracts/common';
import type { AppDeps } from '../app-deps';
import { presentPrint } from '../presenters/present-print';
import { presentSpread, presentSpreadDetail } from '../presenters/present-spread';
import { readDocument } from '../services/spread-service';
import { loadNamedPrints, loadSpreadSetting } from '../services/spread-setting';
import { albumParamsSchema } from './albums';
import { guardedRoute, type Route } from './define-route';

export const spreadParamsSchema = z.strictObject({ spreadId: idSchema });

export function spreadRoutes({ dataSource, services: { albums, spreads, checkSettings } }: AppDeps): Route[] {
  const on = ({ spreadId }: z.output<typeof spreadParamsSchema>) => spreads.locate(spreadId);
  return [
    guardedRoute({
      method: 'get',
      path: '/albums/:albumId/spreads',
      summary: 'An album’s spreads in their order, with every print that they show',
      params: albumParamsSchema,
      query: binQuerySchema,
      needs: 'album:see',
      on: ({ albumId }) => albums.locate(albumId),
      answer: { status: 200, schema: spreadListSchema },
      handle: async ({ subject, query }) => {
        const found = await spreads.list(subject.id, query);
        const prints = await loadNamedPrints(dataSource, subject.studioId, found.map(readDocument));
        return { spreads: found.map(presentSpread), prints: prints.map(presentPrint) };
      },
    }),
    guardedRoute({
      method: 'post',
      path: '/albums/:albumId/spreads',
      summary: 'Add a bare spread at the end of an album',
      params: albumParamsSchema,
      body: createSpreadSchema,
      needs: 'album:edit',
      on: ({ albumId }) => albums.locate(albumId),
      answer: { status: 201, schema: spreadSummarySchema },
      errors: ['already-exists'],
      handle: async ({ subject, body }) => presentSpread(await spreads.create(subject, body)),
    }),
    guardedRoute({
      method: 'get',
      path: '/spreads/:spreadId',
      summary: 'A spread with all that composing needs',
      params: spreadParamsSchema,
      needs: 'spread:see',
      on,
      answer: { status: 200, schema: spreadDetailSchema },
      handle: async ({ actor, subject }) => presentSpreadDetail(subject, await loadSpreadSetting(dataSource, checkSettings, subject), actor),
    }),
    guardedRoute({
      method: 'patch',
      path: '/spreads/:spreadId',
      summary: 'Rename a spread, move it in its album, or put it into the bin and take it out',
      params: spreadParamsSchema,
      body: updateSpreadSchema,
      needs: 'spread:edit',
      on,
      answer: { status: 200, schema: spreadSummarySchema },
      handle: async ({ subject, body }) => presentSpread(await spreads.update(subject, body)),
    }),
    guardedRoute({
      method: 'delete',
      path: '/spreads/:spreadId',
      summary: 'Delete a spread and its history for good',
      params: spreadParamsSchema,
      needs: 'spread:delete',
      on,
      answer: { status: 204 },
      handle: async ({ actor, subject }) => spreads.remove(subject, actor),
    }),
  ];
}
