import { Column, Entity, PrimaryColumn } from 'typeorm';
import { bytes, instant } from './columns';

@Entity('studios')
export class StudioEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  @Column({ type: 'enum', enum: ['in', 'mm'] })
  unit!: 'in' | 'mm';

  /** Cutting tolerance, in Lengths. */
  @Column({ type: 'int', unsigned: true })
  tolerance!: number;

  /** The trimmer's finest mark, in Lengths. */
  @Column({ name: 'finest_mark', type: 'int', unsigned: true })
  finestMark!: number;

  /** An attendee's copy lives in a hidden studio of its own. MODEL.md 11. */
  @Column({ type: 'boolean' })
  hidden!: boolean;

  @Column(bytes('bytes_used'))
  bytesUsed!: number;

  @Column(bytes('bytes_quota'))
  bytesQuota!: number;

  @Column(instant('created_at'))
  createdAt!: Date;
}
