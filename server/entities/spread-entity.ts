import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { SPREAD_STATES, type SpreadState } from '../../shared/contracts/albums';
import { AlbumEntity } from './album-entity';
import { instant, optionalInstant } from './columns';
import { StudioEntity } from './studio-entity';

@Entity('spreads')
@Index('ix_spreads_album_position', ['albumId', 'position'])
export class SpreadEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'album_id', type: 'uuid' })
  albumId!: string;

  @ManyToOne(() => AlbumEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'album_id', foreignKeyConstraintName: 'fk_spreads_album' })
  album?: AlbumEntity;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_spreads_studio' })
  studio?: StudioEntity;

  @Column({ type: 'varchar', length: 120 })
  title!: string;

  @Column({ type: 'int', unsigned: true })
  position!: number;

  @Column({ type: 'enum', enum: SPREAD_STATES })
  state!: SpreadState;

  /** As stored, perhaps by an older version: read it through `readDocument` only. */
  @Column({ type: 'json' })
  document!: unknown;

  @Column({ name: 'schema_version', type: 'int', unsigned: true })
  schemaVersion!: number;

  /** One more with every edit of the document. */
  @Column({ type: 'int', unsigned: true })
  revision!: number;

  @Column(optionalInstant('binned_at'))
  binnedAt!: Date | null;

  @Column(instant('created_at'))
  createdAt!: Date;

  @Column(instant('updated_at'))
  updatedAt!: Date;
}
