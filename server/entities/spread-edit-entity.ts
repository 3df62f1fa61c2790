import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import type { Patch } from '../../shared/model/patch';
import { instant } from './columns';
import { SpreadEntity } from './spread-entity';
import { UserEntity } from './user-entity';

/** The log of edits: rows are added and never changed. MODEL.md 7. */
@Entity('spread_edits')
@Index('uq_spread_edits_id', ['spreadId', 'id'], { unique: true })
export class SpreadEditEntity {
  @PrimaryColumn({ name: 'spread_id', type: 'uuid' })
  spreadId!: string;

  @ManyToOne(() => SpreadEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'spread_id', foreignKeyConstraintName: 'fk_spread_edits_spread' })
  spread?: SpreadEntity;

  /** The document's revision after this edit. */
  @PrimaryColumn({ type: 'int', unsigned: true })
  revision!: number;

  /** Made by the client; unique within the spread. */
  @Column({ type: 'uuid' })
  id!: string;

  @Column({ type: 'varchar', length: 60 })
  command!: string;

  @Column({ type: 'json' })
  patch!: Patch;

  @Column({ name: 'user_id', type: 'uuid', nullable: true })
  userId!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'fk_spread_edits_user' })
  user?: UserEntity | null;

  @Column(instant('at'))
  at!: Date;
}
