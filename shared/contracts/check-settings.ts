import { z } from 'zod';
import { CHECK_IDS } from '../checks/check-ids';
import { idSchema } from './common';

const NAMES_MAX = 40;
const thresholdsSchema = z.record(z.string().min(1).max(NAMES_MAX), z.number());

/** What a studio or a spread says about one check; null leaves it to the studio, or to the check itself. */
export const checkSettingSchema = z.object({
  checkId: z.enum(CHECK_IDS),
  muted: z.boolean().nullable(),
  /** Only the thresholds that are set. */
  thresholds: z.record(z.string(), z.number()),
});
export type CheckSetting = z.infer<typeof checkSettingSchema>;

/** Only checks of which something is said; order is of no meaning. */
export const checkSettingListSchema = z.object({ checks: z.array(checkSettingSchema) });
export type CheckSettingList = z.infer<typeof checkSettingListSchema>;

/** A key that is left out stays as it is; null takes it back. Thresholds are replaced as a whole. */
export const updateCheckSettingSchema = z.strictObject({
  muted: z.boolean().nullable().optional(),
  thresholds: thresholdsSchema.nullable().optional(),
});
export type UpdateCheckSetting = z.infer<typeof updateCheckSettingSchema>;

export const studioCheckParamsSchema = z.strictObject({ studioId: idSchema, checkId: z.enum(CHECK_IDS) });
export const spreadCheckParamsSchema = z.strictObject({ spreadId: idSchema, checkId: z.enum(CHECK_IDS) });

/** What is said about checks for one spread: by its studio, and by itself, which goes before. */
export const checkSettingsSchema = z.object({ studio: z.array(checkSettingSchema), spread: z.array(checkSettingSchema) });
export type CheckSettings = z.infer<typeof checkSettingsSchema>;
