import type { Readable } from 'node:stream';
import type { StudioId } from '../../shared/model/ids';
import type { PictureSize } from '../../shared/contracts/prints';

/** The name of one stored file: lower-case segments joined by `/`, always within one studio. MODEL.md 12. */
export type StorageKey = string & { readonly __key?: 'storage' };

const SEGMENT = /^[a-z0-9][a-z0-9.-]{0,127}$/;

/** @throws Error for a segment that could leave the studio's folder; keys are never made from what people type. */
function keyOf(...segments: readonly string[]): StorageKey {
  const unfit = segments.find((segment) => !SEGMENT.test(segment) || segment.includes('..'));
  if (unfit !== undefined) throw new Error(`Not a storage key segment: ${JSON.stringify(unfit)}`);
  return segments.join('/');
}

/** The untouched original, named by its SHA-256 in lower-case hex. */
export const originalKey = (studioId: StudioId, sha256: string): StorageKey => keyOf(studioId, 'originals', sha256);

/** A size made for screens from the original of that SHA-256. */
export const pictureKey = (studioId: StudioId, sha256: string, size: PictureSize): StorageKey =>
  keyOf(studioId, 'pictures', `${sha256}-${size}.webp`);

/** The result of an export job. */
export const exportKey = (studioId: StudioId, jobId: string, extension: string): StorageKey =>
  keyOf(studioId, 'exports', `${jobId}.${extension}`);

export interface StoredFile {
  readonly sizeBytes: number;
  readonly stream: Readable;
}

/** A stored file under a path that a worker process can open; `release` it when done. */
export interface LocalCopy {
  readonly path: string;
  release(): Promise<void>;
}

/**
 * Where files live. A put is whole or absent, never half, and repeating it is harmless. The local disk implements it
 * today; a service that speaks S3 can later.
 */
export interface Storage {
  /** Takes the file at `sourcePath` over: afterwards it is stored under `key` and gone from `sourcePath`. */
  put(key: StorageKey, sourcePath: string): Promise<void>;
  /** Null when nothing is stored under the key. The caller reads or destroys the stream. */
  get(key: StorageKey): Promise<StoredFile | null>;
  /** Null when nothing is stored under the key. */
  localCopy(key: StorageKey): Promise<LocalCopy | null>;
  exists(key: StorageKey): Promise<boolean>;
  /** Deleting what is not there is no error. */
  delete(key: StorageKey): Promise<void>;
  /** Bytes that can still be stored; null where the service has no such limit. */
  freeBytes(): Promise<number | null>;
}
