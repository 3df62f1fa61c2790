import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { instant } from './columns';
import { SpreadEntity } from './spread-entity';
import { StashSheetEntity } from './stash-sheet-entity';

/** Sheets set aside for a spread. They stay so while the spread lies in the bin. */
@Entity('stash_reservations')
export class StashReservationEntity {
  @PrimaryColumn({ name: 'sheet_id', type: 'uuid' })
  sheetId!: string;

  @ManyToOne(() => StashSheetEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'sheet_id', foreignKeyConstraintName: 'fk_stash_reservations_sheet' })
  sheet?: StashSheetEntity;

  @PrimaryColumn({ name: 'spread_id', type: 'uuid' })
  spreadId!: string;

  @ManyToOne(() => SpreadEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'spread_id', foreignKeyConstraintName: 'fk_stash_reservations_spread' })
  spread?: SpreadEntity;

  @Column({ type: 'int', unsigned: true })
  sheets!: number;

  @Column(instant('created_at'))
  createdAt!: Date;
}
