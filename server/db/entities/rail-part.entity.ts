import { Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PartEntity } from './part.entity';
import { RailEntity } from './rail.entity';

/** Which parts a rail's bank names, so that a changed part finds its rails without reading every bank. */
@Entity('rail_part')
@Index('rail_part_by_part', ['partId'])
export class RailPartEntity {
  @PrimaryColumn({ name: 'rail_id', type: 'text' }) railId!: string;
  @ManyToOne(() => RailEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'rail_id' })
  rail?: RailEntity;
  @PrimaryColumn({ name: 'part_id', type: 'text' }) partId!: string;
  @ManyToOne(() => PartEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'part_id' })
  part?: PartEntity;
}
