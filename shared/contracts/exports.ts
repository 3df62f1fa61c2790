import { z } from 'zod';
import { idSchema, instantSchema, revisionSchema } from './common';

export const EXPORT_FORMATS = ['png', 'jpeg'] as const;
/** `screen`: 2400 px wide. `print`: 300 pixels per inch of true page size. */
export const EXPORT_SIZES = ['screen', 'print'] as const;
export const SCREEN_EXPORT_WIDTH_PX = 2400;
export const PRINT_PPI = 300;
/** For so long an export's file can be fetched. */
export const KEEP_EXPORTS_DAYS = 7;

export const createExportSchema = z.strictObject({
  id: idSchema,
  format: z.enum(EXPORT_FORMATS),
  size: z.enum(EXPORT_SIZES),
  /** The revision that the person saw; the export waits for nothing newer and refuses an unknown one. */
  revision: revisionSchema,
});
export type CreateExport = z.infer<typeof createExportSchema>;

export const JOB_STATES = ['waiting', 'running', 'done', 'failed'] as const;
export const jobSchema = z.object({
  id: idSchema,
  kind: z.string(),
  state: z.enum(JOB_STATES),
  /** 0 to 1. */
  progress: z.number(),
  /** A sentence, when failed. */
  failure: z.string().nullable(),
  /** Where the result can be fetched once done. */
  resultUrl: z.string().nullable(),
  createdAt: instantSchema,
});
export type Job = z.infer<typeof jobSchema>;
