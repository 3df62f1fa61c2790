import { join } from 'node:path';
import type { DataSource } from 'typeorm';
import { createExportPool, createIntakePool } from '../images/pools';
import { Incoming, sweepIncoming } from '../storage/incoming';
import type { Storage } from '../storage/storage';
import { ExportService } from './export-service';
import type { JobService } from './job-service';
import { createReceiveUpload, type ReceiveUpload } from './receive-upload';
import { removeUnlessKnown } from './stored-pictures';
import { UploadService } from './upload-service';

interface Deps {
  readonly dataDir: string;
  readonly storage: Storage;
  readonly dataSource: DataSource;
  readonly jobs: JobService;
  readonly freeDiskBytes: number;
  readonly now: () => Date;
}

export interface PictureWork {
  readonly incoming: Incoming;
  readonly receive: ReceiveUpload;
  readonly uploads: UploadService;
  readonly exports: ExportService;
  /** Ends the worker processes and removes what is on its way. */
  close(): Promise<void>;
}

/** Opens everything that takes pictures in and draws spreads, and sweeps what crashed processes left behind. */
export async function openPictureWork({ dataDir, ...deps }: Deps): Promise<PictureWork> {
  const parent = join(dataDir, 'incoming');
  const incoming = await Incoming.open(parent);
  const { dataSource, storage } = deps;
  await sweepIncoming(parent, incoming, (pending) => removeUnlessKnown(dataSource, storage, pending));
  const intakePool = createIntakePool();
  const exportPool = createExportPool();
  const exports = new ExportService({ ...deps, incoming, pool: exportPool });
  await exports.dropExpired();
  return {
    incoming,
    receive: createReceiveUpload(incoming),
    uploads: new UploadService({ ...deps, incoming, pool: intakePool }),
    exports,
    close: async () => {
      await Promise.all([intakePool.close(), exportPool.close()]);
      await incoming.close();
    },
  };
}
