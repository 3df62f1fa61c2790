import { z } from 'zod';
import { albumListSchema, albumSchema, binQuerySchema, createAlbumSchema, updateAlbumSchema } from '../../shared/contracts/albums';
import { idSchema } from '../../shared/contracts/common';
import { presentAlbum } from '../presenters/present-album';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

export const albumParamsSchema = z.strictObject({ albumId: idSchema });

export function albumRoutes({ albums, studios }: Services): Route[] {
  const on = ({ albumId }: z.output<typeof albumParamsSchema>) => albums.locate(albumId);
  return [
    guardedRoute({
      method: 'get',
      path: '/studios/:studioId/albums',
      summary: 'A studio’s albums',
      params: studioParamsSchema,
      query: binQuerySchema,
      needs: 'album:see',
      on: ({ studioId }) => studios.locate(studioId),
      answer: { status: 200, schema: albumListSchema },
      handle: async ({ subject, query }) => ({ albums: (await albums.list(subject.id, query)).map(presentAlbum) }),
    }),
    guardedRoute({
      method: 'post',
      path: '/studios/:studioId/albums',
      summary: 'Begin an album',
      params: studioParamsSchema,
      body: createAlbumSchema,
      needs: 'album:edit',
      on: ({ studioId }) => studios.locate(studioId),
      answer: { status: 201, schema: albumSchema },
      errors: ['already-exists'],
      handle: async ({ subject, body }) => presentAlbum(await albums.create(subject.id, body)),
    }),
    guardedRoute({
      method: 'get',
      path: '/albums/:albumId',
      summary: 'An album',
      params: albumParamsSchema,
      needs: 'album:see',
      on,
      answer: { status: 200, schema: albumSchema },
      handle: async ({ subject }) => presentAlbum(await albums.count(subject)),
    }),
    guardedRoute({
      method: 'patch',
      path: '/albums/:albumId',
      summary: 'Change an album’s title or binding, or put it into the bin and take it out',
      params: albumParamsSchema,
      body: updateAlbumSchema,
      needs: 'album:edit',
      on,
      answer: { status: 200, schema: albumSchema },
      handle: async ({ subject, body }) => presentAlbum(await albums.update(subject, body)),
    }),
    guardedRoute({
      method: 'delete',
      path: '/albums/:albumId',
      summary: 'Delete an album and its spreads for good',
      params: albumParamsSchema,
      needs: 'album:delete',
      on,
      answer: { status: 204 },
      handle: async ({ actor, subject }) => albums.remove(subject, actor),
    }),
  ];
}
