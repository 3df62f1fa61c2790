import { open } from 'node:fs/promises';
import { fileTypeFromFile } from 'file-type';
import sharp, { type Metadata } from 'sharp';
import { MAX_PIXELS } from '../../shared/contracts/prints';
import type { PictureRefusal } from '../../shared/model/picture-refusal';
import { Refusal } from './worker-messages';

/** sharp's name of each kind of picture that we take. */
const TAKEN = new Map<string, Metadata['format']>([
  ['image/jpeg', 'jpeg'],
  ['image/png', 'png'],
  ['image/webp', 'webp'],
  ['image/tiff', 'tiff'],
  ['image/avif', 'heif'],
]);

const REFUSED = new Map<string, PictureRefusal>([
  ['image/gif', 'gif'],
  ['application/pdf', 'pdf'],
  ['image/heic', 'heic'],
  ['image/heif', 'heic'],
  ['image/heic-sequence', 'heic'],
  ['image/heif-sequence', 'heic'],
  ['image/apng', 'animated'],
]);

/** Under this many pixels on the short side nothing can be seen on a print. */
const MIN_SHORT_SIDE_PX = 16;
const SNIFF_BYTES = 4096;

export interface Identified {
  readonly mediaType: string;
  /** Size of the EXIF-oriented picture. */
  readonly width: number;
  readonly height: number;
}

/**
 * Says by content alone what a file is, reading headers only: first its magic number, so that the decoders never see a
 * kind that we do not take, then the decoder's own view of it, which must agree.
 *
 * @throws Refusal with a `PictureRefusal` code.
 */
export async function identifyPicture(path: string): Promise<Identified> {
  const mediaType = await takenMediaType(path);
  // No pixel limit here: this reads the header only, and the sentence names the true size.
  const metadata = await sharp(path, { limitInputPixels: false })
    .metadata()
    .catch(() => {
      throw new Refusal('damaged' satisfies PictureRefusal);
    });
  if (metadata.format !== TAKEN.get(mediaType)) throw new Refusal('damaged' satisfies PictureRefusal);
  if (metadata.format === 'heif' && metadata.compression !== 'av1') throw new Refusal('heic' satisfies PictureRefusal);

  const { width, height } = metadata.autoOrient;
  if (width * height > MAX_PIXELS) {
    throw new Refusal('too-many-pixels' satisfies PictureRefusal, { width, height, max: MAX_PIXELS });
  }
  if (Math.min(width, height) < MIN_SHORT_SIDE_PX) throw new Refusal('too-small' satisfies PictureRefusal, { width, height });
  const pages = metadata.pages ?? 1;
  if (pages > 1) {
    // Taking only the first page would lose the others without a word.
    if (metadata.format === 'tiff') throw new Refusal('several-pages' satisfies PictureRefusal, { pages });
    throw new Refusal('animated' satisfies PictureRefusal, { pages });
  }
  return { mediaType, width, height };
}

async function takenMediaType(path: string): Promise<string> {
  const head = await readHead(path);
  if (head.length === 0) throw new Refusal('empty' satisfies PictureRefusal);
  const type = await fileTypeFromFile(path);
  if (type && TAKEN.has(type.mime)) return type.mime;
  if (/<svg[\s>]/i.test(head.toString('latin1'))) throw new Refusal('svg' satisfies PictureRefusal);
  const refused = REFUSED.get(type?.mime ?? '');
  if (refused) throw new Refusal(refused);
  if (!type?.mime.startsWith('image/')) throw new Refusal('not-a-picture' satisfies PictureRefusal);
  throw new Refusal('other-kind' satisfies PictureRefusal, { kind: type.ext.toUpperCase() });
}

async function readHead(path: string): Promise<Buffer> {
  const file = await open(path, 'r');
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(SNIFF_BYTES), 0, SNIFF_BYTES, 0);
    return buffer.subarray(0, bytesRead);
  } finally {
    await file.close();
  }
}
