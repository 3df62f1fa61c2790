import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import type { CheckId } from '../../shared/checks/check-ids';
import { instant } from './columns';
import { SpreadEntity } from './spread-entity';
import { StudioEntity } from './studio-entity';

/** What a studio, or one of its spreads, says about one check. */
@Entity('check_settings')
@Index('ix_check_settings_studio', ['studioId'])
@Index('ix_check_settings_spread', ['spreadId'])
export class CheckSettingEntity {
  /** The spread's id, or the studio's where it holds for all its spreads. */
  @PrimaryColumn({ name: 'scope_id', type: 'uuid' })
  scopeId!: string;

  @PrimaryColumn({ name: 'check_id', type: 'varchar', length: 60 })
  checkId!: CheckId;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_check_settings_studio' })
  studio?: StudioEntity;

  @Column({ name: 'spread_id', type: 'uuid', nullable: true })
  spreadId!: string | null;

  @ManyToOne(() => SpreadEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'spread_id', foreignKeyConstraintName: 'fk_check_settings_spread' })
  spread?: SpreadEntity | null;

  @Column({ type: 'boolean', nullable: true })
  muted!: boolean | null;

  @Column({ type: 'json' })
  thresholds!: Readonly<Record<string, number>>;

  @Column(instant('updated_at'))
  updatedAt!: Date;
}
