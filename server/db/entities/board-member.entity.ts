import type { BoardRole } from '@shared/schemas/board.schema';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { BoardEntity } from './board.entity';
import { PersonEntity } from './person.entity';

@Entity('board_member')
@Index('board_member_by_person', ['personId', 'role'])
export class BoardMemberEntity {
  @PrimaryColumn({ name: 'board_id', type: 'text' }) boardId!: string;
  @ManyToOne(() => BoardEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'board_id' })
  board?: BoardEntity;
  @PrimaryColumn({ name: 'person_id', type: 'text' }) personId!: string;
  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id' })
  person?: PersonEntity;
  @Column({ type: 'text' }) role!: BoardRole;
}
