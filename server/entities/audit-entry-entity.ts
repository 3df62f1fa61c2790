import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { instant } from './columns';
import { StudioEntity } from './studio-entity';
import { UserEntity } from './user-entity';

/** Who did what to the studio itself: grants made and withdrawn, things deleted for good. Rows are only added. */
@Entity('audit_log')
@Index('ix_audit_log_studio_at', ['studioId', 'at'])
export class AuditEntryEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_audit_log_studio' })
  studio?: StudioEntity;

  @Column({ name: 'user_id', type: 'uuid', nullable: true })
  userId!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'fk_audit_log_user' })
  user?: UserEntity | null;

  /** Such as `grant.withdraw`. */
  @Column({ type: 'varchar', length: 60 })
  action!: string;

  @Column({ name: 'subject_id', type: 'uuid' })
  subjectId!: string;

  @Column(instant('at'))
  at!: Date;
}
