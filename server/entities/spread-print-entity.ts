import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PrintEntity } from './print-entity';
import { SpreadEntity } from './spread-entity';

/** Every print that is chosen for a spread. Deleting such a print is refused. MODEL.md 5. */
@Entity('spread_prints')
export class SpreadPrintEntity {
  @PrimaryColumn({ name: 'spread_id', type: 'uuid' })
  spreadId!: string;

  @ManyToOne(() => SpreadEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'spread_id', foreignKeyConstraintName: 'fk_spread_prints_spread' })
  spread?: SpreadEntity;

  @PrimaryColumn({ name: 'print_id', type: 'uuid' })
  printId!: string;

  @ManyToOne(() => PrintEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'print_id', foreignKeyConstraintName: 'fk_spread_prints_print' })
  print?: PrintEntity;

  /** Copies that the spread needs, at the studio's tolerance when it was saved; 0 for a print that only lies ready. */
  @Column({ type: 'int', unsigned: true })
  copies!: number;
}
