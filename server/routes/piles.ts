import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { createPileSchema, pileListSchema, pileSchema, updatePileSchema } from '../../shared/contracts/prints';
import { can } from '../../shared/permissions';
import { presentPile } from '../presenters/present-print';
import { targetOfPile } from '../services/pile-service';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

const pileParamsSchema = z.strictObject({ pileId: idSchema });

export const pileRoutes = ({ piles, studios }: Services): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/studios/:studioId/piles',
    summary: 'A studio’s piles; for contributors, those shared with them',
    params: studioParamsSchema,
    needs: 'pile:see',
    // Every member may ask for the list; what stands in it is decided pile by pile.
    on: async ({ studioId }) => {
      const { target, subject } = await studios.locate(studioId);
      return { target: { ...target, sharedWithContributors: true }, subject };
    },
    answer: { status: 200, schema: pileListSchema },
    handle: async ({ actor, subject }) => {
      const all = await piles.list(subject.id);
      return { piles: all.filter((pile) => can(actor, 'pile:see', targetOfPile(pile)) === 'allow').map(presentPile) };
    },
  }),
  guardedRoute({
    method: 'post',
    path: '/studios/:studioId/piles',
    summary: 'Make a pile',
    params: studioParamsSchema,
    body: createPileSchema,
    needs: 'pile:edit',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 201, schema: pileSchema },
    errors: ['already-exists'],
    handle: async ({ subject, body }) => presentPile(await piles.create(subject.id, body)),
  }),
  guardedRoute({
    method: 'patch',
    path: '/piles/:pileId',
    summary: 'Rename, move or share a pile',
    params: pileParamsSchema,
    body: updatePileSchema,
    needs: 'pile:edit',
    on: ({ pileId }) => piles.locate(pileId),
    answer: { status: 200, schema: pileSchema },
    handle: async ({ subject, body }) => presentPile(await piles.update(subject, body)),
  }),
  guardedRoute({
    method: 'delete',
    path: '/piles/:pileId',
    summary: 'Delete a pile; its prints stay, in no pile',
    params: pileParamsSchema,
    needs: 'pile:edit',
    on: ({ pileId }) => piles.locate(pileId),
    answer: { status: 204 },
    handle: async ({ subject }) => piles.remove(subject),
  }),
];
