import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { bytes, instant, sha256 } from './columns';
import { StudioEntity } from './studio-entity';
import { UserEntity } from './user-entity';

/** An original, untouched, known by its content within its studio and never across studios. MODEL.md 12. */
@Entity('files')
@Index('uq_files_content', ['studioId', 'sha256'], { unique: true })
export class FileEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'studio_id', type: 'uuid' })
  studioId!: string;

  @ManyToOne(() => StudioEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'studio_id', foreignKeyConstraintName: 'fk_files_studio' })
  studio?: StudioEntity;

  @Column(sha256('sha256'))
  sha256!: string;

  /** Size of the original alone. */
  @Column(bytes('bytes'))
  bytes!: number;

  @Column({ name: 'media_type', type: 'varchar', length: 60 })
  mediaType!: string;

  /** Pixels of the EXIF-oriented picture. */
  @Column({ type: 'int', unsigned: true })
  width!: number;

  @Column({ type: 'int', unsigned: true })
  height!: number;

  /** Whose quota it counts against beside the studio's: the first who sent it. */
  @Column({ name: 'added_by', type: 'uuid', nullable: true })
  addedBy!: string | null;

  @ManyToOne(() => UserEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'added_by', foreignKeyConstraintName: 'fk_files_adder' })
  adder?: UserEntity | null;

  @Column(instant('created_at'))
  createdAt!: Date;
}
