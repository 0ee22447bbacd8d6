import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PersonEntity } from './person.entity';

@Entity('board')
@Index('board_by_name', ['name', 'id'])
@Index('board_by_owner', ['ownerId'])
@Index('board_by_editor', ['updatedById'])
@Index('board_by_setup_editor', ['setupUpdatedById'])
export class BoardEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text', default: '' }) description!: string;
  @Column({ name: 'owner_id', type: 'text' }) ownerId!: string;
  @ManyToOne(() => PersonEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'owner_id' })
  owner?: PersonEntity;
  @Column({ type: 'integer', default: 1 }) version!: number;
  /** Stack-up and mount recipes; null: nothing has been said yet. */
  @Column({ type: 'simple-json', nullable: true }) setup!: BoardSetup | null;
  @Column({ name: 'setup_version', type: 'integer', default: 1 }) setupVersion!: number;
  @Column({ name: 'setup_updated_at', type: 'text', nullable: true }) setupUpdatedAt!: string | null;
  @Column({ name: 'setup_updated_by', type: 'text', nullable: true }) setupUpdatedById!: string | null;
  @ManyToOne(() => PersonEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'setup_updated_by' })
  setupUpdatedBy?: PersonEntity | null;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'updated_at', type: 'text' }) updatedAt!: string;
  @Column({ name: 'updated_by', type: 'text', nullable: true }) updatedById!: string | null;
  @ManyToOne(() => PersonEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by' })
  updatedBy?: PersonEntity | null;
}
