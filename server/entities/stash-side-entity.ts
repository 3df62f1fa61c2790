import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { COLOR_SOURCES, SIDE_PATTERNS, type ColorSource, type SidePattern } from '../../shared/model/stash';
import { StashSheetEntity } from './stash-sheet-entity';

export const FACES = ['front', 'back'] as const;

/** One face of a sheet. */
@Entity('stash_sides')
export class StashSideEntity {
  @PrimaryColumn({ name: 'sheet_id', type: 'uuid' })
  sheetId!: string;

  @ManyToOne(() => StashSheetEntity, (sheet) => sheet.sides, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'sheet_id', foreignKeyConstraintName: 'fk_stash_sides_sheet' })
  sheet?: StashSheetEntity;

  @PrimaryColumn({ type: 'enum', enum: FACES })
  face!: (typeof FACES)[number];

  @Column({ type: 'char', length: 7 })
  hex!: string;

  @Column({ type: 'enum', enum: COLOR_SOURCES })
  source!: ColorSource;

  @Column({ type: 'double' })
  uncertainty!: number;

  @Column({ type: 'enum', enum: SIDE_PATTERNS })
  pattern!: SidePattern;

  @Column({ type: 'json' })
  palette!: readonly string[];
}
