/** Why a file is not taken as a picture; the sentences stand in `shared/words/en/pictures.ts`. */
export const PICTURE_REFUSALS = [
  'no-file',
  'empty',
  'not-a-picture',
  'svg',
  'gif',
  'pdf',
  'heic',
  'other-kind',
  'animated',
  'several-pages',
  'too-many-pixels',
  'too-small',
  'damaged',
  'too-heavy',
] as const;
export type PictureRefusal = (typeof PICTURE_REFUSALS)[number];

export const isPictureRefusal = (reason: unknown): reason is PictureRefusal =>
  (PICTURE_REFUSALS as readonly unknown[]).includes(reason);
