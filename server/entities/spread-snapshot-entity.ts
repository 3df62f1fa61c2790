import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { instant } from './columns';
import { SpreadEntity } from './spread-entity';

/** The whole document at every fiftieth revision, so that history need not replay from the start. */
@Entity('spread_snapshots')
export class SpreadSnapshotEntity {
  @PrimaryColumn({ name: 'spread_id', type: 'uuid' })
  spreadId!: string;

  @ManyToOne(() => SpreadEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'spread_id', foreignKeyConstraintName: 'fk_spread_snapshots_spread' })
  spread?: SpreadEntity;

  @PrimaryColumn({ type: 'int', unsigned: true })
  revision!: number;

  @Column({ type: 'json' })
  document!: unknown;

  @Column({ name: 'schema_version', type: 'int', unsigned: true })
  schemaVersion!: number;

  @Column(instant('at'))
  at!: Date;
}
