import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { rm } from 'node:fs/promises';
import { Transform } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Request, RequestHandler, Response } from 'express';
import multer, { MulterError, type StorageEngine } from 'multer';
import pLimit from 'p-limit';
import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { fieldFaults } from '../../shared/contracts/field-faults';
import { MAX_UPLOAD_BYTES } from '../../shared/contracts/prints';
import { AppError } from '../../shared/errors';
import type { Incoming } from '../storage/incoming';
import { invalidField } from './invalid-field';

export interface ReceivedUpload {
  /** In this process's incoming folder; whoever uses it removes it. */
  readonly path: string;
  readonly fileName: string;
  readonly bytes: number;
  readonly sha256: string;
  readonly id: string | undefined;
  readonly pileId: string | null;
}

/** So many bodies are read at once; the rest wait unread, so that neither memory nor sockets' buffers grow. */
const RECEIVING_AT_ONCE = 32;
const MAX_WAITING = 400;
/** A body that claims more than this is not even drained. */
const MAX_DRAINED_BYTES = 4 * MAX_UPLOAD_BYTES;
const STALL_MS = 30_000;

export const uploadFieldsSchema = z.strictObject({
  id: idSchema.optional(),
  pileId: z.union([idSchema, z.literal('').transform(() => null)]).optional(),
});

export type ReceiveUpload = (req: Request, res: Response) => Promise<ReceivedUpload>;

/**
 * Reads one multipart body with one file to disk, hashing it on the way.
 *
 * @param requireRoom - throws where so many bytes more have no room on the disk; asked before anything is read.
 * @param stallMs - who sends nothing for this long is hung up on.
 * @throws AppError `too-large` · `invalid-input` · `picture-refused` (no file) · `unavailable` when too many wait.
 */
export function createReceiveUpload(incoming: Incoming, requireRoom: (bytes: number) => Promise<void>, stallMs = STALL_MS): ReceiveUpload {
  const limit = pLimit(RECEIVING_AT_ONCE);
  const parse = multer({
    storage: hashingStorage(incoming),
    defParamCharset: 'utf8',
    // One byte more than may be: a file of exactly the limit is let through, a longer one is seen to be longer.
    limits: { fileSize: MAX_UPLOAD_BYTES + 1, files: 1, fields: 4, fieldSize: 200, fieldNameSize: 40, parts: 6, headerPairs: 40 },
  }).single('file');

  let expectedBytes = 0;

  return async (req, res) => {
    const claimed = Number(req.headers['content-length'] ?? MAX_UPLOAD_BYTES);
    if (claimed > MAX_DRAINED_BYTES) {
      res.set('Connection', 'close');
      throw new AppError('too-large', { maxBytes: MAX_UPLOAD_BYTES });
    }
    if (limit.pendingCount >= MAX_WAITING) throw new AppError('unavailable', { reason: 'busy' });
    return limit(async () => {
      expectedBytes += claimed;
      try {
        // Together with what the others are about to write: each alone might still have had room.
        await requireRoom(expectedBytes);
        await receive(parse, req, res, stallMs);
      } finally {
        expectedBytes -= claimed;
      }
      return read(req);
    });
  };
}

/** Reads the form, as long as somebody is sending it. */
async function receive(parse: RequestHandler, req: Request, res: Response, stallMs: number): Promise<void> {
  // Who left while waiting ends no more: the parser would wait for that for ever, and keep the place of another.
  if (req.destroyed) throw brokenOff();
  const { socket } = req;
  const hangUp = (): void => void socket.destroy();
  socket.setTimeout(stallMs, hangUp);
  try {
    await new Promise<void>((resolve, reject) => void parse(req, res, (error: unknown) => (error ? reject(explain(error)) : resolve())));
  } finally {
    socket.setTimeout(0).off('timeout', hangUp);
  }
}

async function read(req: Request): Promise<ReceivedUpload> {
  const { file } = req;
  if (!file) throw new AppError('picture-refused', { reason: 'no-file' });
  try {
    if (file.size > MAX_UPLOAD_BYTES) throw new AppError('too-large', { maxBytes: MAX_UPLOAD_BYTES });
    return { ...described(file), ...parseFields(req.body) };
  } catch (error) {
    await rm(file.path, { force: true });
    throw error;
  }
}

const described = (file: Express.Multer.File) => ({
  path: file.path,
  fileName: file.originalname,
  bytes: file.size,
  sha256: file.filename,
});

function parseFields(body: unknown): Pick<ReceivedUpload, 'id' | 'pileId'> {
  const fields = uploadFieldsSchema.safeParse({ ...(body as Record<string, unknown>) });
  if (!fields.success) throw new AppError('invalid-input', { where: 'body', fields: fieldFaults(fields.error.issues) });
  return { id: fields.data.id, pileId: fields.data.pileId ?? null };
}

/** Disk storage that also hashes: `filename` is the SHA-256 in hex. A body that breaks off leaves nothing. */
function hashingStorage(incoming: Incoming): StorageEngine {
  return {
    _handleFile(_req, file, done) {
      const path = incoming.path();
      const hash = createHash('sha256');
      let size = 0;
      const measure = new Transform({
        transform(chunk: Buffer, _encoding, next) {
          hash.update(chunk);
          size += chunk.length;
          next(null, chunk);
        },
      });
      pipeline(file.stream, measure, createWriteStream(path, { flags: 'wx', mode: 0o600 })).then(
        () => done(null, { path, size, filename: hash.digest('hex') }),
        (error: unknown) => void rm(path, { force: true }).finally(() => done(error)),
      );
    },
    _removeFile(_req, file, done) {
      rm(file.path, { force: true }).then(() => done(null), done);
    },
  };
}

const brokenOff = (): AppError => invalidField('file', 'the form broke off or is no multipart form');

function explain(error: unknown): Error {
  if (error instanceof MulterError) {
    if (error.code === 'LIMIT_FILE_SIZE') return new AppError('too-large', { maxBytes: MAX_UPLOAD_BYTES });
    const message = error.code === 'LIMIT_UNEXPECTED_FILE' ? 'there is no such file part; the picture is `file`' : 'more than this form holds';
    return invalidField(error.field ?? 'file', message);
  }
  if (error instanceof Error && isDiskFull(error)) return new AppError('disk-full');
  // What busboy says of a body that is no multipart form, or that breaks off.
  if (error instanceof Error && /multipart|form|boundary|header|aborted|closed|premature/i.test(error.message)) {
    return brokenOff();
  }
  return error instanceof Error ? error : new Error(String(error));
}

const isDiskFull = (error: Error): boolean => 'code' in error && error.code === 'ENOSPC';
