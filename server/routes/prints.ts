import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { printListSchema, printQuerySchema, printSchema, updatePrintSchema } from '../../shared/contracts/prints';
import { presentPrint } from '../presenters/present-print';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

export const printParamsSchema = z.strictObject({ printId: idSchema });

export function printRoutes({ prints, studios }: Services): Route[] {
  const on = ({ printId }: z.output<typeof printParamsSchema>) => prints.locate(printId);
  return [
    guardedRoute({
      method: 'get',
      path: '/studios/:studioId/prints',
      summary: 'A studio’s prints, oldest first, in pages',
      params: studioParamsSchema,
      query: printQuerySchema,
      needs: 'print:see',
      on: ({ studioId }) => studios.locate(studioId),
      answer: { status: 200, schema: printListSchema },
      handle: async ({ subject, query }) => {
        const page = await prints.list(subject.id, query);
        return { prints: page.prints.map(presentPrint), nextCursor: page.nextCursor };
      },
    }),
    guardedRoute({
      method: 'get',
      path: '/prints/:printId',
      summary: 'A print',
      params: printParamsSchema,
      needs: 'print:see',
      on,
      answer: { status: 200, schema: printSchema },
      handle: async ({ subject }) => presentPrint(subject),
    }),
    guardedRoute({
      method: 'patch',
      path: '/prints/:printId',
      summary: 'Change what a person sets on a print',
      params: printParamsSchema,
      body: updatePrintSchema,
      needs: 'print:edit',
      on,
      answer: { status: 200, schema: printSchema },
      errors: ['stale-revision', 'in-use'],
      handle: async ({ subject, body }) => presentPrint(await prints.update(subject, body)),
    }),
    guardedRoute({
      method: 'delete',
      path: '/prints/:printId',
      summary: 'Delete a print for good; refused while a spread uses it',
      params: printParamsSchema,
      needs: 'print:delete',
      on,
      answer: { status: 204 },
      errors: ['in-use'],
      handle: async ({ actor, subject }) => prints.remove(subject, actor),
    }),
  ];
}
