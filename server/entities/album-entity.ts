import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import type { Binding, PageFormat } from '../../shared/model/page-format';
import { instant, optionalInstant } from './columns';
import { StudioEntity } from './studio-entity';

@Entity('albums')
export class AlbumEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_albums_studio' })
  studio?: StudioEntity;

  @Column({ type: 'varchar', length: 120 })
  title!: string;

  /** A copy, so that a changed studio format never changes an album that was begun. */
  @Column({ type: 'json' })
  format!: PageFormat;

  @Column({ type: 'json' })
  binding!: Binding;

  /** While it is set, no spread of the album is live. */
  @Column(optionalInstant('binned_at'))
  binnedAt!: Date | null;

  @Column(instant('created_at'))
  createdAt!: Date;
}
