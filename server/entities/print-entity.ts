import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import type { Turns } from '../../shared/model/ids';
import type { Detail, Face, Horizon, OklabRaster, PxRect, Swatch } from '../../shared/model/print';
import { instant, optionalInstant } from './columns';
import { FileEntity } from './file-entity';
import { PileEntity } from './pile-entity';
import { StudioEntity } from './studio-entity';
import { UserEntity } from './user-entity';

/** `shared/model/print.ts` says what each value means. */
@Entity('prints')
@Index('ix_prints_studio_order', ['studioId', 'createdAt', 'id'])
export class PrintEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_prints_studio' })
  studio?: StudioEntity;

  @Column({ name: 'pile_id', type: 'uuid', nullable: true })
  pileId!: string | null;

  @ManyToOne(() => PileEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'pile_id', foreignKeyConstraintName: 'fk_prints_pile' })
  pile?: PileEntity | null;

  @Column({ name: 'file_id', type: 'uuid' })
  fileId!: string;

  @ManyToOne(() => FileEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'file_id', foreignKeyConstraintName: 'fk_prints_file' })
  file?: FileEntity;

  @Column({ name: 'contributed_by', type: 'uuid', nullable: true })
  contributedBy!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'contributed_by', foreignKeyConstraintName: 'fk_prints_contributor' })
  contributor?: UserEntity | null;

  @Column({ type: 'int', unsigned: true })
  position!: number;

  @Column({ type: 'varchar', length: 120 })
  title!: string;

  @Column({ name: 'paper_width', type: 'int', unsigned: true })
  paperWidth!: number;

  @Column({ name: 'paper_height', type: 'int', unsigned: true })
  paperHeight!: number;

  @Column({ type: 'tinyint', unsigned: true })
  turns!: Turns;

  @Column({ type: 'int', unsigned: true })
  copies!: number;

  @Column({ name: 'no_up', type: 'boolean' })
  noUp!: boolean;

  @Column({ name: 'one_of_a_kind', type: 'boolean' })
  oneOfAKind!: boolean;

  @Column({ name: 'borrowed_until', type: 'date', nullable: true })
  borrowedUntil!: string | null;

  @Column({ name: 'instant_film', type: 'boolean' })
  instantFilm!: boolean;

  @Column({ type: 'boolean' })
  digital!: boolean;

  @Column({ name: 'image_width', type: 'int', unsigned: true })
  imageWidth!: number;

  @Column({ name: 'image_height', type: 'int', unsigned: true })
  imageHeight!: number;

  @Column({ name: 'paper_rect', type: 'json' })
  paperRect!: PxRect;

  @Column({ name: 'keep_zone', type: 'json', nullable: true })
  keepZone!: PxRect | null;

  @Column({ type: 'json' })
  details!: readonly Detail[];

  @Column({ type: 'json' })
  faces!: readonly Face[];

  @Column({ type: 'json', nullable: true })
  horizon!: Horizon | null;

  @Column({ type: 'json' })
  palette!: readonly Swatch[];

  @Column({ type: 'json' })
  raster!: OklabRaster;

  @Column({ type: 'int', unsigned: true })
  revision!: number;

  @Column(optionalInstant('binned_at'))
  binnedAt!: Date | null;

  @Column(instant('created_at'))
  createdAt!: Date;

  @Column(instant('updated_at'))
  updatedAt!: Date;
}
