import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { bytes, instant } from './columns';

@Entity('users')
export class UserEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  /** Lower case, compared byte by byte: é and e are different addresses. Nobody signs up twice with one. */
  @Index('uq_users_email', { unique: true })
  @Column({ type: 'varchar', length: 254, collation: 'utf8mb4_bin' })
  email!: string;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  /** argon2id in its encoded form, parameters and salt included. */
  @Column({ name: 'password_hash', type: 'varchar', length: 255 })
  passwordHash!: string;

  /** Originals that this person added, in whatever studio. */
  @Column(bytes('bytes_used'))
  bytesUsed!: number;

  @Column(bytes('bytes_quota'))
  bytesQuota!: number;

  @Column(instant('created_at'))
  createdAt!: Date;
}
