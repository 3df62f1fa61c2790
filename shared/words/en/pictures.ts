import type { ErrorData } from '../../errors';
import { isPictureRefusal, type PictureRefusal } from '../../model/picture-refusal';

const KINDS = 'JPEG, PNG, WebP, TIFF or AVIF';

/** The title of a print whose file name says nothing readable. */
export const UNTITLED_PRINT = 'Untitled print';

const SENTENCES: Record<PictureRefusal, (data: ErrorData) => string> = {
  'no-file': () => `No file arrived: choose one ${KINDS} file and send it again.`,
  empty: () => 'This file is empty, so it was probably not copied whole: copy it again from the camera or phone.',
  'not-a-picture': () => `This file is not a picture, whatever its name says: choose a ${KINDS} file.`,
  svg: () => `This is an SVG drawing, not a photograph: save it as PNG and add that.`,
  gif: () => 'This is a GIF, which holds too few colours for a photograph: save it as JPEG or PNG and add that.',
  pdf: () => 'This is a PDF: save the photograph in it as JPEG and add that.',
  heic: () => 'This is a HEIC picture, which cannot be read here yet: save it as JPEG and add that.',
  'other-kind': ({ kind }) => `This is a picture of the kind ${String(kind)}, which cannot be read here: save it as ${KINDS} and add that.`,
  animated: () => 'This is an animation: save the one picture that you want as JPEG and add that.',
  'several-pages': ({ pages }) => `This file holds ${String(pages)} pages: save each page as a file of its own and add those.`,
  'too-many-pixels': ({ width, height, max }) =>
    `This picture has ${String(width)} × ${String(height)} pixels, more than ${Number(max) / 1e6} megapixels: save a smaller copy and add that.`,
  'too-small': ({ width, height }) =>
    `This picture has only ${String(width)} × ${String(height)} pixels, too few to show a print: choose a larger copy.`,
  damaged: () => 'This picture is damaged or cut short: copy it again from the camera or phone, or save it again as JPEG.',
  'too-heavy': () => 'This picture takes more memory or time to read than one picture may: save it again as JPEG and add that.',
};

/** One sentence for a `picture-refused` error: what is wrong with the file, and what to do. */
export function pictureRefusalSentence(data: ErrorData): string {
  return SENTENCES[isPictureRefusal(data.reason) ? data.reason : 'damaged'](data);
}

/** A file over the size limit never becomes a picture, so it has a sentence of its own. */
export const fileTooLargeSentence = (maxBytes: number): string =>
  `This file is larger than ${Math.floor(maxBytes / (1024 * 1024))} MB: save a smaller copy and add that.`;
