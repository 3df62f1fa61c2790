import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import type { GrantScope } from '../../shared/model/people';
import { instant, optionalInstant, sha256 } from './columns';
import { StudioEntity } from './studio-entity';
import { UserEntity } from './user-entity';

/** A right without a membership: link holders, attendees and phones. MODEL.md 11. */
@Entity('grants')
export class GrantEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_grants_studio' })
  studio?: StudioEntity;

  /** The token itself is told once, at its making, and kept nowhere. */
  @Index('uq_grants_token', { unique: true })
  @Column(sha256('token_hash'))
  tokenHash!: string;

  @Column({ type: 'json' })
  scope!: GrantScope;

  @Column(optionalInstant('expires_at'))
  expiresAt!: Date | null;

  @Column(optionalInstant('withdrawn_at'))
  withdrawnAt!: Date | null;

  @Column({ name: 'created_by', type: 'uuid', nullable: true })
  createdBy!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'created_by', foreignKeyConstraintName: 'fk_grants_creator' })
  creator?: UserEntity;

  @Column(instant('created_at'))
  createdAt!: Date;
}
