import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { instant } from './columns';
import { StudioEntity } from './studio-entity';

@Entity('piles')
export class PileEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_piles_studio' })
  studio?: StudioEntity;

  @Column({ type: 'varchar', length: 80 })
  name!: string;

  @Column({ type: 'int', unsigned: true })
  position!: number;

  @Column({ name: 'shared_with_contributors', type: 'boolean' })
  sharedWithContributors!: boolean;

  @Column(instant('created_at'))
  createdAt!: Date;
}
