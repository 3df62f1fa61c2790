import type { DataSource } from 'typeorm';
import type { Config } from '../config';
import type { ExportPool, IntakePool, ReadingPool } from '../images/pools';
import type { Incoming } from '../storage/incoming';
import { requireFreeDisk } from '../storage/free-disk';
import type { Storage } from '../storage/storage';
import { AccountService } from './account-service';
import { AlbumService } from './album-service';
import { CheckSettingService } from './check-setting-service';
import { CutSizeService } from './cut-size-service';
import { EditService } from './edit-service';
import { ExportService } from './export-service';
import { FormatService } from './format-service';
import { GrantService } from './grant-service';
import { JobService } from './job-service';
import { PileService } from './pile-service';
import { PrintService } from './print-service';
import { createReceiveUpload, type ReceiveUpload } from './receive-upload';
import { ReservationService } from './reservation-service';
import { SpreadService } from './spread-service';
import { StashImport } from './stash-import';
import { StashReading } from './stash-reading';
import { StashService } from './stash-service';
import { StudioService } from './studio-service';
import { UploadService } from './upload-service';

/** One service per noun, each made once. */
export interface Services {
  readonly accounts: AccountService;
  readonly studios: StudioService;
  readonly grants: GrantService;
  readonly formats: FormatService;
  readonly albums: AlbumService;
  readonly spreads: SpreadService;
  readonly edits: EditService;
  readonly prints: PrintService;
  readonly piles: PileService;
  readonly cutSizes: CutSizeService;
  readonly checkSettings: CheckSettingService;
  readonly jobs: JobService;
  readonly uploads: UploadService;
  /** Reads the body of an upload to disk. */
  readonly receive: ReceiveUpload;
  readonly exports: ExportService;
  readonly stash: StashService;
  readonly stashImport: StashImport;
  readonly stashReading: StashReading;
  readonly reservations: ReservationService;
}

export interface ServiceDeps {
  readonly config: Config;
  readonly dataSource: DataSource;
  readonly storage: Storage;
  readonly incoming: Incoming;
  readonly intakePool: IntakePool;
  readonly exportPool: ExportPool;
  readonly readingPool: ReadingPool;
  /** E-mail addresses of accounts that nobody can use. */
  readonly closedAccounts: ReadonlySet<string>;
  readonly now: () => Date;
}

export function createServices(deps: ServiceDeps): Services {
  const { config, dataSource, storage, incoming, intakePool, exportPool, readingPool, closedAccounts, now } = deps;
  const { freeDiskBytes, studioQuotaBytes, accountQuotaBytes } = config.limits;
  const jobs = new JobService(dataSource, now);
  const formats = new FormatService(dataSource, now);
  return {
    accounts: new AccountService({ dataSource, now, studioQuotaBytes, accountQuotaBytes, closedAccounts }),
    studios: new StudioService(dataSource),
    grants: new GrantService(dataSource, now),
    formats,
    albums: new AlbumService(dataSource, formats, storage, now),
    spreads: new SpreadService(dataSource, storage, now),
    edits: new EditService(dataSource, now),
    prints: new PrintService({ dataSource, storage, now }),
    piles: new PileService(dataSource, now),
    cutSizes: new CutSizeService(dataSource, now),
    checkSettings: new CheckSettingService(dataSource, now),
    jobs,
    uploads: new UploadService({ dataSource, storage, incoming, pool: intakePool, freeDiskBytes, now }),
    receive: createReceiveUpload(incoming, (bytes) => requireFreeDisk(storage, bytes, freeDiskBytes)),
    exports: new ExportService({ dataSource, storage, incoming, pool: exportPool, jobs, freeDiskBytes, now }),
    stash: new StashService(dataSource, now),
    stashImport: new StashImport(dataSource, now),
    stashReading: new StashReading(readingPool),
    reservations: new ReservationService(dataSource, now),
  };
}
