import { create as contentDisposition } from 'content-disposition';
import { z } from 'zod';
import { REFERENCES, type Reference } from '../../shared/colour/white-balance';
import { idSchema } from '../../shared/contracts/common';
import {
  bulkStashSchema,
  colorReadingSchema,
  createStashSheetSchema,
  importedStashSchema,
  importStashSchema,
  MAX_CSV_BYTES,
  reservationListSchema,
  reserveStashSchema,
  stashListSchema,
  stashSheetSchema,
  updateStashSheetSchema,
} from '../../shared/contracts/stash';
import { writeStashCsv } from '../../shared/csv/stash-csv';
import { presentReservation, presentStashSheet } from '../presenters/present-stash';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

const sheetParamsSchema = z.strictObject({ sheetId: idSchema });
const spreadParamsSchema = z.strictObject({ spreadId: idSchema });
const shareSchema = z.coerce.number().min(0).max(1);
/** Where the marks stand on the upright photo, as shares of its width and height; left out, the sheet is in the middle and the patch at the top left. */
const readingQuerySchema = z.strictObject({
  sheetX: shareSchema.default(0.5),
  sheetY: shareSchema.default(0.5),
  patchX: shareSchema.default(0.15),
  patchY: shareSchema.default(0.15),
  reference: z.enum(Object.keys(REFERENCES) as [Reference, ...Reference[]]).default('white'),
});

/** JSON escapes quotes and line ends, so a body may be longer than the text in it. */
const MAX_IMPORT_BODY = 2 * MAX_CSV_BYTES + 1024;

export function stashRoutes({ stash, stashImport, stashReading, reservations, receive, spreads, studios }: Services): Route[] {
  const onStudio = ({ studioId }: z.output<typeof studioParamsSchema>) => studios.locate(studioId);
  const onSheet = ({ sheetId }: z.output<typeof sheetParamsSchema>) => stash.locate(sheetId);
  const onSpread = ({ spreadId }: z.output<typeof spreadParamsSchema>) => spreads.locate(spreadId);
  return [
    guardedRoute({
      method: 'get',
      path: '/studios/:studioId/stash',
      summary: 'The sheets of a studio, with how many of each are reserved',
      params: studioParamsSchema,
      needs: 'stash:see',
      on: onStudio,
      answer: { status: 200, schema: stashListSchema },
      handle: async ({ subject }) => ({ sheets: (await stash.list(subject.id)).map(presentStashSheet) }),
    }),
    guardedRoute({
      method: 'post',
      path: '/studios/:studioId/stash',
      summary: 'Add sheets of one kind',
      params: studioParamsSchema,
      body: createStashSheetSchema,
      needs: 'stash:edit',
      on: onStudio,
      answer: { status: 201, schema: stashSheetSchema },
      errors: ['already-exists'],
      handle: async ({ subject, body }) => presentStashSheet(await stash.create(subject.id, body)),
    }),
    guardedRoute({
      method: 'patch',
      path: '/stash-sheets/:sheetId',
      summary: 'Change what is known of sheets',
      params: sheetParamsSchema,
      body: updateStashSheetSchema,
      needs: 'stash:edit',
      on: onSheet,
      answer: { status: 200, schema: stashSheetSchema },
      errors: ['stale-revision', 'stash-short'],
      handle: async ({ subject, body }) => presentStashSheet(await stash.update(subject, body)),
    }),
    guardedRoute({
      method: 'delete',
      path: '/stash-sheets/:sheetId',
      summary: 'Take sheets off the list; refused while some are reserved',
      params: sheetParamsSchema,
      needs: 'stash:edit',
      on: onSheet,
      answer: { status: 204 },
      errors: ['in-use'],
      handle: async ({ subject }) => stash.remove(subject),
    }),
    guardedRoute({
      method: 'post',
      path: '/studios/:studioId/stash/bulk',
      summary: 'Give many sheets the same values, all of them or none',
      params: studioParamsSchema,
      body: bulkStashSchema,
      needs: 'stash:edit',
      on: onStudio,
      answer: { status: 200, schema: stashListSchema },
      errors: ['stash-short'],
      handle: async ({ subject, body }) => ({ sheets: (await stash.updateMany(subject.id, body)).map(presentStashSheet) }),
    }),
    guardedRoute({
      method: 'get',
      path: '/studios/:studioId/stash/file',
      summary: 'The stash as a CSV file',
      params: studioParamsSchema,
      needs: 'stash:see',
      on: onStudio,
      answer: { status: 200, streams: ['text/csv'] },
      handle: async ({ subject, res }) => {
        const sheets = (await stash.list(subject.id)).map(presentStashSheet);
        res.set({ 'Content-Type': 'text/csv; charset=utf-8', 'Content-Disposition': contentDisposition('stash.csv'), 'X-Content-Type-Options': 'nosniff' });
        res.send(writeStashCsv(sheets));
      },
    }),
    guardedRoute({
      method: 'post',
      path: '/studios/:studioId/stash/import',
      summary: 'Bring sheets in from a CSV file; rows that do not fit come back by line',
      params: studioParamsSchema,
      body: importStashSchema,
      maxBodyBytes: MAX_IMPORT_BODY,
      needs: 'stash:edit',
      on: onStudio,
      answer: { status: 200, schema: importedStashSchema },
      handle: async ({ subject, body }) => stashImport.take(subject.id, body.id, body.csv),
    }),
    guardedRoute({
      method: 'post',
      path: '/studios/:studioId/stash/readings',
      summary: 'Read a sheet’s colour from a photo of it beside a white or grey patch; the photo is not kept',
      params: studioParamsSchema,
      query: readingQuerySchema,
      body: { multipart: z.strictObject({}), files: ['file'] },
      needs: 'stash:edit',
      on: onStudio,
      answer: { status: 200, schema: colorReadingSchema },
      errors: ['picture-refused', 'reading-refused', 'too-large', 'disk-full', 'unavailable'],
      handle: async ({ query, req, res }) => {
        const { sheetX, sheetY, patchX, patchY, reference } = query;
        return stashReading.read(await receive(req, res), { sheet: { x: sheetX, y: sheetY }, patch: { x: patchX, y: patchY }, reference });
      },
    }),
    guardedRoute({
      method: 'get',
      path: '/spreads/:spreadId/reservations',
      summary: 'The sheets set aside for a spread',
      params: spreadParamsSchema,
      needs: 'stash:see',
      on: onSpread,
      answer: { status: 200, schema: reservationListSchema },
      handle: async ({ subject }) => ({ reservations: (await reservations.list(subject.id)).map(presentReservation) }),
    }),
    guardedRoute({
      method: 'post',
      path: '/spreads/:spreadId/reservations',
      summary: 'Set sheets aside for a spread, in the place of what it had; an empty list gives all back',
      params: spreadParamsSchema,
      body: reserveStashSchema,
      needs: 'stash:edit',
      on: onSpread,
      answer: { status: 200, schema: reservationListSchema },
      errors: ['stash-short'],
      handle: async ({ subject, body }) => ({ reservations: (await reservations.reserve(subject, body.sheets)).map(presentReservation) }),
    }),
  ];
}
