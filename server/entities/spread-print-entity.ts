import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PrintEntity } from './print-entity';
import { SpreadEntity } from './spread-entity';

/** Every print that a spread's document names. Deleting such a print is refused. MODEL.md 5. */
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

  /** Copies that are placed on mats; 0 for a print that only lies ready or gave a colour. */
  @Column({ type: 'int', unsigned: true })
  copies!: number;
}
