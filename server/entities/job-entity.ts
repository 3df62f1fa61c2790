import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { JOB_STATES, type Job } from '../../shared/contracts/exports';
import type { ErrorCode, ErrorData } from '../../shared/errors';
import { instant, optionalInstant } from './columns';
import { SpreadEntity } from './spread-entity';
import { StudioEntity } from './studio-entity';
import { UserEntity } from './user-entity';

/** Work that outlives a request; one runner takes the jobs in turn. MODEL.md 16. */
@Entity('jobs')
@Index('ix_jobs_queue', ['state', 'createdAt'])
export class JobEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_jobs_studio' })
  studio?: StudioEntity;

  /** The spread that the job is about; whoever may see that spread may see the job. */
  @Column({ name: 'spread_id', type: 'uuid', nullable: true })
  spreadId!: string | null;

  @ManyToOne(() => SpreadEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'spread_id', foreignKeyConstraintName: 'fk_jobs_spread' })
  spread?: SpreadEntity | null;

  @Column({ type: 'varchar', length: 40 })
  kind!: string;

  @Column({ type: 'json' })
  payload!: object;

  @Column({ type: 'enum', enum: JOB_STATES })
  state!: Job['state'];

  @Column({ type: 'int', unsigned: true })
  attempts!: number;

  /** 0 to 1. */
  @Column({ type: 'double' })
  progress!: number;

  /** While running: when the claim lapses, unless the runner renews it. */
  @Column(optionalInstant('locked_until'))
  lockedUntil!: Date | null;

  @Column({ type: 'json', nullable: true })
  result!: object | null;

  /** Code and data of the error; the words come from `shared/words`. */
  @Column({ type: 'json', nullable: true })
  failure!: { readonly code: ErrorCode; readonly data: ErrorData } | null;

  /** Held while waiting or running: a second job with the same key is the same job. */
  @Index('uq_jobs_dedupe', { unique: true })
  @Column({ name: 'dedupe_key', type: 'varchar', length: 160, nullable: true })
  dedupeKey!: string | null;

  @Column({ name: 'created_by', type: 'uuid', nullable: true })
  createdBy!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'created_by', foreignKeyConstraintName: 'fk_jobs_creator' })
  creator?: UserEntity | null;

  @Column(instant('created_at'))
  createdAt!: Date;

  @Column(optionalInstant('finished_at'))
  finishedAt!: Date | null;
}
