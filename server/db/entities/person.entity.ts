import type { SiteRole } from '@shared/schemas/person.schema';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';

@Entity('person')
@Index('person_by_name', ['name', 'id'])
@Index('person_by_editor', ['updatedById'])
export class PersonEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ type: 'text', unique: true }) email!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ name: 'site_role', type: 'text' }) siteRole!: SiteRole;
  /** null: invited, has not chosen a password yet. */
  @Column({ name: 'password_hash', type: 'text', nullable: true }) passwordHash!: string | null;
  @Column({ type: 'boolean', default: false }) disabled!: boolean;
  /** Still has the demo password that everyone can read; may sign in only while demo mode is on. */
  @Column({ type: 'boolean', default: false }) demo!: boolean;
  @Column({ type: 'integer', default: 1 }) version!: number;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'updated_at', type: 'text' }) updatedAt!: string;
  @Column({ name: 'updated_by', type: 'text', nullable: true }) updatedById!: string | null;
  @ManyToOne(() => PersonEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by' })
  updatedBy?: PersonEntity | null;
}
