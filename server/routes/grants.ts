import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { createdGrantSchema, createGrantSchema, grantListSchema } from '../../shared/contracts/grants';
import { presentCreatedGrant, presentGrant } from '../presenters/present-studio';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

const grantParamsSchema = z.strictObject({ grantId: idSchema });

export const grantRoutes = ({ grants, studios }: Services): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/studios/:studioId/grants',
    summary: 'Links and other grants of a studio, without their tokens',
    params: studioParamsSchema,
    needs: 'grant:see',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 200, schema: grantListSchema },
    handle: async ({ subject }) => ({ grants: (await grants.list(subject.id)).map(presentGrant) }),
  }),
  guardedRoute({
    method: 'post',
    path: '/studios/:studioId/grants',
    summary: 'Make a grant; its token is told this once',
    params: studioParamsSchema,
    body: createGrantSchema,
    needs: 'grant:edit',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 201, schema: createdGrantSchema },
    errors: ['already-exists'],
    handle: async ({ actor, subject, body }) => {
      const { grant, token } = await grants.create(subject.id, body, actor);
      return presentCreatedGrant(grant, token);
    },
  }),
  guardedRoute({
    method: 'delete',
    path: '/grants/:grantId',
    summary: 'Withdraw a grant',
    params: grantParamsSchema,
    needs: 'grant:edit',
    on: ({ grantId }) => grants.locate(grantId),
    answer: { status: 204 },
    handle: async ({ actor, subject }) => grants.withdraw(subject, actor),
  }),
];
