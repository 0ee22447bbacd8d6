import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { BoardEntity } from './board.entity';
import { PersonEntity } from './person.entity';

/** Never changes once cut; triggers in the database see to that. */
@Entity('revision')
@Index('revision_number', ['boardId', 'number'], { unique: true })
@Index('revision_by_person', ['createdById'])
export class RevisionEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ name: 'board_id', type: 'text' }) boardId!: string;
  @ManyToOne(() => BoardEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'board_id' })
  board?: BoardEntity;
  @Column({ type: 'integer' }) number!: number;
  @Column({ type: 'text' }) letter!: string;
  @Column({ type: 'text' }) note!: string;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'created_by', type: 'text' }) createdById!: string;
  @ManyToOne(() => PersonEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'created_by' })
  createdBy?: PersonEntity;
  @Column({ name: 'engine_version', type: 'text' }) engineVersion!: string;
  @Column({ type: 'text' }) hash!: string;
  @Column({ name: 'rails_total', type: 'integer' }) railsTotal!: number;
  @Column({ name: 'rails_hold', type: 'integer' }) railsHold!: number;
  @Column({ name: 'rails_short', type: 'integer' }) railsShort!: number;
  @Column({ name: 'rails_unknown', type: 'integer' }) railsUnknown!: number;
  @Column({ type: 'integer' }) parts!: number;
  @Column({ type: 'real', nullable: true }) cost!: number | null;
  @Column({ name: 'area_mm2', type: 'real', nullable: true }) area_mm2!: number | null;
  /** Canonical JSON of the whole snapshot; `hash` is the SHA-256 of these bytes. Read on demand only. */
  @Column({ type: 'text', select: false }) snapshot!: string;
}
