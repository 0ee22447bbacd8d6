import type { Mail } from '@shared/schemas/mail.schema';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

@Entity('mail')
@Index('mail_by_time', ['createdAt', 'id'])
export class MailEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ type: 'text' }) recipient!: string;
  @Column({ type: 'text' }) subject!: string;
  @Column({ type: 'text', nullable: true }) text!: string | null;
  @Column({ type: 'text', nullable: true }) html!: string | null;
  @Column({ type: 'text' }) state!: Mail['state'];
  @Column({ type: 'text', nullable: true }) error!: string | null;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
}
