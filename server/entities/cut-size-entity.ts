import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { CUT_SIZE_KINDS, CUT_SIZE_STOCKS, type CutSize } from '../../shared/model/cut-size';
import { instant } from './columns';
import { StudioEntity } from './studio-entity';

@Entity('cut_sizes')
export class CutSizeEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_cut_sizes_studio' })
  studio?: StudioEntity;

  @Column({ type: 'varchar', length: 80 })
  name!: string;

  @Column({ type: 'int', unsigned: true })
  width!: number;

  @Column({ type: 'int', unsigned: true })
  height!: number;

  @Column({ type: 'enum', enum: CUT_SIZE_STOCKS })
  stock!: CutSize['stock'];

  @Column({ type: 'enum', enum: CUT_SIZE_KINDS })
  kind!: CutSize['kind'];

  @Column({ type: 'json' })
  sets!: readonly string[];

  @Column(instant('created_at'))
  createdAt!: Date;
}
