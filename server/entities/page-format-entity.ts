import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import type { PageFormat } from '../../shared/model/page-format';
import { instant } from './columns';
import { StudioEntity } from './studio-entity';

/** A page format of a studio's own; the shipped ones stand in `shared/model/page-format.ts`. */
@Entity('page_formats')
export class PageFormatEntity {
  @PrimaryColumn({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_page_formats_studio' })
  studio?: StudioEntity;

  @PrimaryColumn({ type: 'varchar', length: 60 })
  id!: string;

  @Column({ type: 'json' })
  format!: PageFormat;

  @Column(instant('created_at'))
  createdAt!: Date;
}
