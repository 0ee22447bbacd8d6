import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PersonEntity } from './person.entity';

/** One sign-in. The cookie's token names it; deleting the row revokes the token. */
@Entity('session')
@Index('session_by_person', ['personId'])
@Index('session_by_end', ['expiresAt'])
export class SessionEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ name: 'person_id', type: 'text' }) personId!: string;
  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id' })
  person?: PersonEntity;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'expires_at', type: 'text' }) expiresAt!: string;
}
