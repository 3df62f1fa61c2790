import { z } from 'zod';
import { memberListSchema, studioSchema, updateStudioSchema } from '../../shared/contracts/accounts';
import { idSchema } from '../../shared/contracts/common';
import { AppError } from '../../shared/errors';
import type { Actor, Role } from '../../shared/model/people';
import { presentMember, presentStudio } from '../presenters/present-studio';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';

export const studioParamsSchema = z.strictObject({ studioId: idSchema });

export function studioRoutes({ studios }: Services): Route[] {
  const on = ({ studioId }: z.output<typeof studioParamsSchema>) => studios.locate(studioId);
  return [
    guardedRoute({
      method: 'get',
      path: '/studios/:studioId',
      summary: 'A studio and its settings',
      params: studioParamsSchema,
      needs: 'studio:see',
      on,
      answer: { status: 200, schema: studioSchema },
      handle: async ({ actor, subject }) => presentStudio(subject, roleIn(actor, subject.id)),
    }),
    guardedRoute({
      method: 'patch',
      path: '/studios/:studioId',
      summary: 'Change a studio’s name, unit or trimmer',
      params: studioParamsSchema,
      body: updateStudioSchema,
      needs: 'studio:edit',
      on,
      answer: { status: 200, schema: studioSchema },
      handle: async ({ actor, subject, body }) => presentStudio(await studios.update(subject, body), roleIn(actor, subject.id)),
    }),
    guardedRoute({
      method: 'get',
      path: '/studios/:studioId/members',
      summary: 'The members of a studio and their roles',
      params: studioParamsSchema,
      needs: 'member:see',
      on,
      answer: { status: 200, schema: memberListSchema },
      handle: async ({ subject }) => ({ members: (await studios.members(subject.id)).map(presentMember) }),
    }),
  ];
}

/** Whoever may see a studio has a role in it. */
function roleIn(actor: Actor, studioId: string): Role {
  const role = actor.memberships.find((membership) => membership.studioId === studioId)?.role;
  if (!role) throw new AppError('not-found');
  return role;
}
