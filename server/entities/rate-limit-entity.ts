import { Column, Entity, PrimaryColumn } from 'typeorm';
import { instant } from './columns';

/** Attempts counted within a window, shared by every process of the server. */
@Entity('rate_limits')
export class RateLimitEntity {
  /** Limit's name and a hash of what is counted: no address and no e-mail stands here in clear. */
  @PrimaryColumn({ type: 'varchar', length: 120 })
  id!: string;

  @Column({ type: 'int', unsigned: true })
  hits!: number;

  @Column(instant('resets_at'))
  resetsAt!: Date;
}
