import { pipeline } from 'node:stream/promises';
import type { Request, Response } from 'express';
import type { StoredFile } from '../storage/storage';

/** Streams a stored file as the answer; headers are set before. Somebody who walks away is no error. */
export async function sendStored(req: Request, res: Response, { stream, sizeBytes }: StoredFile): Promise<void> {
  res.set('Content-Length', String(sizeBytes));
  if (req.method === 'HEAD') {
    stream.destroy();
    res.end();
    return;
  }
  try {
    await pipeline(stream, res);
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'ERR_STREAM_PREMATURE_CLOSE')) throw error;
  }
}
