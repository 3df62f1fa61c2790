import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { ROLES, type Role } from '../../shared/model/people';
import { instant } from './columns';
import { StudioEntity } from './studio-entity';
import { UserEntity } from './user-entity';

@Entity('memberships')
export class MembershipEntity {
  @PrimaryColumn({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_memberships_studio' })
  studio?: StudioEntity;

  @PrimaryColumn({ name: 'user_id', type: 'uuid' })
  userId!: string;

  @ManyToOne(() => UserEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'fk_memberships_user' })
  user?: UserEntity;

  @Column({ type: 'enum', enum: ROLES })
  role!: Role;

  @Column(instant('created_at'))
  createdAt!: Date;
}
