import type { PartFields, PartState } from '@shared/schemas/part.schema';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { PersonEntity } from './person.entity';

@Entity('part')
@Index('part_by_capacitance', ['capacitance_F', 'id'])
@Index('part_by_number', ['partNumber', 'id'])
@Index('part_by_case', ['caseSize', 'id'])
@Index('part_by_dielectric', ['dielectric', 'id'])
@Index('part_by_state', ['state', 'id'])
@Index('part_by_editor', ['updatedById'])
export class PartEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ name: 'part_number', type: 'text' }) partNumber!: string;
  /** Part number in lower case: two parts may not differ by case alone. */
  @Column({ name: 'number_key', type: 'text', unique: true }) numberKey!: string;
  /** What free text is looked for in, in lower case. */
  @Column({ name: 'search_text', type: 'text' }) searchText!: string;
  @Column({ type: 'text', default: '' }) description!: string;
  @Column({ type: 'text' }) technology!: PartFields['technology'];
  @Column({ type: 'text', default: '' }) dielectric!: string;
  @Column({ name: 'case_size', type: 'text' }) caseSize!: string;
  @Column({ name: 'capacitance_f', type: 'real' }) capacitance_F!: number;
  @Column({ type: 'text' }) tolerance!: PartFields['tolerance'];
  @Column({ name: 'rated_voltage_v', type: 'real' }) rated_voltage_V!: number;
  @Column({ name: 'esr_ohm', type: 'real' }) esr_ohm!: number;
  @Column({ name: 'esl_h', type: 'real' }) esl_H!: number;
  @Column({ name: 'mount_h', type: 'real' }) mount_H!: number;
  @Column({ name: 'height_mm', type: 'real', nullable: true }) height_mm!: number | null;
  @Column({ type: 'text', default: 'standard' }) termination!: PartFields['termination'];
  @Column({ name: 'unit_cost', type: 'real', nullable: true }) unit_cost!: number | null;
  @Column({ name: 'area_mm2', type: 'real', nullable: true }) area_mm2!: number | null;
  @Column({ type: 'simple-json', nullable: true }) bias_curve!: PartFields['bias_curve'];
  @Column({ type: 'simple-json', nullable: true }) temperature_curve!: PartFields['temperature_curve'];
  @Column({ type: 'real', nullable: true }) ageing_percent_per_decade!: number | null;
  @Column({ type: 'simple-json', nullable: true }) esr_table!: PartFields['esr_table'];
  @Column({ type: 'simple-json', nullable: true }) impedance_table!: PartFields['impedance_table'];
  @Column({ type: 'real', nullable: true }) esr_tolerance_percent!: number | null;
  @Column({ type: 'real', nullable: true }) esl_tolerance_percent!: number | null;
  @Column({ type: 'text', default: 'draft' }) state!: PartState;
  @Column({ type: 'integer', default: 1 }) version!: number;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'updated_at', type: 'text' }) updatedAt!: string;
  @Column({ name: 'updated_by', type: 'text', nullable: true }) updatedById!: string | null;
  @ManyToOne(() => PersonEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by' })
  updatedBy?: PersonEntity | null;
}
