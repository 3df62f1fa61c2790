import { Column, Entity, JoinColumn, ManyToOne, OneToMany, PrimaryColumn } from 'typeorm';
import { instant } from './columns';
import { StashSideEntity } from './stash-side-entity';
import { StudioEntity } from './studio-entity';

/** `shared/model/stash.ts` says what each value means. */
@Entity('stash_sheets')
export class StashSheetEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_stash_sheets_studio' })
  studio?: StudioEntity;

  @OneToMany(() => StashSideEntity, (side) => side.sheet)
  sides?: StashSideEntity[];

  @Column({ type: 'varchar', length: 80 })
  name!: string;

  @Column({ type: 'varchar', length: 80 })
  maker!: string;

  @Column({ type: 'varchar', length: 80 })
  texture!: string;

  @Column({ type: 'varchar', length: 80 })
  place!: string;

  @Column({ type: 'int', unsigned: true })
  width!: number;

  @Column({ type: 'int', unsigned: true })
  height!: number;

  @Column({ type: 'int', unsigned: true })
  quantity!: number;

  @Column({ name: 'low_at', type: 'int', unsigned: true, nullable: true })
  lowAt!: number | null;

  @Column({ type: 'int', unsigned: true, nullable: true })
  price!: number | null;

  @Column({ type: 'int', unsigned: true })
  revision!: number;

  @Column(instant('created_at'))
  createdAt!: Date;

  @Column(instant('updated_at'))
  updatedAt!: Date;
}
