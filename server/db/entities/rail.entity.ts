import {
  type BankLine,
  type RailSummary,
  type SearchSettings,
  searchSettingsSchema,
} from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type ValueTransformer } from 'typeorm';
import { BoardEntity } from './board.entity';
import { PersonEntity } from './person.entity';

const defaults = searchSettingsSchema.parse({});

/** Settings that came after a rail was stored have their defaults there. */
const withLaterSettings: ValueTransformer = {
  to: (settings: SearchSettings) => settings,
  from: (stored: Partial<SearchSettings>): SearchSettings => ({ ...defaults, ...stored }),
};

/** The same for bank lines. */
const withLaterFields: ValueTransformer = {
  to: (bank: BankLine[]) => bank,
  from: (stored: (Omit<BankLine, 'recipeId'> & Partial<BankLine>)[]): BankLine[] =>
    stored.map((line) => ({ ...line, recipeId: line.recipeId ?? null })),
};

@Entity('rail')
@Index('rail_by_position', ['boardId', 'position', 'id'])
@Index('rail_name', ['boardId', 'nameKey'], { unique: true })
@Index('rail_by_editor', ['updatedById'])
export class RailEntity {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ name: 'board_id', type: 'text' }) boardId!: string;
  @ManyToOne(() => BoardEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'board_id' })
  board?: BoardEntity;
  @Column({ type: 'integer' }) position!: number;
  /** Name in lower case: two rails of a board may not differ by case alone. */
  @Column({ name: 'name_key', type: 'text' }) nameKey!: string;
  @Column({ type: 'simple-json' }) spec!: RailSpec;
  @Column({ type: 'simple-json', transformer: withLaterFields }) bank!: BankLine[];
  @Column({ type: 'simple-json', transformer: withLaterSettings }) search!: SearchSettings;
  @Column({ type: 'simple-json' }) summary!: RailSummary;
  /** The summary's own answer again, so that board lists can count without reading it. */
  @Column({ type: 'boolean', nullable: true }) holds!: boolean | null;
  /** Of the rail's document as it stands, and as the latest revision holds it (null: it does not). */
  @Column({ name: 'document_hash', type: 'text', default: '' }) documentHash!: string;
  @Column({ name: 'cut_hash', type: 'text', nullable: true }) cutHash!: string | null;
  @Column({ type: 'integer', default: 1 }) version!: number;
  @Column({ name: 'created_at', type: 'text' }) createdAt!: string;
  @Column({ name: 'updated_at', type: 'text' }) updatedAt!: string;
  @Column({ name: 'updated_by', type: 'text', nullable: true }) updatedById!: string | null;
  @ManyToOne(() => PersonEntity, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by' })
  updatedBy?: PersonEntity | null;
}
