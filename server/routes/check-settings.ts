import { checkSettingListSchema, spreadCheckParamsSchema, studioCheckParamsSchema, updateCheckSettingSchema } from '../../shared/contracts/check-settings';
import { presentCheckSetting } from '../presenters/present-check-setting';
import type { CheckSettingEntity } from '../entities/check-setting-entity';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';
import { studioParamsSchema } from './studios';

const present = (settings: readonly CheckSettingEntity[]) => ({ checks: settings.map(presentCheckSetting) });

/** Muting and thresholds: for all of a studio's spreads, or for one. What holds for a spread comes with the spread itself. */
export const checkSettingRoutes = ({ checkSettings, studios, spreads }: Services): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/studios/:studioId/checks',
    summary: 'What a studio says about checks: muted ones, and thresholds',
    params: studioParamsSchema,
    needs: 'check:see',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 200, schema: checkSettingListSchema },
    handle: async ({ subject }) => present(await checkSettings.list({ studioId: subject.id, spreadId: null })),
  }),
  guardedRoute({
    method: 'patch',
    path: '/studios/:studioId/checks/:checkId',
    summary: 'Mute a check, hear it again, or set its thresholds, for all spreads of a studio',
    params: studioCheckParamsSchema,
    body: updateCheckSettingSchema,
    needs: 'check:edit',
    on: ({ studioId }) => studios.locate(studioId),
    answer: { status: 200, schema: checkSettingListSchema },
    handle: async ({ subject, params, body }) => present(await checkSettings.update({ studioId: subject.id, spreadId: null }, params.checkId, body)),
  }),
  guardedRoute({
    method: 'patch',
    path: '/spreads/:spreadId/checks/:checkId',
    summary: 'Mute a check, hear it again, or set its thresholds, for one spread',
    params: spreadCheckParamsSchema,
    body: updateCheckSettingSchema,
    needs: 'spread:edit',
    on: ({ spreadId }) => spreads.locate(spreadId),
    answer: { status: 200, schema: checkSettingListSchema },
    handle: async ({ subject, params, body }) => present(await checkSettings.update({ studioId: subject.studioId, spreadId: subject.id }, params.checkId, body)),
  }),
];
