import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PersonEntity } from './person.entity';

export type TokenPurpose = 'invitation' | 'reset';

/** A link sent by mail. Only the token's hash is kept; using it deletes the row. */
@Entity('access_token')
@Index('access_token_by_person', ['personId', 'purpose'])
export class AccessTokenEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ name: 'person_id', type: 'text' }) personId!: string;
  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id' })
  person?: PersonEntity;
  @Column({ type: 'text' }) purpose!: TokenPurpose;
  @Column({ type: 'text', unique: true }) hash!: string;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'expires_at', type: 'text' }) expiresAt!: string;
}
