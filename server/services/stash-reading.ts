import { rm } from 'node:fs/promises';
import type { ReadColor, Reference } from '../../shared/colour/white-balance';
import type { Mark } from '../../shared/contracts/stash';
import { AppError } from '../../shared/errors';
import type { PictureRefusal } from '../../shared/model/picture-refusal';
import { isPictureRefusal } from '../../shared/model/picture-refusal';
import type { ReadingPool } from '../images/pools';
import { Refusal } from '../images/worker-messages';
import { WorkerEndedError } from '../images/worker-process';
import type { ReceivedUpload } from './receive-upload';

export interface Marks {
  readonly sheet: Mark;
  readonly patch: Mark;
  readonly reference: Reference;
}

/** Reads a sheet's colour from a photo, which is not kept. */
export class StashReading {
  constructor(private readonly pool: ReadingPool) {}

  /** @throws AppError `picture-refused` · `reading-refused` · `unavailable`. */
  async read({ path }: ReceivedUpload, marks: Marks): Promise<ReadColor> {
    try {
      return await this.pool.run({ sourcePath: path, ...marks });
    } catch (error) {
      if (error instanceof Refusal) throw new AppError(isPictureRefusal(error.reason) ? 'picture-refused' : 'reading-refused', { reason: error.reason, ...error.data });
      if (!(error instanceof WorkerEndedError)) throw error;
      if (error.end === 'stopped') throw new AppError('unavailable', { reason: 'stopping' });
      throw new AppError('picture-refused', { reason: (error.end === 'crash' ? 'damaged' : 'too-heavy') satisfies PictureRefusal });
    } finally {
      await rm(path, { force: true });
    }
  }
}
