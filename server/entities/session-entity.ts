import type { SessionData } from 'express-session';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { instant } from './columns';
import { UserEntity } from './user-entity';

@Entity('sessions')
export class SessionEntity {
  /** SHA-256 of the cookie's session id, so that a copy of this table signs nobody in. */
  @PrimaryColumn({ type: 'char', length: 64 })
  id!: string;

  @Column({ name: 'user_id', type: 'uuid', nullable: true })
  userId!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'fk_sessions_user' })
  user?: UserEntity;

  @Column({ type: 'json' })
  data!: SessionData;

  @Index('ix_sessions_expires')
  @Column(instant('expires_at'))
  expiresAt!: Date;
}
